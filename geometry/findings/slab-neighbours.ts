import type { NestPlacement, NestPlan } from '../nest/types';
import type { Facts } from './facts';

/** For each piece the pieces that it meets in the kitchen, at a seam or at a corner. */
export function meetings({ tops }: Facts): ReadonlyMap<string, ReadonlySet<string>> {
  const met = new Map<string, Set<string>>();
  const add = (a: string, b: string) => met.set(a, (met.get(a) ?? new Set()).add(b));
  for (const { letters } of [...tops.seams, ...tops.joints]) {
    add(letters[0], letters[1]);
    add(letters[1], letters[0]);
  }
  return met;
}

/** A pair of pieces, left-hand one first, as one word. */
export const pairKey = (left: string, right: string): string => `${left}|${right}`;

/**
 * Pairs whose staves run on from the left-hand piece into the right-hand one: both lie on one slab, side by side in that
 * order (or both turned, in the reverse order), good face up.
 */
export function followingPairs(nest: NestPlan): ReadonlySet<string> {
  const pairs = new Set<string>();
  for (const slab of nest.slabs) {
    const parts = [...slab.parts].sort((a, b) => a.x - b.x);
    parts.slice(1).forEach((second, i) => {
      const first = parts[i]!;
      if (!follows(first, second)) return;
      pairs.add(first.turned ? pairKey(second.id, first.id) : pairKey(first.id, second.id));
    });
  }
  return pairs;
}

const follows = (first: NestPlacement, second: NestPlacement): boolean =>
  first.turned === second.turned && !first.turnedOver && !second.turnedOver && first.y === second.y;
