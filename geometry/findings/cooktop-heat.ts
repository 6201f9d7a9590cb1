import { constant } from '../wood/sourced';
import { size, wallName, type Facts, type Rule } from './facts';
import { finding } from './finding';
import { MAKER } from './sources';
import type { Finding } from './types';

export const COOKTOP_ABOVE = constant('Clear height over a cooktop to wood', 30, 'in', 'second hand', 'IRC M1901.1');

/** Every cooktop and range: its maker's instructions come before anything drawn here. */
export const cooktopHeat: Rule = (facts) => [
  ...facts.tops.cutouts
    .filter((cutout) => cutout.kind === 'cooktop')
    .map((cutout) =>
      heat(facts, `A cooktop in ${cutout.letters.join(', ') || 'the top'}`, {
        cutout: cutout.id,
        pieces: cutout.letters,
      }),
    ),
  ...facts.layout.bases
    .filter((base) => base.kind === 'range' && facts.runsByWall.has(base.wall))
    .map((base) => heat(facts, `A range on wall ${wallName(facts, base.wall)}`, { wall: base.wall, base: base.id })),
];

const heat = (facts: Facts, what: string, at: Finding['at']): Finding =>
  finding({
    code: 'cooktop-heat',
    severity: 'note',
    text: `${what}: heat dries and darkens wood beside it, and ${size(facts, COOKTOP_ABOVE.value)} above it stays clear of bare wood.`,
    action: "Keep the gaps and line the edges as the maker's instructions say; gas and electricity by licensed trades.",
    at,
    source: `${COOKTOP_ABOVE.source}; ${MAKER}`,
  });
