/** Pages of the shop beside its jobs. They load together, when the first of them is opened. */
export { CrewScreen } from '../crew/CrewScreen';
export { SettingsScreen } from '../settings/SettingsScreen';
export { StockScreen } from '../stock/StockScreen';
