import type { Point } from '../core/point';

/** A point whose free coordinates are unknowns; a fixed coordinate keeps its value. */
export interface NetworkPoint {
  readonly start: Point;
  readonly freeX: boolean;
  readonly freeY: boolean;
}

/** A place in the network: a point, or the place `at` inches from it on the way to the point `toward`. */
export interface NetworkMark {
  readonly point: number;
  readonly toward?: number;
  readonly at?: number;
}

/** Something that follows from the points; points go by their index, lengths in one unit, angles in radians. */
export type NetworkQuantity =
  | { readonly kind: 'distance'; readonly from: NetworkMark; readonly to: NetworkMark }
  /** Counter-clockwise at `at`, from the direction of `from` to that of `to`, 0 to 2 pi. */
  | { readonly kind: 'angle'; readonly at: number; readonly from: number; readonly to: number }
  /** Direction from one point to another, counter-clockwise from +x, 0 to 2 pi. */
  | { readonly kind: 'bearing'; readonly from: number; readonly to: number };

/** A measured quantity with its a-priori standard deviation, in the unit of its value. */
export interface NetworkObservation {
  readonly quantity: NetworkQuantity;
  readonly value: number;
  readonly sd: number;
}
