import { constant } from '../wood/sourced';
import type { Severity } from './types';

export const SEASON_NOTE = constant('Seasonal opening that shows', 1 / 32, 'in', 'our choice', '');
export const SEASON_WARN = constant('Seasonal opening that collects water', 1 / 8, 'in', 'our choice', '');

/** How loud a seasonal movement is: silent up to 1/32 in, a note up to 1/8 in; in an unheated house every one is a warning. */
export function seasonSeverity(inches: number, heated: boolean): Severity | null {
  if (inches <= SEASON_NOTE.value) return null;
  return inches > SEASON_WARN.value || !heated ? 'warn' : 'note';
}

/** The limit that was passed. */
export const seasonLimit = (inches: number): number =>
  inches > SEASON_WARN.value ? SEASON_WARN.value : SEASON_NOTE.value;
