import type { Point } from '@/geometry/core/point';
import { distance, dot, subtract, unit } from '@/geometry/core/vector';
import type { Plan } from '@/geometry/plan/types';
import type { OnWall } from '../editor/tools/tool';
import { wallEnds } from './room-targets';

/** The wall nearest to a place on the drawing, and where on it; null when none is within `reach` inches. */
export function wallUnder(plan: Plan, at: Point, reach: number): OnWall | null {
  let best: (OnWall & { readonly off: number }) | null = null;
  for (const { id } of plan.room?.walls ?? []) {
    const on = onWall(plan, id, at);
    if (on && on.off <= reach && (best === null || on.off < best.off)) best = on;
  }
  return best && { wall: best.wall, at: best.at, length: best.length };
}

/** Where a place lies along one wall, inches from its left end. */
export function onWall(plan: Plan, wall: string, at: Point): (OnWall & { readonly off: number }) | null {
  const ends = wallEnds(plan, wall);
  const direction = ends && unit(...ends);
  if (!direction) return null;
  const [from, to] = ends;
  const length = distance(from, to);
  const along = Math.min(length, Math.max(0, dot(subtract(at, from), direction)));
  const foot: Point = [from[0] + direction[0] * along, from[1] + direction[1] * along];
  return { wall, at: along, length, off: distance(foot, at) };
}
