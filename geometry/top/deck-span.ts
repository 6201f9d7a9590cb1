import type { Polygon } from '../core/point';

/** Places where a line across the grain at `x` enters and leaves an outline, rising y; an even number of them. */
export function crossings(outline: Polygon, x: number): readonly number[] {
  const ys: number[] = [];
  for (let i = 0; i < outline.length; i++) {
    const a = outline[i]!;
    const b = outline[(i + 1) % outline.length]!;
    if (a[0] > x !== b[0] > x) ys.push(a[1] + ((b[1] - a[1]) * (x - a[0])) / (b[0] - a[0]));
  }
  return ys.sort((p, q) => p - q);
}

/** Lowest and highest place of an outline on the line across the grain at `x`, or null when the line misses it. */
export function spanAt(outline: Polygon, x: number): readonly [number, number] | null {
  const ys = crossings(outline, x);
  return ys.length < 2 ? null : [ys[0]!, ys[ys.length - 1]!];
}
