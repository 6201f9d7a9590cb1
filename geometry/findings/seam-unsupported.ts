import { baseReach } from '../wood/under';
import { basesUnder, size, type Rule } from './facts';
import { finding } from './finding';
import { nearestPlace } from './nearest-place';
import { PRACTICE } from './sources';

/** A seam over a dishwasher, a range or an opening, with nothing near that carries it. */
export const seamUnsupported: Rule = (facts) =>
  facts.tops.seams.flatMap((seam) => {
    const laid = facts.laidById.get(seam.on);
    const wall = laid && facts.wallById.get(laid.wall);
    if (!laid || !wall) return [];
    const { support } = facts.settings.seams;
    return basesUnder(facts, laid).flatMap((base) => {
      if (base.kind !== 'dishwasher' && base.kind !== 'opening' && base.kind !== 'range') return [];
      const [from, to] = baseReach(wall, base);
      const away = Math.min(seam.at - from, to - seam.at);
      if (away <= support) return [];
      return [
        finding({
          code: 'seam-unsupported',
          severity: 'stop',
          text: `Seam ${seam.letters[0]} to ${seam.letters[1]} lies over the ${base.label ?? base.kind}, ${size(facts, away)} from the nearest support; ${size(facts, support)} is the limit.`,
          action: `Move the seam over a cabinet or put a support under it.${nearestPlace(facts, seam)}`,
          at: { seam: { on: seam.on, at: seam.at }, base: base.id },
          source: PRACTICE,
        }),
      ];
    });
  });
