import { LEVEL_LIMIT } from '../wood/level-support';
import { sourceText } from '../wood/sourced';
import type { Rule } from './facts';
import { finding } from './finding';
import { sizePair } from './words';

/** Cabinets whose tops do not lie in one plane: a stiff top rocks on them or is bent down. */
export const cabinetsOutOfLevel: Rule = ({ layout }) => {
  const off = layout.site.cabinetsOutOfLevel ?? 0;
  if (off <= LEVEL_LIMIT.value) return [];
  const [is, limit] = sizePair(off, LEVEL_LIMIT.value, layout.step);
  return [
    finding({
      code: 'cabinets-out-of-level',
      severity: 'warn',
      text: `The cabinets are ${is} out of level along the kitchen; ${limit} is what shims under the top take up.`,
      action: 'Level the cabinets from the highest one, and note the shim under each.',
      at: { detail: 'cabinets' },
      source: sourceText(LEVEL_LIMIT),
    }),
  ];
};
