import { type Rule } from './facts';
import { finding } from './finding';

/** Readings that fit together worse than the tape's own error, though none of them stands out. */
export const readingsLoose: Rule = ({ fit }) => {
  if (!fit || fit.chi2Limit === null || fit.chi2 <= fit.chi2Limit) return [];
  if (fit.suspects.length > 0 || fit.checkCorner) return [];
  return [
    finding({
      code: 'readings-loose',
      severity: 'warn',
      text: `The readings fit together worse than the tape's error allows: ${fit.chi2.toFixed(2)} against a limit of ${fit.chi2Limit.toFixed(2)}.`,
      action: 'Re-take the longest walls, or set the tape error to what this tape really does.',
      at: { detail: 'room' },
      source: 'chi-square test, 95 %',
    }),
  ];
};
