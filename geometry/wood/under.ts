import type { Base } from '../core/layout';
import type { Point } from '../core/point';
import { dot, subtract } from '../core/vector';
import type { WallFrame } from '../top/wall-frame';
import { alongWall, footOn } from '../top/wall-frame';

/** Bases that carry a top; the others are gaps it spans. */
const CARRIES: readonly Base['kind'][] = ['cabinet', 'sink base', 'corner base'];
const STANDS_UNDER: readonly Base['kind'][] = [...CARRIES, 'dishwasher', 'range', 'opening'];

export const carriesTop = (base: Pick<Base, 'kind'>): boolean => CARRIES.includes(base.kind);

/** Whether the base stands under a top at all, and is not a window or a pipe. */
export const standsUnder = (base: Pick<Base, 'kind'>): boolean => STANDS_UNDER.includes(base.kind);

/** Inches along the wall that a base takes up. */
export const baseReach = (wall: WallFrame, base: Pick<Base, 'from' | 'to'>): readonly [number, number] => [
  base.from,
  alongWall(wall, base.to),
];

/** Whether a place in the room lies over a base, `slack` inches past its sides still counting. */
export function liesOver(wall: WallFrame, base: Base, point: Point, slack = 0): boolean {
  const at = footOn(wall, point);
  const out = dot(subtract(point, wall.start), wall.inward);
  const [from, to] = baseReach(wall, base);
  return at >= from - slack && at <= to + slack && out >= -slack && out <= base.depth + slack;
}

/** A hand's reach: a bolt this far from the cabinet's side is still turned from inside it, inches. */
const REACH = 3;

/** Fractions of a joint's length at which it is asked what stands below. */
const PROBES = [0.15, 0.5, 0.85] as const;

/** What a hand finds below a joint. */
export type AccessBelow = 'open' | 'none' | 'not drawn';

/** What stands along the walls, to be looked up by wall. */
export interface Cabinets {
  readonly wallById: ReadonlyMap<string, WallFrame>;
  readonly basesByWall: ReadonlyMap<string, readonly Base[]>;
}

export function cabinetsOf(walls: readonly WallFrame[], bases: readonly Base[]): Cabinets {
  const basesByWall = new Map<string, Base[]>(walls.map((wall) => [wall.id, []]));
  for (const base of bases) basesByWall.get(base.wall)?.push(base);
  return { wallById: new Map(walls.map((wall) => [wall.id, wall])), basesByWall };
}

/** Bases of some walls that a place in the room lies over. */
export function basesBelow({ wallById, basesByWall }: Cabinets, walls: readonly string[], point: Point, slack = 0) {
  return walls.flatMap((id) => {
    const wall = wallById.get(id);
    return wall ? (basesByWall.get(id) ?? []).filter((base) => liesOver(wall, base, point, slack)) : [];
  });
}

/**
 * Whether a joint can be bolted from below: 'open' when every part of it that has a base below lies over one that a hand
 * gets into, 'none' when some part lies only over closed ones, 'not drawn' when nothing stands there in the layout.
 *
 * @param walls - ids of the walls whose bases may lie under it
 * @param from - back point of the joint; `to` - front point, room axes
 */
export function accessBelow(cabinets: Cabinets, walls: readonly string[], from: Point, to: Point): AccessBelow {
  let drawn = false;
  for (const t of PROBES) {
    const point: Point = [from[0] + (to[0] - from[0]) * t, from[1] + (to[1] - from[1]) * t];
    const below = basesBelow(cabinets, walls, point, REACH).filter(standsUnder);
    if (below.length === 0) continue;
    drawn = true;
    if (!below.some((base) => base.access === 'open')) return 'none';
  }
  return drawn ? 'open' : 'not drawn';
}
