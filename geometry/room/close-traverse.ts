import type { Point } from '../core/point';

/** One leg of a walk round the room. */
export interface Leg {
  /** Radians, counter-clockwise from +x. */
  readonly bearing: number;
  readonly length: number;
}

export interface Traverse {
  /** Where every leg begins, and last where the walk ends. */
  readonly points: readonly Point[];
  /** From the beginning to where the walk ends before anything is corrected. */
  readonly misclosure: Point;
}

/** The points of a walk along `legs` from `start`, nothing corrected. */
export function walk(legs: readonly Leg[], start: Point = [0, 0]): Traverse {
  const points: Point[] = [start];
  let [x, y] = start;
  for (const { bearing, length } of legs) {
    x += length * Math.cos(bearing);
    y += length * Math.sin(bearing);
    points.push([x, y]);
  }
  return { points, misclosure: [x - start[0], y - start[1]] };
}

/**
 * The same walk closed by the compass rule: every point is moved back by its share, by length walked, of the
 * misclosure, so that the walk ends where it began.
 *
 * @see any surveying course, e.g. J. Mahun, Traverse computations, ch. I; only a start for the adjustment here
 */
export function closeTraverse(legs: readonly Leg[], start: Point = [0, 0]): Traverse {
  const open = walk(legs, start);
  const total = legs.reduce((sum, leg) => sum + leg.length, 0);
  if (total === 0) return open;
  let walked = 0;
  const points = open.points.map(([x, y], i): Point => {
    if (i > 0) walked += legs[i - 1]!.length;
    const share = walked / total;
    return [x - open.misclosure[0] * share, y - open.misclosure[1] * share];
  });
  return { points, misclosure: open.misclosure };
}
