import type { Point, Polygon } from './point';

/** Signed area, square inches; positive for a counter-clockwise outline. */
export function signedArea(polygon: Polygon): number {
  let twice = 0;
  for (let i = 0; i < polygon.length; i++) {
    const a = polygon[i]!;
    const b = polygon[(i + 1) % polygon.length]!;
    twice += a[0] * b[1] - b[0] * a[1];
  }
  return twice / 2;
}

/** Area without sign, square inches. */
export const area = (polygon: Polygon): number => Math.abs(signedArea(polygon));

/** The same outline, counter-clockwise. */
export function counterClockwise(polygon: Polygon): Polygon {
  return signedArea(polygon) < 0 ? [...polygon].reverse() : polygon;
}

export interface Box {
  readonly minX: number;
  readonly minY: number;
  readonly maxX: number;
  readonly maxY: number;
}

/** Smallest upright box round the points; infinite and inside out when there are none. */
export function boundingBox(points: readonly Point[]): Box {
  let minX = Infinity;
  let minY = Infinity;
  let maxX = -Infinity;
  let maxY = -Infinity;
  for (const [x, y] of points) {
    if (x < minX) minX = x;
    if (x > maxX) maxX = x;
    if (y < minY) minY = y;
    if (y > maxY) maxY = y;
  }
  return { minX, minY, maxX, maxY };
}

/** Even-odd test; a point on the outline may count as either. */
export function contains(polygon: Polygon, [x, y]: Point): boolean {
  let inside = false;
  for (let i = 0, j = polygon.length - 1; i < polygon.length; j = i++) {
    const [xi, yi] = polygon[i]!;
    const [xj, yj] = polygon[j]!;
    if (yi > y !== yj > y && x < ((xj - xi) * (y - yi)) / (yj - yi) + xi) inside = !inside;
  }
  return inside;
}

/** Centre of area; the mean of the corners when the area is nothing. */
export function centroid(polygon: Polygon): Point {
  const a = signedArea(polygon);
  if (a === 0) {
    const n = polygon.length || 1;
    return [polygon.reduce((s, p) => s + p[0], 0) / n, polygon.reduce((s, p) => s + p[1], 0) / n];
  }
  let x = 0;
  let y = 0;
  for (let i = 0; i < polygon.length; i++) {
    const p = polygon[i]!;
    const q = polygon[(i + 1) % polygon.length]!;
    const w = p[0] * q[1] - q[0] * p[1];
    x += (p[0] + q[0]) * w;
    y += (p[1] + q[1]) * w;
  }
  return [x / (6 * a), y / (6 * a)];
}
