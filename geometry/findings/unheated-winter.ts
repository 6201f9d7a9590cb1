import { constant, sourceText } from '../wood/sourced';
import type { Rule } from './facts';
import { finding } from './finding';
import { percent } from './words';

export const YEAR_RANGE = constant('Change of moisture through the year in a heated house', 5, '%', 'our choice', '');

/** A house left cold: the wood swings further than heated rooms let it. */
export const unheatedWinter: Rule = ({ layout, movement, tops }) => {
  if (layout.climate.heated || tops.pieces.length === 0) return [];
  const { make, summer, winter } = movement.emc;
  const range = Math.max(make, summer, winter) - Math.min(make, summer, winter);
  const wide = range > YEAR_RANGE.value;
  return [
    finding({
      code: 'unheated-winter',
      severity: wide ? 'warn' : 'note',
      text: `The house is unheated in winter: the wood changes by ${percent(range)} of moisture through the year; up to ${percent(YEAR_RANGE.value)} is usual.`,
      action: 'Join long corners on site, leave wide gaps, and make the top near the middle of that range.',
      at: { detail: 'climate' },
      source: sourceText(YEAR_RANGE),
    }),
  ];
};
