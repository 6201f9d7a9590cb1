import type { TopSeam } from '../top/types';
import { size, type Facts } from './facts';

/** Last sentence of what the layout says of a pin that no rule allows. */
const NEAREST = /(The nearest allowed place is .+|No place on this top is allowed\.)$/;

/** Where a pinned seam may go instead, as the layout worked it out, led by a space; empty when it has nothing to say. */
export function nearestPlace(facts: Facts, seam: Pick<TopSeam, 'on' | 'at'>): string {
  const pinned = `pinned at ${size(facts, seam.at)} `;
  const problem = facts.tops.problems.find(
    ({ code, message, at }) => code === 'pin-not-allowed' && at.run === seam.on && message.includes(pinned),
  );
  const sentence = problem && NEAREST.exec(problem.message)?.[1];
  return sentence ? ` ${sentence}` : '';
}
