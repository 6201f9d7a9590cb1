import type { Polygon } from '../../core/point';
import { boundingBox } from '../../core/polygon';

export interface Span {
  readonly from: number;
  readonly to: number;
}

/**
 * The widest stretch of a piece that no cutout takes at any of the levels, in the units and axes of the outline;
 * `from` above `to` when there is none.
 */
export function widestGap(outline: Polygon, holes: readonly Polygon[], levels: readonly number[]): Span {
  const spans = levels.map((y) => levelSpan(outline, y));
  const from = Math.max(...spans.map((span) => span.from));
  const to = Math.min(...spans.map((span) => span.to));
  const taken = holes
    .map(boundingBox)
    .filter((hole) => levels.some((y) => hole.minY < y && hole.maxY > y))
    .sort((a, b) => a.minX - b.minX);
  const free: Span[] = [];
  let start = from;
  for (const hole of taken) {
    free.push({ from: start, to: Math.min(hole.minX, to) });
    start = Math.max(start, hole.maxX);
  }
  free.push({ from: start, to });
  return free.reduce((best, next) => (next.to - next.from > best.to - best.from ? next : best));
}

/** First and last place where a level line crosses the outline; the level is moved onto the outline if it misses it. */
export function levelSpan(outline: Polygon, level: number): Span {
  const box = boundingBox(outline);
  const slack = (box.maxY - box.minY) * 1e-6;
  const y = Math.min(Math.max(level, box.minY + slack), box.maxY - slack);
  const xs = outline.flatMap((a, i) => {
    const b = outline[(i + 1) % outline.length]!;
    return a[1] > y === b[1] > y ? [] : [a[0] + ((y - a[1]) * (b[0] - a[0])) / (b[1] - a[1])];
  });
  return { from: Math.min(...xs), to: Math.max(...xs) };
}
