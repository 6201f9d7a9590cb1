import type { Cutout } from '../core/layout';
import type { TopSeam } from '../top/types';
import { cutoutName, type Facts, type Rule } from './facts';
import { finding } from './finding';
import { nearestPlace } from './nearest-place';
import { PRACTICE } from './sources';
import type { Finding } from './types';
import { sizePair } from './words';

/** A seam too near to the corner of a cutout, outside it or inside. */
export const seamNearCutout: Rule = (facts) =>
  facts.tops.seams.flatMap((seam) =>
    (facts.cutoutsOn.get(seam.on) ?? []).flatMap((cutout) => {
      if (cutout.kind === 'tap' || cutout.kind === 'notch') return [];
      const past = Math.abs(seam.at - cutout.centre) - cutout.width / 2;
      const { insideCutout, fromCutoutCorner } = facts.settings.seams;
      const [clear, least] = past < 0 ? [-past, cutout.radius + insideCutout] : [past, fromCutoutCorner];
      return clear >= least ? [] : [nearCutout(facts, seam, cutout, clear, least, past < 0)];
    }),
  );

function nearCutout(
  facts: Facts,
  seam: TopSeam,
  cutout: Cutout,
  clear: number,
  least: number,
  inside: boolean,
): Finding {
  const [is, limit] = sizePair(clear, least, facts.layout.step);
  return finding({
    code: 'seam-near-cutout',
    severity: 'warn',
    text: `Seam ${seam.letters[0]} to ${seam.letters[1]} is ${is} ${inside ? 'inside' : 'beside'} the corner of ${cutoutName(facts, cutout)}; it needs ${limit}.`,
    action: `${inside ? 'Move the seam to the middle of the cutout.' : 'Move the seam into the cutout or further away from it.'}${nearestPlace(facts, seam)}`,
    at: { seam: { on: seam.on, at: seam.at }, cutout: cutout.id },
    source: PRACTICE,
  });
}
