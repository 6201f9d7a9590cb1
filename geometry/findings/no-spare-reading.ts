import { type Rule } from './facts';
import { finding } from './finding';

/** A room with no reading to spare: a slip of the tape cannot be noticed. */
export const noSpareReading: Rule = ({ fit, tops }) => {
  if (!fit || fit.dof > 0 || tops.runs.length === 0) return [];
  return [
    finding({
      code: 'no-spare-reading',
      severity: 'note',
      text: 'The room has 0 readings to spare; without at least 1 a slip of the tape goes unnoticed.',
      action: 'Take one more: a diagonal, or a triangle at a corner.',
      at: { detail: 'room' },
      source: 'least squares: degrees of freedom',
    }),
  ];
};
