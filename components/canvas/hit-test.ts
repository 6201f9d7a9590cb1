import type { Point } from '@/geometry/core/point';

import { toScreen, type ScreenPoint, type Viewport } from './viewport';

/** Where on the drawing something can be touched, inches. */
export type HitShape =
  | { readonly kind: 'point'; readonly at: Point }
  | { readonly kind: 'segment'; readonly from: Point; readonly to: Point }
  /** The inside counts as touched; the edge reaches out like a segment. */
  | { readonly kind: 'area'; readonly outline: readonly Point[] }
  /** An upright box of px around a place: a badge or a blade that keeps its size. */
  | {
      readonly kind: 'box';
      readonly at: Point;
      /** px to the right and up from `at`. */
      readonly shift?: readonly [number, number];
      readonly width: number;
      readonly height: number;
      readonly turn?: number;
    };

export interface HitTarget {
  readonly id: string;
  readonly shape: HitShape;
  /** Higher wins over nearer: a seam's handle over a piece over a wall. 0 when left out. */
  readonly rank?: number;
}

/** px; half of the 44 a finger needs. */
export const REACH = 22;

/**
 * What a touch means: among all targets within reach the highest rank, among those the nearest, among equals the last painted.
 *
 * @param at - px
 * @param reach - px around a shape that still count
 */
export function hitTest<T extends HitTarget>(
  targets: readonly T[],
  view: Viewport,
  at: ScreenPoint,
  reach: number = REACH,
): T | null {
  let best: { readonly target: T; readonly distance: number } | null = null;
  for (const target of targets) {
    const distance = distanceTo(target.shape, view, at);
    if (distance > reach) continue;
    if (best === null || wins(target, distance, best)) best = { target, distance };
  }
  return best?.target ?? null;
}

function wins(
  target: HitTarget,
  distance: number,
  best: { readonly target: HitTarget; readonly distance: number },
): boolean {
  const rank = target.rank ?? 0;
  const bestRank = best.target.rank ?? 0;
  return rank === bestRank ? distance <= best.distance : rank > bestRank;
}

/** px from a touch to a shape, 0 inside it. */
export function distanceTo(shape: HitShape, view: Viewport, at: ScreenPoint): number {
  switch (shape.kind) {
    case 'point':
      return apart(toScreen(view, shape.at), at);
    case 'segment':
      return segmentDistance(toScreen(view, shape.from), toScreen(view, shape.to), at);
    case 'area':
      return areaDistance(
        shape.outline.map((point) => toScreen(view, point)),
        at,
      );
    case 'box':
      return boxDistance(shape, view, at);
  }
}

/** Where a shape's middle is, inches; the list twin stands there. */
export function middleOf(shape: HitShape): Point {
  if (shape.kind === 'point' || shape.kind === 'box') return shape.at;
  if (shape.kind === 'segment') return [(shape.from[0] + shape.to[0]) / 2, (shape.from[1] + shape.to[1]) / 2];
  const count = Math.max(shape.outline.length, 1);
  const sum = shape.outline.reduce<Point>((total, [x, y]) => [total[0] + x, total[1] + y], [0, 0]);
  return [sum[0] / count, sum[1] / count];
}

const apart = (a: ScreenPoint, b: ScreenPoint): number => Math.hypot(a[0] - b[0], a[1] - b[1]);

function segmentDistance(from: ScreenPoint, to: ScreenPoint, at: ScreenPoint): number {
  const dx = to[0] - from[0];
  const dy = to[1] - from[1];
  const square = dx * dx + dy * dy;
  const along = square === 0 ? 0 : ((at[0] - from[0]) * dx + (at[1] - from[1]) * dy) / square;
  const t = Math.min(1, Math.max(0, along));
  return apart([from[0] + t * dx, from[1] + t * dy], at);
}

function areaDistance(outline: readonly ScreenPoint[], at: ScreenPoint): number {
  let inside = false;
  let nearest = Infinity;
  for (let i = 0; i < outline.length; i++) {
    const a = outline[i]!;
    const b = outline[(i + 1) % outline.length]!;
    nearest = Math.min(nearest, segmentDistance(a, b, at));
    const crosses = a[1] > at[1] !== b[1] > at[1];
    if (crosses && at[0] < a[0] + ((at[1] - a[1]) / (b[1] - a[1])) * (b[0] - a[0])) inside = !inside;
  }
  return inside ? 0 : nearest;
}

function boxDistance(box: HitShape & { readonly kind: 'box' }, view: Viewport, at: ScreenPoint): number {
  const [placeX, placeY] = toScreen(view, box.at);
  const x = placeX + (box.shift?.[0] ?? 0);
  const y = placeY - (box.shift?.[1] ?? 0);
  const turn = box.turn ?? 0;
  // The screen's y points down, so a counter-clockwise turn of the box is undone by turning the touch the same way.
  const dx = (at[0] - x) * Math.cos(turn) - (at[1] - y) * Math.sin(turn);
  const dy = (at[0] - x) * Math.sin(turn) + (at[1] - y) * Math.cos(turn);
  return Math.hypot(Math.max(0, Math.abs(dx) - box.width / 2), Math.max(0, Math.abs(dy) - box.height / 2));
}
