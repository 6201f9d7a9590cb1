import type { Point, Polygon } from '../core/point';

/** Convex hull, counter-clockwise (Andrew's monotone chain, n log n). */
export function convexHull(points: readonly Point[]): Polygon {
  const sorted = [...points].sort((a, b) => a[0] - b[0] || a[1] - b[1]);
  if (sorted.length < 3) return sorted;
  const chain = (list: readonly Point[]): Point[] => {
    const hull: Point[] = [];
    for (const p of list) {
      while (hull.length > 1 && turn(hull[hull.length - 2]!, hull[hull.length - 1]!, p) <= 0) hull.pop();
      hull.push(p);
    }
    hull.pop();
    return hull;
  };
  return [...chain(sorted), ...chain(sorted.reverse())];
}

const turn = (a: Point, b: Point, c: Point): number => (b[0] - a[0]) * (c[1] - a[1]) - (b[1] - a[1]) * (c[0] - a[0]);

/** Inches; an edge this short has no direction to speak of. */
const SAME_POINT = 1e-9;

/** The narrowest gap a shape passes flat, and how long it is square to that. Inches. */
export interface LeastWidth {
  readonly width: number;
  readonly length: number;
}

/**
 * Least width of a set of points over all rotations. One edge of the hull always lies along the narrowest strip, so every
 * edge is tried with the point furthest from it, which moves on round the hull as the edges do (rotating calipers).
 */
export function leastWidth(points: readonly Point[]): LeastWidth {
  const hull = convexHull(points);
  const n = hull.length;
  if (n < 2) return { width: 0, length: 0 };
  let best: LeastWidth = { width: Infinity, length: 0 };
  let far = 1;
  for (let i = 0; i < n; i++) {
    const a = hull[i]!;
    const b = hull[(i + 1) % n]!;
    const size = Math.hypot(b[0] - a[0], b[1] - a[1]);
    if (size < SAME_POINT) continue;
    const away = (k: number) => Math.abs(turn(a, b, hull[k % n]!)) / size;
    while (away(far + 1) > away(far)) far++;
    const width = away(far);
    if (width < best.width) best = { width, length: extentAlong(hull, a, b) };
  }
  return best.width === Infinity ? { width: 0, length: 0 } : best;
}

function extentAlong(points: readonly Point[], [ax, ay]: Point, [bx, by]: Point): number {
  const size = Math.hypot(bx - ax, by - ay);
  let min = Infinity;
  let max = -Infinity;
  for (const [x, y] of points) {
    const along = ((bx - ax) * (x - ax) + (by - ay) * (y - ay)) / size;
    min = Math.min(min, along);
    max = Math.max(max, along);
  }
  return max - min;
}
