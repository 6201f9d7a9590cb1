import type { Point, Polygon } from '@/geometry/core/point';
import type { NestInstance, NestPart, NestPlan, NestSlab } from '@/geometry/nest/types';
import { nest } from '@/geometry/nest/nest';

/** A slab 96 x 25 in at $379, as many as wanted. */
export const slab = (overrides: Partial<NestSlab> = {}): NestSlab => ({
  id: 'S96',
  length: 96,
  depth: 25,
  price: 37_900,
  count: null,
  ...overrides,
});

export const rectangle = (length: number, depth: number): Polygon => [
  [0, 0],
  [length, 0],
  [length, depth],
  [0, depth],
];

/** A part between slopes dx/dy `left` and `right`, `mid` long at mid-depth. */
export function trapezoid(mid: number, left: number, right: number, depth = 25): Polygon {
  const half = depth / 2;
  const points: Point[] = [
    [-left * half, 0],
    [mid - right * half, 0],
    [mid + right * half, depth],
    [left * half, depth],
  ];
  const minX = Math.min(...points.map((p) => p[0]));
  return points.map(([x, y]): Point => [x - minX, y]);
}

/** A square-ended part of the slab's depth. */
export const run = (id: string, length: number, overrides: Partial<NestPart> = {}): NestPart => ({
  id,
  outline: rectangle(length, 25),
  ...overrides,
});

/** Kerf 1/8 in, trim 1/2 in, offcuts kept from 18 in, one kind of slab and no parts. */
export const instance = (overrides: Partial<NestInstance> = {}): NestInstance => ({
  id: 'case',
  kerf: 0.125,
  trim: 0.5,
  reuseMin: 18,
  stock: [slab()],
  parts: [],
  ...overrides,
});

/** The plan of an instance that has one. */
export function planOf(given: NestInstance, workLimit = 400_000): NestPlan {
  const plan = nest(given, { workLimit, evidence: true });
  if ('error' in plan) throw new Error(plan.error.message);
  return plan;
}
