import { constant } from '../wood/sourced';
import { size, type Rule } from './facts';
import { finding } from './finding';
import { MAKER } from './sources';

export const COOKTOP_ABOVE = constant('Clear height over a cooktop to wood', 30, 'in', 'second hand', 'IRC M1901.1');

/** Every cooktop: its maker's instructions come before anything drawn here. */
export const cooktopHeat: Rule = (facts) =>
  facts.tops.cutouts.flatMap((cutout) =>
    cutout.kind === 'cooktop'
      ? [
          finding({
            code: 'cooktop-heat',
            severity: 'note',
            text: `A cooktop in ${cutout.letters.join(', ') || 'the top'}: heat dries and darkens wood, and ${size(facts, COOKTOP_ABOVE.value)} above it stays clear of bare wood.`,
            action: "Line the cutout's edges as the maker's instructions say; gas and electricity by licensed trades.",
            at: { cutout: cutout.id, pieces: cutout.letters },
            source: `${COOKTOP_ABOVE.source}; ${MAKER}`,
          }),
        ]
      : [],
  );
