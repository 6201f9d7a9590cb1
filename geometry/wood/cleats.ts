import { foot, offsetOf } from '../core/line';
import { unit } from '../core/vector';
import type { PlacedCutout, TopSeam } from '../top/types';
import { constant } from './sourced';

export const CLEAT_LENGTH = constant('Clamping cleat, length each side of a seam', 6, 'in', 'common practice', '');
export const CLEAT_LEAST = constant('Shortest cleat that takes two screws', 3, 'in', 'common practice', '');
export const CLEAT_CLEAR = constant('Cleat screws clear of the finished edge', 1, 'in', 'common practice', '');

/** Two cleats across a seam in the waste of a cutout, one near its back and one near its front. Inches. */
export interface SeamCleats {
  /** Length of a cleat on the left-hand and on the right-hand piece. */
  readonly left: number;
  readonly right: number;
  /** Centres of both cleats from the seam's back point. */
  readonly at: readonly [number, number];
}

/**
 * Where the cleats that draw a site seam together are screwed: only in wood that is cut away later.
 *
 * @returns null when the seam does not run through the cutout, or the waste on one side is too short for two screws
 */
export function seamCleats(
  seam: Pick<TopSeam, 'from' | 'to'>,
  cutout: Pick<PlacedCutout, 'outline'>,
): SeamCleats | null {
  const direction = unit(seam.from, seam.to);
  if (!direction) return null;
  const line = { origin: seam.from, direction };
  const offsets = cutout.outline.map((p) => offsetOf(line, p));
  const along = cutout.outline.map((p) => foot(line, p));
  // The front lies ahead along the seam, so the left-hand piece (seen from the room) lies to the right of its direction.
  const leftWaste = -Math.min(...offsets) - CLEAT_CLEAR.value;
  const rightWaste = Math.max(...offsets) - CLEAT_CLEAR.value;
  if (Math.min(leftWaste, rightWaste) < CLEAT_LEAST.value) return null;
  const [back, front] = [Math.min(...along), Math.max(...along)];
  const inset = 2 * CLEAT_CLEAR.value;
  if (front - back < 2 * inset) return null;
  return {
    left: Math.min(CLEAT_LENGTH.value, leftWaste),
    right: Math.min(CLEAT_LENGTH.value, rightWaste),
    at: [back + inset, front - inset],
  };
}
