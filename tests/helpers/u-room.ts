import type { Point } from '@/geometry/core/point';

/** A U whose corners are off square, and what a tape would read in it. Inches, angles degrees. */
export interface TapedU {
  readonly walls: readonly [number, number, number];
  readonly angles: readonly [number, number];
  /** Mark to mark, 36 and 48 in from the corner. */
  readonly triangles: readonly [number, number];
  /** Distance between two of the four corner points, 0 at wall A's left end to 3 at wall C's right end. */
  readonly tie: (from: number, to: number) => number;
}

/** Inches to the nearest sixteenth, as a tape is read. */
export const taped = (inches: number): number => Math.round(inches * 16) / 16;

/**
 * Makes up a U from true lengths and angles by plane trigonometry alone, sharing nothing with the solver.
 *
 * @param random - gives numbers from 0 to 1
 */
export function makeU(random: () => number): TapedU {
  const between = (low: number, high: number) => low + (high - low) * random();
  const off = () => between(0.4, 1.6) * (random() < 0.5 ? -1 : 1);
  const walls = [between(70, 104), between(130, 170), between(70, 96)] as const;
  const angles = [90 + off(), 90 + off()] as const;
  const points: Point[] = [[0, 0]];
  let bearing = 0;
  walls.forEach((length, i) => {
    const [x, y] = points[points.length - 1]!;
    points.push([x + length * Math.cos(bearing), y + length * Math.sin(bearing)]);
    if (i < 2) bearing -= Math.PI - (angles[i]! * Math.PI) / 180;
  });
  const chord = (angle: number) => Math.sqrt(36 * 36 + 48 * 48 - 2 * 36 * 48 * Math.cos((angle * Math.PI) / 180));
  return {
    walls: [taped(walls[0]), taped(walls[1]), taped(walls[2])],
    angles,
    triangles: [taped(chord(angles[0])), taped(chord(angles[1]))],
    tie: (from, to) => taped(Math.hypot(points[from]![0] - points[to]![0], points[from]![1] - points[to]![1])),
  };
}
