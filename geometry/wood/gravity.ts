import type { Sourced } from './sourced';
import { sourced } from './sourced';

/** Moisture above which wood neither swells nor shrinks, percent (Wood Handbook eq. 4-11). */
const FIBER_SATURATION = 30;

/** Share of the basic gravity that the cell walls' water adds to the volume (Wood Handbook eq. 4-11). */
const SWELL = 0.265;

/**
 * Specific gravity on the volume at `moisture` percent, from the basic one (green volume): G / (1 - 0.265 G (1 - x / 30)).
 * From 30 % up the volume is the green one.
 *
 * @see Wood Handbook, equation 4-11
 */
export function gravityAt(basic: number, moisture: number): number {
  const dry = 1 - Math.min(Math.max(moisture, 0), FIBER_SATURATION) / FIBER_SATURATION;
  return basic / (1 - SWELL * basic * dry);
}

/** Basic specific gravity from the one on the volume at 12 % moisture: the inverse of `gravityAt`. */
export function basicGravity(gravity12: number): number {
  return gravity12 / (1 + SWELL * gravity12 * (1 - 12 / FIBER_SATURATION));
}

/** Gravity at 12 % of a wood whose table prints only the green-volume figure. */
export const fromGreenVolume = (basic: number, source: string): Sourced =>
  sourced(gravityAt(basic, 12), 'computed', source);
