import type { NestPlacement, NestPlan } from '../nest/types';
import type { Facts } from './facts';

/** Pairs of pieces that meet in the kitchen, left-hand piece first: at a seam or at a corner. */
export const meetingPairs = ({ tops }: Facts): readonly (readonly [string, string])[] =>
  [...tops.seams, ...tops.joints].map((place) => place.letters);

/** Places of a plan slab's parts from its left end. */
const inOrder = (parts: readonly NestPlacement[]): readonly NestPlacement[] => [...parts].sort((a, b) => a.x - b.x);

/**
 * Whether the staves run on from one piece into the next: both lie on one slab, side by side in their order (or both
 * turned, in the reverse order), same face up.
 */
export function followsGrain(nest: NestPlan, [left, right]: readonly [string, string]): boolean {
  return nest.slabs.some((slab) => {
    const parts = inOrder(slab.parts);
    return parts.some((first, i) => {
      const second = parts[i + 1];
      if (!second || first.turned !== second.turned || first.turnedOver || second.turnedOver) return false;
      if (first.y !== second.y) return false;
      const [a, b] = first.turned ? [right, left] : [left, right];
      return first.id === a && second.id === b;
    });
  });
}
