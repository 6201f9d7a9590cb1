import { cutoutName, type Rule } from './facts';
import { finding } from './finding';
import { capital } from './words';
import { PRACTICE } from './sources';

/** End grain in the water: the two short sides of an undermount or apron sink's cutout. */
export const undermountEndGrain: Rule = (facts) =>
  facts.tops.cutouts.flatMap((cutout) => {
    const mount = facts.cutoutById.get(cutout.id)?.mount;
    if (cutout.kind !== 'sink' || (mount !== 'undermount' && mount !== 'apron')) return [];
    return [
      finding({
        code: 'undermount-end-grain',
        severity: 'note',
        text: `${capital(cutoutName(facts, cutout))} leaves 2 end-grain edges in splash water.`,
        action: 'Round and sand them fine, and seal them until they drink no more.',
        at: { cutout: cutout.id, pieces: cutout.letters },
        source: PRACTICE,
      }),
    ];
  });
