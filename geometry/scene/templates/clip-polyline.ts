import type { Point } from '../../core/point';
import type { Box } from '../../core/polygon';

/** The parts of an open polyline that lie inside a box, in order. */
export function clipPolyline(points: readonly Point[], box: Box): readonly (readonly Point[])[] {
  const parts: Point[][] = [];
  let open: Point[] | null = null;
  for (let i = 0; i + 1 < points.length; i++) {
    const inside = clipSegment(points[i]!, points[i + 1]!, box);
    if (!inside) {
      open = null;
      continue;
    }
    const [from, to, entered, left] = inside;
    if (!open || entered) parts.push((open = [from]));
    open.push(to);
    if (left) open = null;
  }
  return parts;
}

/** Part of a segment inside a box, and whether its start and its end were cut off (Liang and Barsky 1984). */
function clipSegment(a: Point, b: Point, box: Box): readonly [Point, Point, boolean, boolean] | null {
  const [dx, dy] = [b[0] - a[0], b[1] - a[1]];
  let [from, to] = [0, 1];
  const sides = [
    [-dx, a[0] - box.minX],
    [dx, box.maxX - a[0]],
    [-dy, a[1] - box.minY],
    [dy, box.maxY - a[1]],
  ] as const;
  for (const [p, q] of sides) {
    if (p === 0) {
      if (q < 0) return null;
      continue;
    }
    const t = q / p;
    if (p < 0) from = Math.max(from, t);
    else to = Math.min(to, t);
    if (from > to) return null;
  }
  const at = (t: number): Point => (t === 0 ? a : t === 1 ? b : [a[0] + dx * t, a[1] + dy * t]);
  return [at(from), at(to), from > 0, to < 1];
}
