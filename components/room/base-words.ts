import type { Base, BaseKind } from '@/geometry/core/layout';
import type { IconName } from '../ui/icon-shapes';

interface BaseLook {
  readonly name: string;
  readonly icon: IconName;
  /** Usual width, inches: common practice. */
  readonly width: number;
  readonly depth: number;
}

/** What can stand along a wall, in the words of the shop. */
export const BASE_LOOK: Readonly<Record<BaseKind, BaseLook>> = {
  'sink base': { name: 'Sink base', icon: 'sink', width: 36, depth: 24 },
  cabinet: { name: 'Cabinet', icon: 'stock', width: 30, depth: 24 },
  'corner base': { name: 'Corner base', icon: 'corner', width: 36, depth: 24 },
  dishwasher: { name: 'Dishwasher', icon: 'lay', width: 24, depth: 24 },
  range: { name: 'Range', icon: 'range', width: 30, depth: 25 },
  opening: { name: 'Opening', icon: 'fit', width: 32, depth: 0 },
  window: { name: 'Window', icon: 'window', width: 36, depth: 0 },
  pipe: { name: 'Pipe', icon: 'minus', width: 2, depth: 2 },
};

export const BASE_KINDS = Object.keys(BASE_LOOK) as readonly BaseKind[];

/** Windows hang over what stands on the floor; everything else needs its own stretch of wall. */
export const onFloor = (base: Pick<Base, 'kind'>): boolean => base.kind !== 'window';

/** The right-hand end of what stands on a wall of this length, inches. */
export const baseEnd = (base: Pick<Base, 'to'>, wallLength: number): number =>
  base.to === 'end' ? wallLength : base.to;

/** Why something cannot stand there, in a sentence with the number; null when it can. */
export function basePlaceProblem(
  base: Base,
  all: readonly Base[],
  wallLength: number,
  say: (inches: number) => string,
): string | null {
  const to = baseEnd(base, wallLength);
  if (to <= base.from) return `It ends at ${say(to)}, before it begins at ${say(base.from)}.`;
  if (to > wallLength + 1 / 32) return `The wall is ${say(wallLength)} long; this would reach ${say(to)}.`;
  const inTheWay = all.find(
    (other) =>
      other.id !== base.id &&
      other.wall === base.wall &&
      onFloor(other) &&
      onFloor(base) &&
      Math.min(to, baseEnd(other, wallLength)) - Math.max(base.from, other.from) > 1 / 32,
  );
  if (!inTheWay) return null;
  const overlap = Math.min(to, baseEnd(inTheWay, wallLength)) - Math.max(base.from, inTheWay.from);
  return `It overlaps the ${BASE_LOOK[inTheWay.kind].name.toLowerCase()} at ${say(inTheWay.from)} by ${say(overlap)}.`;
}

/** The first free stretch of a wall at least this wide, from the left; null when there is none. */
export function freePlace(all: readonly Base[], wall: string, wallLength: number, width: number): number | null {
  const taken = all
    .filter((base) => base.wall === wall && onFloor(base))
    .map((base) => [base.from, baseEnd(base, wallLength)] as const)
    .sort((a, b) => a[0] - b[0]);
  let from = 0;
  for (const [start, end] of taken) {
    if (start - from >= width) return from;
    from = Math.max(from, end);
  }
  return wallLength - from >= width ? from : null;
}
