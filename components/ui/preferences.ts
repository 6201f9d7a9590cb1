import { useLocalSetting, useLocalSwitch } from './local-setting';

/** Unit the fraction pad opens with. */
export const usePadUnit = () => useLocalSetting('pad-unit', ['in', 'mm'], 'in');

/** Function keys of the pad at the left, for a tape held in the right hand. */
export const useLeftHandPad = () => useLocalSwitch('pad-left', false);

/** Shortcuts of a single letter or digit (J, K, R, /, 1 to 5). Whoever speaks to the screen turns them off. */
export const useSingleKeys = () => useLocalSwitch('single-keys', true);
