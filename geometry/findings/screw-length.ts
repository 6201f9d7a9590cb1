import { screwFor } from '../wood/screws';
import { size, type Rule } from './facts';
import { finding } from './finding';
import { PRACTICE } from './sources';
import { sizePair } from './words';

/** Stock screws that come too near to the face, or bite too little to hold. */
export const screwLength: Rule = (facts) => {
  const { fixing, material, step } = facts.layout;
  const settings = facts.settings.screws;
  if (!facts.tops.pieces.some((piece) => piece.kind === 'run' || piece.kind === 'island')) return [];
  const screw = screwFor(fixing.rail, material.thickness, settings);
  const through = `${size(facts, fixing.rail)} of rail and ${size(facts, material.thickness)} of top`;
  if ('problem' in screw && screw.problem === 'shortest too long') {
    const [left, least] = sizePair(screw.left, settings.leftAbove, step);
    return [
      finding({
        code: 'screw-too-long',
        severity: 'stop',
        text: `With ${through} the shortest stock screw, ${size(facts, screw.length)}, leaves ${left} above its point; ${least} is the least.`,
        action: 'Stock a shorter screw, or thicken the rail with a block.',
        at: { detail: 'screws' },
        source: PRACTICE,
      }),
    ];
  }
  if (screw.bite >= settings.leastBite) return [];
  const [bite, least] = sizePair(screw.bite, settings.leastBite, step);
  return [
    finding({
      code: 'screw-too-short',
      severity: screw.bite > 0 ? 'warn' : 'stop',
      text: `With ${through} the best stock screw, ${size(facts, screw.length)}, bites ${bite}; ${least} is the least.`,
      action: 'Drill the rail deeper for the head, or stock a longer screw.',
      at: { detail: 'screws' },
      source: PRACTICE,
    }),
  ];
};
