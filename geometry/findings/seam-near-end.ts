import type { LaidRun, TopSeam } from '../top/types';
import { type Facts, type Rule } from './facts';
import { finding } from './finding';
import { nearestPlace } from './nearest-place';
import { PRACTICE } from './sources';
import type { Finding } from './types';
import { sizePair } from './words';

/** A seam too near to a corner joint or to an open end of its run. */
export const seamNearEnd: Rule = (facts) =>
  facts.tops.seams.flatMap((seam) => {
    const laid = facts.laidById.get(seam.on);
    if (!laid) return [];
    const left = seam.at - Math.max(laid.backFrom, laid.frontFrom);
    const right = Math.min(laid.backTo, laid.frontTo) - seam.at;
    return [...atEnd(facts, seam, laid.left, left, 'left'), ...atEnd(facts, seam, laid.right, right, 'right')];
  });

function atEnd(
  facts: Facts,
  seam: TopSeam,
  end: LaidRun['left'],
  clear: number,
  side: 'left' | 'right',
): readonly Finding[] {
  const { fromJoint, fromOpenEnd } = facts.settings.seams;
  const least = end.kind === 'joint' ? fromJoint : end.kind === 'open' ? fromOpenEnd : 0;
  if (clear >= least) return [];
  const [is, limit] = sizePair(clear, least, facts.layout.step);
  const what = end.kind === 'joint' ? 'joint' : 'open end';
  return [
    finding({
      code: end.kind === 'joint' ? 'seam-near-joint' : 'seam-near-open-end',
      severity: 'warn',
      text: `Seam ${seam.letters[0]} to ${seam.letters[1]} is ${is} from the ${what} on the ${side}; it needs ${limit}.`,
      action: `Move the seam away from the ${what}.${nearestPlace(facts, seam)}`,
      at: { seam: { on: seam.on, at: seam.at }, detail: side },
      source: PRACTICE,
    }),
  ];
}
