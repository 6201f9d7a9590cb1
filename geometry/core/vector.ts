import type { Point } from './point';

export const add = (a: Point, b: Point): Point => [a[0] + b[0], a[1] + b[1]];
export const subtract = (a: Point, b: Point): Point => [a[0] - b[0], a[1] - b[1]];
export const scale = (a: Point, k: number): Point => [a[0] * k, a[1] * k];
export const dot = (a: Point, b: Point): number => a[0] * b[0] + a[1] * b[1];
/** z of the cross product; positive when b lies counter-clockwise of a. */
export const cross = (a: Point, b: Point): number => a[0] * b[1] - a[1] * b[0];
export const length = (a: Point): number => Math.hypot(a[0], a[1]);
export const distance = (a: Point, b: Point): number => Math.hypot(b[0] - a[0], b[1] - a[1]);
/** Quarter turn counter-clockwise. */
export const leftNormal = (a: Point): Point => [-a[1], a[0]];
/** Quarter turn clockwise. */
export const rightNormal = (a: Point): Point => [a[1], -a[0]];
/** Point at `along` inches from `origin` in the direction of the unit vector `direction`. */
export const along = (origin: Point, direction: Point, inches: number): Point => [
  origin[0] + direction[0] * inches,
  origin[1] + direction[1] * inches,
];
/** Unit vector from a to b, or null when they are the same point. */
export function unit(a: Point, b: Point): Point | null {
  const d = distance(a, b);
  return d === 0 ? null : [(b[0] - a[0]) / d, (b[1] - a[1]) / d];
}
/** Turns a vector counter-clockwise by `angle` radians. */
export function rotate(a: Point, angle: number): Point {
  const c = Math.cos(angle);
  const s = Math.sin(angle);
  return [a[0] * c - a[1] * s, a[0] * s + a[1] * c];
}
