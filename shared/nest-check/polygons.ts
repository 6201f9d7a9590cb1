import type { Point, Polygon } from '@/geometry/core/point';

/** Plane geometry of the checker, written apart from the engine's on purpose. All outlines are convex and counter-clockwise. */

export interface HalfPlane {
  /** Keeps the points p with nx x + ny y <= c; (nx, ny) has length 1. */
  readonly nx: number;
  readonly ny: number;
  readonly c: number;
}

/** The half plane to the left of the way from p to q. */
export function leftOf(p: Point, q: Point): HalfPlane {
  const dx = q[0] - p[0];
  const dy = q[1] - p[1];
  const size = Math.hypot(dx, dy);
  const nx = dy / size;
  const ny = -dx / size;
  return { nx, ny, c: nx * p[0] + ny * p[1] };
}

export const flip = ({ nx, ny, c }: HalfPlane): HalfPlane => ({ nx: -nx, ny: -ny, c: -c });

/** How far a point lies beyond the half plane's edge, inches; negative inside. */
export const beyond = ({ nx, ny, c }: HalfPlane, [x, y]: Point): number => nx * x + ny * y - c;

/** Greatest of the distances beyond the edge over an outline. */
export const mostBeyond = (plane: HalfPlane, outline: Polygon): number =>
  outline.reduce((most, p) => Math.max(most, beyond(plane, p)), -Infinity);

/** The part of an outline inside a half plane; empty when there is none. */
export function clip(outline: Polygon, plane: HalfPlane): Polygon {
  const kept: Point[] = [];
  outline.forEach((p, i) => {
    const q = outline[(i + 1) % outline.length]!;
    const a = beyond(plane, p);
    const b = beyond(plane, q);
    if (a <= 0) kept.push(p);
    if ((a < 0 && b > 0) || (a > 0 && b < 0)) {
      const t = a / (a - b);
      kept.push([p[0] + t * (q[0] - p[0]), p[1] + t * (q[1] - p[1])]);
    }
  });
  return kept.length >= 3 ? kept : [];
}

export function areaOf(outline: Polygon): number {
  let sum = 0;
  for (let i = 1; i + 1 < outline.length; i++) {
    const [ox, oy] = outline[0]!;
    const [ax, ay] = outline[i]!;
    const [bx, by] = outline[i + 1]!;
    sum += ((ax - ox) * (by - oy) - (bx - ox) * (ay - oy)) / 2;
  }
  return Math.abs(sum);
}

export function edgesOf(outline: Polygon): (readonly [Point, Point])[] {
  return outline.map((p, i) => [p, outline[(i + 1) % outline.length]!] as const);
}

export function spanOf(outline: Polygon): { minX: number; maxX: number; minY: number; maxY: number } {
  const xs = outline.map((p) => p[0]);
  const ys = outline.map((p) => p[1]);
  return { minX: Math.min(...xs), maxX: Math.max(...xs), minY: Math.min(...ys), maxY: Math.max(...ys) };
}

/** How deep two outlines lie in each other, inches; 0 or less when a straight line parts them. */
export function overlapDepth(a: Polygon, b: Polygon): number {
  let least = Infinity;
  for (const [one, other] of [
    [a, b],
    [b, a],
  ] as const)
    for (const [p, q] of edgesOf(one)) {
      const out = flip(leftOf(p, q));
      least = Math.min(least, mostBeyond(out, other));
    }
  return least;
}

/** Least distance between two outlines that do not overlap, inches. */
export function distanceBetween(a: Polygon, b: Polygon): number {
  let least = Infinity;
  for (const [one, other] of [
    [a, b],
    [b, a],
  ] as const)
    for (const point of one) for (const [p, q] of edgesOf(other)) least = Math.min(least, toSegment(point, p, q));
  return least;
}

function toSegment([x, y]: Point, [px, py]: Point, [qx, qy]: Point): number {
  const dx = qx - px;
  const dy = qy - py;
  const t = Math.max(0, Math.min(1, ((x - px) * dx + (y - py) * dy) / (dx * dx + dy * dy || 1)));
  return Math.hypot(x - px - t * dx, y - py - t * dy);
}

/** Smallest convex outline round some points. */
export function hullOf(points: readonly Point[]): Polygon {
  const sorted = [...points].sort((a, b) => a[0] - b[0] || a[1] - b[1]);
  const half = (list: readonly Point[]): Point[] => {
    const chain: Point[] = [];
    for (const p of list) {
      while (chain.length > 1 && turn(chain[chain.length - 2]!, chain[chain.length - 1]!, p) <= 0) chain.pop();
      chain.push(p);
    }
    return chain.slice(0, -1);
  };
  return [...half(sorted), ...half([...sorted].reverse())];
}

const turn = (a: Point, b: Point, c: Point): number => (b[0] - a[0]) * (c[1] - a[1]) - (b[1] - a[1]) * (c[0] - a[0]);
