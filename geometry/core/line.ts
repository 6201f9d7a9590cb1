import type { Point } from './point';
import { cross, subtract } from './vector';

/** An endless line through `origin` along the unit vector `direction`. */
export interface Line {
  readonly origin: Point;
  readonly direction: Point;
}

/** Sine of the smallest angle at which two lines still count as crossing: under it the meeting point is worse than a mile away. */
const PARALLEL_SINE = 1e-9;

/** Where two lines cross, or null when they are parallel. */
export function intersect(a: Line, b: Line): Point | null {
  const d = cross(a.direction, b.direction);
  if (Math.abs(d) < PARALLEL_SINE) return null;
  const t = cross(subtract(b.origin, a.origin), b.direction) / d;
  return [a.origin[0] + a.direction[0] * t, a.origin[1] + a.direction[1] * t];
}

/** Distance along `line` from its origin to the foot of `point`, inches; negative behind the origin. */
export function foot(line: Line, point: Point): number {
  const [dx, dy] = subtract(point, line.origin);
  return dx * line.direction[0] + dy * line.direction[1];
}

/** Distance of `point` from `line`, inches; positive to the left of its direction. */
export function offsetOf(line: Line, point: Point): number {
  return cross(line.direction, subtract(point, line.origin));
}
