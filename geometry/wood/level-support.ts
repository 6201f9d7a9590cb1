import type { Base, Layout, Wall } from '../core/layout';
import type { Point } from '../core/point';
import type { TopJoint } from '../top/types';
import { footOn } from '../top/wall-frame';
import { constant } from './sourced';
import { baseReach, basesBelow, carriesTop, type Cabinets } from './under';

export const LEVEL_LIMIT = constant('Cabinets out of level along a kitchen', 1 / 8, 'in', 'common practice', '');
export const SPAN_LIMIT = constant('Opening that a top spans without a bracket', 24, 'in', 'common practice', '');
export const LEDGER_MOST = constant(
  'Bare wall at a corner that counts as a corner without a cabinet',
  30,
  'in',
  'our choice',
  'a longer one is taken as cabinets that nobody drew',
);
export const BACKSPLASH_HEIGHT = constant('Backsplash height when it is not drawn', 4, 'in', 'common practice', '');

/** Shim under one base, inches. */
export interface Shim {
  readonly base: string;
  readonly thickness: number;
}

/** Shims as noted on the bases, tallest first. */
export const shimsOf = (bases: readonly Base[]): readonly Shim[] =>
  bases
    .filter((base) => (base.shim ?? 0) > 0)
    .map((base) => ({ base: base.id, thickness: base.shim ?? 0 }))
    .sort((a, b) => b.thickness - a.thickness);

/** A place where something has to be put under the top. */
export interface SupportNeed {
  readonly kind: 'ledger' | 'bracket';
  readonly wall: string;
  /** Inches along the wall. */
  readonly from: number;
  readonly to: number;
  readonly base: string | null;
}

/** Openings that a top cannot span by itself: dishwashers and gaps wider than the limit. */
export function bracketNeeds({ wallById, basesByWall }: Cabinets): readonly SupportNeed[] {
  return [...wallById.values()].flatMap((wall) =>
    (basesByWall.get(wall.id) ?? []).flatMap((base): SupportNeed[] => {
      if (base.kind !== 'dishwasher' && base.kind !== 'opening') return [];
      const [from, to] = baseReach(wall, base);
      return to - from > SPAN_LIMIT.value ? [{ kind: 'bracket', wall: wall.id, from, to, base: base.id }] : [];
    }),
  );
}

/**
 * Corners where bases are drawn on a wall but none stands under the middle of the joint: a ledger on the wall carries it.
 *
 * @param walls - ids of the walls of the joint's two runs
 */
export function ledgerNeeds(
  joint: Pick<TopJoint, 'from' | 'to'>,
  walls: readonly string[],
  cabinets: Cabinets,
): readonly SupportNeed[] {
  const { from, to } = joint;
  const middle: Point = [(from[0] + to[0]) / 2, (from[1] + to[1]) / 2];
  if (basesBelow(cabinets, walls, middle).some(carriesTop)) return [];
  return walls.flatMap((id) => ledgerOn(id, from, cabinets));
}

function ledgerOn(wallId: string, jointBack: Point, { wallById, basesByWall }: Cabinets): readonly SupportNeed[] {
  const wall = wallById.get(wallId);
  const onWall = (basesByWall.get(wallId) ?? []).filter(carriesTop);
  if (!wall || onWall.length === 0) return [];
  const reaches = onWall.map((base) => baseReach(wall, base));
  const nearStart = footOn(wall, jointBack) < wall.length / 2;
  const edge = nearStart ? Math.min(...reaches.map((r) => r[0])) : Math.max(...reaches.map((r) => r[1]));
  const [from, to] = nearStart ? [0, edge] : [edge, wall.length];
  const bare = to - from;
  return bare > 0 && bare <= LEDGER_MOST.value ? [{ kind: 'ledger', wall: wall.id, from, to, base: null }] : [];
}

/** Height of the backsplash a layout draws, inches. */
export function backsplashHeight(layout: Pick<Layout, 'strips'>): number {
  const drawn = layout.strips.filter((strip) => /backsplash/i.test(strip.label)).map((strip) => strip.width);
  return drawn.length > 0 ? Math.max(...drawn) : BACKSPLASH_HEIGHT.value;
}

/** Gap that a leaning wall opens behind the backsplash's top edge (plus) or at its foot (minus), inches. */
export const plumbGap = (wall: Pick<Wall, 'outOfPlumb'>, height: number): number =>
  ((wall.outOfPlumb ?? 0) * height) / 12;
