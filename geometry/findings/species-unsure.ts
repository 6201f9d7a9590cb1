import { changeCoefficient } from '../wood/movement';
import { sourceText } from '../wood/sourced';
import { speciesOf, SPECIES } from '../wood/species';
import type { Rule } from './facts';
import { finding } from './finding';
import { MOVEMENT_SOURCE } from './sources';
import { capital } from './words';

/** A wood that is not in the table, or whose movement figures could not be read again. */
export const speciesUnsure: Rule = ({ layout, movement, tops }) => {
  if (tops.pieces.length === 0) return [];
  const species = speciesOf(layout.material.species);
  const perPercent = `${(movement.coefficient * 100).toFixed(3)} % of width per 1 % of moisture`;
  if (!species) {
    const most = SPECIES.reduce((a, b) =>
      changeCoefficient(b, layout.material.grain) > changeCoefficient(a, layout.material.grain) ? b : a,
    );
    return [
      finding({
        code: 'species-unknown',
        severity: 'warn',
        text: `${capital(layout.material.species || 'no wood')} is not in the table; the liveliest wood of it is reckoned with, ${most.key}: ${perPercent}.`,
        action: 'Choose a wood of the table, or the nearest one to it.',
        at: { detail: 'material' },
        source: MOVEMENT_SOURCE,
      }),
    ];
  }
  const weak = [species.radial, species.tangential].find((c) => c.standing === 'from memory');
  if (!weak) return [];
  return [
    finding({
      code: 'species-from-memory',
      severity: 'note',
      text: `The movement of ${species.key}, ${perPercent}, is from memory and was not read in the table again.`,
      action: 'Leave a little more room than the figures ask for.',
      at: { detail: 'material' },
      source: sourceText(weak),
    }),
  ];
};
