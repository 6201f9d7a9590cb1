import type { Point, Polygon } from '../core/point';

/** Inches; a point this near to an edge counts as on it. */
const ON_EDGE = 1e-9;

/** Whether no corner of a counter-clockwise outline turns inwards. */
export function isConvex(polygon: Polygon): boolean {
  const n = polygon.length;
  for (let i = 0; i < n; i++) {
    const a = polygon[i]!;
    const b = polygon[(i + 1) % n]!;
    const c = polygon[(i + 2) % n]!;
    if ((b[0] - a[0]) * (c[1] - b[1]) - (b[1] - a[1]) * (c[0] - b[0]) < -ON_EDGE) return false;
  }
  return n >= 3;
}

/** Whether every point lies in a convex counter-clockwise outline, its edges included. */
export function insideConvex(convex: Polygon, points: readonly Point[]): boolean {
  for (let i = 0; i < convex.length; i++) {
    const a = convex[i]!;
    const b = convex[(i + 1) % convex.length]!;
    const ex = b[0] - a[0];
    const ey = b[1] - a[1];
    for (const [x, y] of points) if (ex * (y - a[1]) - ey * (x - a[0]) < -ON_EDGE) return false;
  }
  return true;
}

/**
 * The part of an outline to the left of the directed line from a to b (Sutherland-Hodgman). Exact for a convex outline;
 * for others the pieces hang together by edges of no width.
 */
export function clipHalfPlane(polygon: Polygon, a: Point, b: Point): Polygon {
  const ex = b[0] - a[0];
  const ey = b[1] - a[1];
  const sideOf = ([x, y]: Point) => ex * (y - a[1]) - ey * (x - a[0]);
  const kept: Point[] = [];
  for (let i = 0; i < polygon.length; i++) {
    const p = polygon[i]!;
    const q = polygon[(i + 1) % polygon.length]!;
    const sp = sideOf(p);
    const sq = sideOf(q);
    if (sp >= 0) kept.push(p);
    if ((sp > 0 && sq < 0) || (sp < 0 && sq > 0)) {
      const t = sp / (sp - sq);
      kept.push([p[0] + (q[0] - p[0]) * t, p[1] + (q[1] - p[1]) * t]);
    }
  }
  return kept;
}

/** The part of a convex outline inside another convex one; fewer than three points when there is none. */
export function clipConvex(polygon: Polygon, by: Polygon): Polygon {
  let rest = polygon;
  for (let i = 0; i < by.length && rest.length > 2; i++) rest = clipHalfPlane(rest, by[i]!, by[(i + 1) % by.length]!);
  return rest;
}
