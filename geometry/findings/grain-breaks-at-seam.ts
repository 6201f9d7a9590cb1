import { type Rule } from './facts';
import { finding } from './finding';
import { followingPairs, pairKey } from './slab-neighbours';
import { PRACTICE } from './sources';

/** A seam where the staves of one piece do not run on in the next. */
export const grainBreaksAtSeam: Rule = (facts) => {
  const { nest } = facts;
  if (!nest || facts.tops.seams.length === 0) return [];
  const following = followingPairs(nest);
  return facts.tops.seams.flatMap((seam) => {
    if (seam.visible <= 0 || following.has(pairKey(...seam.letters))) return [];
    const [a, b] = seam.letters;
    return [
      finding({
        code: 'grain-breaks-at-seam',
        severity: 'note',
        text: `The grain does not follow through seam ${a} to ${b}: they are not cut side by side from one slab.`,
        action: 'Ask the plan to match the grain, or pick slabs of one color.',
        at: { seam: { on: seam.on, at: seam.at }, pieces: seam.letters },
        source: PRACTICE,
      }),
    ];
  });
};
