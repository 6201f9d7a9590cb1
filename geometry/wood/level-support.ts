import type { Base, Layout, Wall } from '../core/layout';
import type { Point } from '../core/point';
import type { TopJoint, Tops } from '../top/types';
import { footOn, type WallFrame } from '../top/wall-frame';
import { constant } from './sourced';
import { baseReach, carriesTop, liesOver } from './under';

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

/** Openings wider than a top spans by itself: dishwashers and gaps that need a bracket, wider ones than the limit. */
export function bracketNeeds(bases: readonly Base[], walls: readonly WallFrame[]): readonly SupportNeed[] {
  return bases.flatMap((base): SupportNeed[] => {
    const wall = walls.find((w) => w.id === base.wall);
    if (!wall || (base.kind !== 'dishwasher' && base.kind !== 'opening')) return [];
    const [from, to] = baseReach(wall, base);
    return to - from > SPAN_LIMIT.value ? [{ kind: 'bracket', wall: wall.id, from, to, base: base.id }] : [];
  });
}

/** Corners where bases are drawn on a wall but none stands under the joint: a ledger on the wall carries it. */
export function ledgerNeeds(
  tops: Pick<Tops, 'joints' | 'runs'>,
  bases: readonly Base[],
  walls: readonly WallFrame[],
): readonly SupportNeed[] {
  return tops.joints.flatMap((joint) => joint.between.flatMap((id) => ledgerOn(joint, id, tops, bases, walls)));
}

function ledgerOn(
  joint: TopJoint,
  runId: string,
  tops: Pick<Tops, 'runs'>,
  bases: readonly Base[],
  walls: readonly WallFrame[],
): readonly SupportNeed[] {
  const wall = walls.find((w) => w.id === tops.runs.find((r) => r.id === runId)?.wall);
  const onWall = bases.filter((base) => base.wall === wall?.id && carriesTop(base));
  if (!wall || onWall.length === 0 || isCarried(walls, bases, joint)) return [];
  const corner = Math.min(Math.max(footOn(wall, joint.from), 0), wall.length);
  const reaches = onWall.map((base) => baseReach(wall, base));
  const nearStart = corner < wall.length / 2;
  const edge = nearStart ? Math.min(...reaches.map((r) => r[0])) : Math.max(...reaches.map((r) => r[1]));
  const [from, to] = nearStart ? [0, edge] : [edge, wall.length];
  const bare = to - from;
  return bare > 0 && bare <= LEDGER_MOST.value ? [{ kind: 'ledger', wall: wall.id, from, to, base: null }] : [];
}

/** Whether a cabinet stands under the middle of a joint. */
function isCarried(walls: readonly WallFrame[], bases: readonly Base[], { from, to }: TopJoint): boolean {
  const middle: Point = [(from[0] + to[0]) / 2, (from[1] + to[1]) / 2];
  return bases.some((base) => {
    const wall = walls.find((w) => w.id === base.wall);
    return wall !== undefined && carriesTop(base) && liesOver(wall, base, middle);
  });
}

/** Height of the backsplash a layout draws, inches. */
export function backsplashHeight(layout: Pick<Layout, 'strips'>): number {
  const drawn = layout.strips.filter((strip) => /backsplash/i.test(strip.label)).map((strip) => strip.width);
  return drawn.length > 0 ? Math.max(...drawn) : BACKSPLASH_HEIGHT.value;
}

/** Gap that a leaning wall opens behind the backsplash's top edge (plus) or at its foot (minus), inches. */
export const plumbGap = (wall: Pick<Wall, 'outOfPlumb'>, height: number): number =>
  ((wall.outOfPlumb ?? 0) * height) / 12;
