/**
 * The root of the second part of the web app: an open job with its canvas and all that computes. Only
 * `use-job-screens` imports this file, and late, so that sign-in and the list of jobs open without it. One part, not
 * one for each screen: they share nearly everything, and what two late parts share would be loaded first.
 */
export { JobLoader } from './JobLoader';
export { RoomScreen } from '../room/RoomScreen';
export { SheetsScreen } from '../sheets/SheetsScreen';
export { SlabsScreen } from '../slabs/SlabsScreen';
export { TopsScreen } from '../tops/TopsScreen';
export { WorkScreen } from '../work/WorkScreen';

// Pages that draw with the same code come with the same part: what two late parts share, the first screen would have to load.
export { CrewScreen } from '../crew/CrewScreen';
export { JobFilePreview, readJobFile } from '../jobs/job-file-preview';
export { SettingsScreen } from '../settings/SettingsScreen';
export { StockScreen } from '../stock/StockScreen';
