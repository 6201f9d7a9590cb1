import { baseOfCutout } from './cutout-base';
import { cutoutName, size, type Rule } from './facts';
import { finding } from './finding';
import { PRACTICE } from './sources';
import { capital } from './words';

/** A sink or cooktop that reaches past the cabinet under it. */
export const cutoutOutsideCabinet: Rule = (facts) =>
  facts.layout.cutouts.flatMap((cutout) => {
    if (cutout.kind !== 'sink' && cutout.kind !== 'cooktop') return [];
    const over = baseOfCutout(facts, cutout);
    if (!over || over.past <= 0) return [];
    return [
      finding({
        code: 'cutout-outside-cabinet',
        severity: 'warn',
        text: `${capital(cutoutName(facts, cutout))} reaches ${size(facts, over.past)} past the ${over.base.label ?? over.base.kind} under it; nothing of it may stand past its sides.`,
        action: 'Center it on the cabinet, or check that the cabinet sides can be cut.',
        at: { cutout: cutout.id, base: over.base.id },
        source: PRACTICE,
      }),
    ];
  });
