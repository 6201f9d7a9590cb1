import type { Layout, Mark, Tie } from '@/geometry/core/layout';
import { wallLabel } from '@/geometry/core/layout';
import type { NextMeasurement } from '@/geometry/room/types';

/** Something to measure. */
export type Target =
  | { readonly kind: 'wall'; readonly wall: string }
  | { readonly kind: 'corner'; readonly between: readonly [string, string] }
  /** `id` is null while the tie has not been taken. */
  | { readonly kind: 'tie'; readonly id: string | null; readonly from: Mark; readonly to: Mark };

/** Name of a reading as the room fit names it: `wall A`, `corner A-B`, `tie t1`. */
export function observationOf(target: Target): string {
  switch (target.kind) {
    case 'wall':
      return `wall ${target.wall}`;
    case 'corner':
      return `corner ${target.between.join('-')}`;
    case 'tie':
      return target.id === null ? `new tie ${markKey(target.from)} ${markKey(target.to)}` : `tie ${target.id}`;
  }
}

const markKey = (mark: Mark): string => `${mark.wall}@${mark.at}`;

/** The target an observation name stands for, or null when it is gone. */
export function targetOf(layout: Layout, observation: string): Target | null {
  const [kind, ...rest] = observation.split(' ');
  const name = rest.join(' ');
  if (kind === 'wall') return layout.room.walls.some((w) => w.id === name) ? { kind: 'wall', wall: name } : null;
  if (kind === 'corner') {
    const corner = layout.room.corners.find((c) => c.between.join('-') === name);
    return corner ? { kind: 'corner', between: corner.between } : null;
  }
  const tie = layout.room.ties.find((t) => t.id === name);
  return tie ? tieTarget(tie) : null;
}

const tieTarget = (tie: Tie): Target => ({ kind: 'tie', id: tie.id, from: tie.from, to: tie.to });

/** The order a person walks a room: wall, corner, wall, corner … then the ties taken, then the one to take next. */
export function walkOf(layout: Layout, next: NextMeasurement | null): Target[] {
  const { walls, corners, ties } = layout.room;
  const walk: Target[] = [];
  walls.forEach((wall) => {
    walk.push({ kind: 'wall', wall: wall.id });
    const corner = corners.find((c) => c.between[0] === wall.id);
    if (corner) walk.push({ kind: 'corner', between: corner.between });
  });
  walk.push(...ties.map(tieTarget));
  if (next?.kind === 'tie') walk.push({ kind: 'tie', id: null, from: next.from, to: next.to });
  return walk;
}

/** Whether something was read there. */
export function isTaken(layout: Layout, target: Target): boolean {
  switch (target.kind) {
    case 'wall':
      return (layout.room.walls.find((w) => w.id === target.wall)?.length.length ?? 0) > 0;
    case 'corner': {
      const corner = layout.room.corners.find((c) => c.between.join() === target.between.join());
      return corner?.triangle !== undefined || corner?.angle !== undefined;
    }
    case 'tie':
      return target.id !== null;
  }
}

/** The first target not taken after this one, walking on and then round from the start; null when all are taken. */
export function nextTarget(layout: Layout, next: NextMeasurement | null, after: Target | null): Target | null {
  const walk = walkOf(layout, next);
  const at = after ? walk.findIndex((t) => observationOf(t) === observationOf(after)) : -1;
  const round = [...walk.slice(at + 1), ...walk.slice(0, Math.max(at, 0))];
  return round.find((target) => !isTaken(layout, target)) ?? null;
}

/** Two readings more than needed: one shows that something slipped, two can often say what. */
export const ENOUGH_SPARE = 2;

/** Readings of walls and corners that fix the room, and how many there are with the ties, ignored ones left out. */
export function spareAfter(layout: Layout, more = 0): number {
  const { walls, corners, ties, ignore, closed } = layout.room;
  const kept = (name: string) => !ignore.includes(name);
  const lengths = walls.filter((w) => kept(`wall ${w.id}`)).reduce((sum, w) => sum + w.length.length, 0);
  const angles = corners.filter(
    (c) => (c.triangle || c.angle !== undefined) && kept(`corner ${c.between.join('-')}`),
  ).length;
  const across = ties.filter((t) => kept(`tie ${t.id}`)).length;
  const unknown = closed ? 2 * walls.length - 3 : 2 * walls.length - 1;
  return lengths + angles + across + more - unknown;
}

/** Whether the walk goes on with a cross once every wall and corner is read: a straight wall has nothing to cross. */
export const wantsCross = (layout: Layout, more = 0): boolean =>
  layout.room.walls.length > 1 && spareAfter(layout, more) < ENOUGH_SPARE;

const labelOf = (layout: Layout, wall: string): string => {
  const index = layout.room.walls.findIndex((w) => w.id === wall);
  return index < 0 ? wall : wallLabel(index);
};

/** "Wall B", "Corner A-B", "Cross, A's left end to C's right end". */
export function targetName(layout: Layout, target: Target): string {
  switch (target.kind) {
    case 'wall':
      return `Wall ${labelOf(layout, target.wall)}`;
    case 'corner':
      return `Corner ${target.between.map((wall) => labelOf(layout, wall)).join('-')}`;
    case 'tie':
      return `Cross ${markName(layout, target.from)} to ${markName(layout, target.to)}`;
  }
}

/** A mark in words: the corner it is, or how far along its wall. */
export function markName(layout: Layout, mark: Mark): string {
  const { walls, closed } = layout.room;
  const index = walls.findIndex((w) => w.id === mark.wall);
  const label = labelOf(layout, mark.wall);
  if (mark.at === 0) {
    const before = index > 0 ? walls[index - 1] : closed ? walls[walls.length - 1] : undefined;
    return before ? `${labelOf(layout, before.id)}-${label}` : `${label} left end`;
  }
  if (mark.at === 'end') {
    const after = index + 1 < walls.length ? walls[index + 1] : closed ? walls[0] : undefined;
    return after ? `${label}-${labelOf(layout, after.id)}` : `${label} right end`;
  }
  return `${label} at ${mark.at}`;
}

/** Says an observation name the way people read it on the wall: "wall C", "corner A-B", "cross A left end to C right end". */
export function observationWords(layout: Layout, observation: string): string {
  const target = targetOf(layout, observation);
  if (!target) return observation;
  const name = targetName(layout, target);
  return name[0]!.toLowerCase() + name.slice(1);
}
