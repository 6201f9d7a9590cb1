import { toRadians } from '../core/angle';

/** Three sides for a corner check, inches: marks on the left-hand and right-hand wall, and the tape if it is square. */
export interface CornerTriangle {
  readonly left: number;
  readonly right: number;
  readonly squareTape: number;
}

/** The unit 3-4-5 is stretched by at most, inches: 36, 48 and 60. */
const LARGEST_UNIT = 12;

/**
 * The gap that one standard deviation of a corner's angle opens at the far end of a joint, inches.
 *
 * @param sdDeg - of the corner's angle
 * @param jointLength - inches
 */
export const openingAtEnd = (sdDeg: number, jointLength: number): number => toRadians(sdDeg) * jointLength;

/**
 * The largest whole-inch 3-4-5 triangle that fits the two walls of a corner, up to 36, 48 and 60 in; the long mark goes
 * on the longer wall. Null when not even 3 and 4 in fit.
 *
 * @param left, right - lengths of the walls, inches
 */
export function suggestTriangle(left: number, right: number): CornerTriangle | null {
  const [short, long] = left <= right ? [left, right] : [right, left];
  const unit = Math.min(LARGEST_UNIT, Math.floor(short / 3), Math.floor(long / 4));
  if (unit < 1) return null;
  const [three, four] = [3 * unit, 4 * unit];
  const marks = left <= right ? { left: three, right: four } : { left: four, right: three };
  return { ...marks, squareTape: 5 * unit };
}

/** The tape between two marks on a corner's walls for a given interior angle, inches (law of cosines). */
export function tapeForAngle(left: number, right: number, angleDeg: number): number {
  return Math.sqrt(left * left + right * right - 2 * left * right * Math.cos(toRadians(angleDeg)));
}
