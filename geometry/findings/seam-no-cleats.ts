import { CLEAT_CLEAR, CLEAT_LEAST, seamCleats } from '../wood/cleats';
import { sourceText } from '../wood/sourced';
import { cutoutName, size, type Rule } from './facts';
import { finding } from './finding';
import { capital } from './words';

/** A seam through a cutout whose waste is too short for clamping cleats. */
export const seamNoCleats: Rule = (facts) =>
  facts.tops.seams.flatMap((seam) => {
    const cutout = facts.tops.cutouts.find((c) => c.id === seam.inCutout);
    if (!cutout || seamCleats(seam, cutout)) return [];
    const least = CLEAT_LEAST.value + CLEAT_CLEAR.value;
    return [
      finding({
        code: 'seam-no-cleats',
        severity: 'note',
        text: `${capital(cutoutName(facts, cutout))} leaves no ${size(facts, least)} of waste on both sides of seam ${seam.letters[0]} to ${seam.letters[1]} to screw a cleat into.`,
        action: 'Draw this seam together with clamps or drawbolts, or move it to the middle of the cutout.',
        at: { seam: { on: seam.on, at: seam.at }, cutout: cutout.id },
        source: sourceText(CLEAT_LEAST),
      }),
    ];
  });
