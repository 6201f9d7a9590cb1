import type { Step } from '@/geometry/core/layout';
import { inches } from '@/geometry/top/sentence';

/** Sides of a 3-4-5 triangle to mark from the corner, inches; the longest that fits measures the angle best. */
const SIZES = [
  [36, 48],
  [27, 36],
  [18, 24],
  [12, 16],
  [9, 12],
] as const;

export type Marks = readonly [number, number];

/** 3-4-5 marks that fit both walls, longest first, the longer mark on the longer wall; the smallest when not even that fits. */
export function marksThatFit(left: number, right: number): Marks[] {
  const turned = left > right;
  const fit = SIZES.filter(([short, long]) => short <= Math.min(left, right) && long <= Math.max(left, right));
  const sizes: readonly Marks[] = fit.length > 0 ? fit : [SIZES[SIZES.length - 1]!];
  return sizes.map(([short, long]) => (turned ? [long, short] : [short, long]));
}

/** What the tape reads between the marks when the corner is as drawn, inches. */
export const squareTape = (a: number, b: number, nominalDeg: number): number =>
  Math.sqrt(a * a + b * b - 2 * a * b * Math.cos((nominalDeg * Math.PI) / 180));

/** Interior angle at a corner from a triangle, degrees, on the side of 180 that the drawing says; null for an impossible triangle. */
export function triangleAngle(a: number, b: number, c: number, nominal: number): number | null {
  const cosine = (a * a + b * b - c * c) / (2 * a * b);
  if (!(Math.abs(cosine) <= 1)) return null;
  const angle = (Math.acos(cosine) * 180) / Math.PI;
  return nominal > 180 ? 360 - angle : angle;
}

/** Why a tape between the marks cannot be, in a sentence; null when it can. */
export function triangleProblem(a: number, b: number, c: number, step: Step): string | null {
  if (c >= a + b)
    return `The marks are at most ${inches(a + b, step)} apart, so the tape cannot read ${inches(c, step)}. Check the marks.`;
  if (c <= Math.abs(a - b))
    return `The marks are at least ${inches(Math.abs(a - b), step)} apart, so the tape cannot read ${inches(c, step)}. Check the marks.`;
  return null;
}
