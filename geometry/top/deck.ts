import type { RunEnd } from '../core/layout';
import type { Point, Polygon } from '../core/point';

/** Own axes of a run or an island: x along the grain, y from the front edge (0) to the back edge (depth). Proper rotation. */
export interface Frame {
  readonly origin: Point;
  readonly x: Point;
  readonly y: Point;
}

/** One end of a deck in its own axes. */
export interface DeckEnd {
  readonly kind: RunEnd['kind'] | 'edge';
  /** x where the end meets the back edge and the front edge. */
  readonly back: number;
  readonly front: number;
  /** Where a diagonal's joint ends in front of the front edge (y under 0); null elsewhere. */
  readonly wing: Point | null;
  readonly finished: boolean;
  readonly radius: number;
}

/** A run or an island as it lies in the room, in its own axes, before seams and cutouts. */
export interface Deck {
  readonly id: string;
  readonly kind: 'run' | 'island';
  readonly frame: Frame;
  /** Own x = sign x inches along the wall: -1 for a run on the far side of its wall. */
  readonly sign: 1 | -1;
  readonly depth: number;
  /** Counter-clockwise, own axes. */
  readonly outline: Polygon;
  /** Shape of the outline: two parallel long edges and two ends, any convex polygon, or anything. */
  readonly shape: 'strip' | 'convex' | 'free';
  readonly left: DeckEnd;
  readonly right: DeckEnd;
  readonly frontSeen: boolean;
  readonly backSeen: boolean;
}

/** Room place of a point given in own axes. */
export function toRoom({ origin, x, y }: Frame, [px, py]: Point): Point {
  return [origin[0] + x[0] * px + y[0] * py, origin[1] + x[1] * px + y[1] * py];
}

/** Own place of a point given in room axes. */
export function toOwn({ origin, x, y }: Frame, [px, py]: Point): Point {
  const dx = px - origin[0];
  const dy = py - origin[1];
  return [dx * x[0] + dy * x[1], dx * y[0] + dy * y[1]];
}

export const outlineToRoom = (frame: Frame, outline: Polygon): Polygon => outline.map((p) => toRoom(frame, p));
export const outlineToOwn = (frame: Frame, outline: Polygon): Polygon => outline.map((p) => toOwn(frame, p));

/** Outline of a strip between two ends, counter-clockwise from the front left corner. */
export function stripOutline(left: DeckEnd, right: DeckEnd, depth: number): Polygon {
  const points: Point[] = [];
  if (left.wing) points.push(left.wing);
  points.push([left.front, 0]);
  // A triangle's two front corners are one point.
  if (right.front - left.front > SAME_POINT) points.push([right.front, 0]);
  if (right.wing) points.push(right.wing);
  points.push([right.back, depth]);
  if (right.back - left.back > SAME_POINT) points.push([left.back, depth]);
  return points;
}

/** Inches; corners nearer than this are one corner: under any saw, over rounding in float64. */
export const SAME_POINT = 1e-7;

/** x of an end at height y between the front edge (or the wing) and the back edge. */
export function endAt(end: DeckEnd, depth: number, y: number): number {
  const [x0, y0] = end.wing ?? [end.front, 0];
  return x0 + ((end.back - x0) * (y - y0)) / (depth - y0);
}

/** Angle between the back edge and an end, degrees; under 90 the long point is at the back. */
export function endAngleDeg(end: DeckEnd, depth: number, side: 'left' | 'right'): number {
  const [x, y] = end.wing ?? [end.front, 0];
  const inwards = side === 'left' ? x - end.back : end.back - x;
  return (Math.atan2(depth - y, inwards) * 180) / Math.PI;
}

/** Smallest and largest x of the deck. */
export function extent(deck: Deck): readonly [number, number] {
  let min = Infinity;
  let max = -Infinity;
  for (const [x] of deck.outline) {
    if (x < min) min = x;
    if (x > max) max = x;
  }
  return [min, max];
}
