import { cutoutName, type Facts, type Rule } from './facts';
import { finding } from './finding';
import { PRACTICE } from './sources';
import { stripWidths, weakens } from './strip-widths';
import type { Finding } from './types';
import { capital, sizePair } from './words';

/** A strip of wood beside a cutout that is too narrow, or a cutout that reaches past the top. */
export const narrowStrip: Rule = (facts) =>
  facts.tops.cutouts.filter(weakens).flatMap((cutout) => {
    const widths = stripWidths(facts, cutout);
    const sides = ['front', 'back', 'end'] as const;
    return sides.flatMap((side) => strip(facts, cutout, side, widths[side]));
  });

function strip(
  facts: Facts,
  cutout: Facts['tops']['cutouts'][number],
  side: 'front' | 'back' | 'end',
  width: number,
): readonly Finding[] {
  const least = facts.settings.seams.strip;
  // The front of an apron sink is open by intent.
  const apron = facts.cutoutById.get(cutout.id)?.mount === 'apron' && side === 'front';
  if (width >= least || apron) return [];
  const [is, limit] = sizePair(Math.max(width, 0), least, facts.layout.step);
  const past = width <= 0;
  // The layout has already said so itself.
  if (past && facts.tops.problems.some((problem) => problem.at.cutout === cutout.id)) return [];
  const at = { cutout: cutout.id, pieces: cutout.letters, detail: side };
  return [
    past
      ? finding({
          code: 'cutout-off-top',
          severity: 'stop',
          text: `${capital(cutoutName(facts, cutout))} reaches the ${side} of the top: no wood is left there, and ${limit} is the least.`,
          action: 'Move it, or take a smaller one.',
          at,
          source: PRACTICE,
        })
      : finding({
          code: 'narrow-strip',
          severity: 'warn',
          text: `${capital(cutoutName(facts, cutout))} leaves a strip of ${is} at the ${side}; ${limit} is the least.`,
          action: 'Move it, make the top deeper, or stiffen the strip from below.',
          at,
          source: PRACTICE,
        }),
  ];
}
