import type { Point, Polygon } from '../core/point';
import { area } from '../core/polygon';
import { isConvex } from './clip-convex';
import { intersection } from './polygon-boolean';

/**
 * How deep one outline reaches into another, inches: the least shift that parts them. 0 when they are apart or only touch.
 * For an outline that is not convex, the square root of the shared area stands in for it.
 */
export function overlapDepth(a: Polygon, b: Polygon): number {
  if (isConvex(a) && isConvex(b)) return Math.max(0, Math.min(leastShift(a, b), leastShift(b, a)));
  return Math.sqrt(intersection(a, b).reduce((sum, part) => sum + area(part), 0));
}

/** Least overlap over the edge directions of `a` (separating axes), negative when an edge parts the two. */
function leastShift(a: Polygon, b: Polygon): number {
  let least = Infinity;
  for (let i = 0; i < a.length && least > 0; i++) {
    const [px, py] = a[i]!;
    const [qx, qy] = a[(i + 1) % a.length]!;
    const size = Math.hypot(qx - px, qy - py);
    if (size === 0) continue;
    // How far b reaches inwards of this edge: counter-clockwise, so inside is on the left.
    let reach = -Infinity;
    for (const [x, y] of b) reach = Math.max(reach, ((qx - px) * (y - py) - (qy - py) * (x - px)) / size);
    least = Math.min(least, reach);
  }
  return least;
}

/** Inches of a segment that lie deeper than `margin` inside a convex counter-clockwise outline (Cyrus-Beck clipping). */
export function lengthInside(convex: Polygon, from: Point, to: Point, margin: number): number {
  let [t0, t1] = [0, 1];
  for (let i = 0; i < convex.length; i++) {
    const [px, py] = convex[i]!;
    const [qx, qy] = convex[(i + 1) % convex.length]!;
    const size = Math.hypot(qx - px, qy - py);
    if (size === 0) continue;
    const inward = ([x, y]: Point) => ((qx - px) * (y - py) - (qy - py) * (x - px)) / size - margin;
    const [start, end] = [inward(from), inward(to)];
    if (start < 0 && end < 0) return 0;
    if (start < 0) t0 = Math.max(t0, start / (start - end));
    else if (end < 0) t1 = Math.min(t1, start / (start - end));
  }
  return Math.max(0, t1 - t0) * Math.hypot(to[0] - from[0], to[1] - from[1]);
}
