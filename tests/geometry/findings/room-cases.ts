import { WALL, run } from '@/tests/helpers/tops-builder';
import type { RuleCases } from './case';
import { cornerKitchen, kitchen } from './kitchen';

const suspect = (standardised: number, orElse: readonly string[] = []) =>
  cornerKitchen({ fit: { suspects: [{ observation: 'wall B', shouldRead: 90.75, standardised, orElse }] } });

const cornerAt = (measured: boolean, angleDeg = 90) => cornerKitchen({ corner: { measured, angleDeg } });

/** The doubt of a corner, as the opening it leaves at the joint. */
const opening = (openingPerSd: number) =>
  cornerKitchen({ tops: (tops) => ({ ...tops, joints: tops.joints.map((joint) => ({ ...joint, openingPerSd })) }) });

export const ROOM_CASES: RuleCases = {
  'reading-suspect': {
    severity: 'stop',
    raises: () => suspect(9.1),
    spares: () => cornerKitchen(),
    says: ['Wall B', '9.1 times', '3.29', '90 3/4 in'],
    other: () => suspect(5.2),
  },
  'check-corner': {
    severity: 'warn',
    raises: () => cornerKitchen({ fit: { checkCorner: 'corner A-B' }, corner: { measured: false } }),
    spares: () => cornerKitchen({ corner: { measured: false } }),
    says: ['A-B', '1 degree'],
  },
  'readings-loose': {
    severity: 'warn',
    raises: () => kitchen({ fit: { chi2: 3.85, chi2Limit: 3.84 } }),
    spares: () => kitchen({ fit: { chi2: 3.84, chi2Limit: 3.84 } }),
    says: ['3.85', '3.84'],
    other: () => kitchen({ fit: { chi2: 12, chi2Limit: 3.84 } }),
  },
  'no-spare-reading': {
    severity: 'note',
    raises: () => kitchen({ fit: { dof: 0, chi2: 0, chi2Limit: null } }),
    spares: () => kitchen({ fit: { dof: 1 } }),
    says: ['0 readings', '1'],
  },
  'corner-not-measured': {
    severity: 'warn',
    // 35.36 in of joint x 1 degree = 0.617 in.
    raises: () => cornerAt(false),
    spares: () => cornerAt(true),
    says: ['A-B', '90.0 degrees', '1 degree', '5/8 in', '35 3/8 in'],
    other: () => cornerAt(false, 91.5),
  },
  'corner-unsure': {
    severity: 'note',
    raises: () => opening(0.07),
    spares: () => opening(1 / 16),
    says: ['A-B', '0.05 degrees', '0.070 in', 'over 1/16 in'],
    other: () => opening(0.2),
  },
  'cannot-lay': {
    severity: 'stop',
    raises: () => kitchen({ layout: { runs: [run('1', 'A', { left: WALL })] } }),
    spares: () => kitchen(),
    says: ['The run on wall A', 'wall A has no neighbor'],
  },
};
