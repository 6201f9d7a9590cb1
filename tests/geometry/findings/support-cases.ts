import { run } from '@/tests/helpers/tops-builder';
import type { RuleCases } from './case';
import { base, cornerKitchen, kitchen } from './kitchen';

/** Back gap 1/4 in, so a top of this depth hangs depth + 1/4 - 24 in past a 24 in cabinet; maple holds 8.18 across. */
const deep = (depth: number) => kitchen({ layout: { runs: [run('1', 'A', { depth })], bases: [base()] } });

const cornerBases = (to: number) => cornerKitchen({ layout: { bases: [base({ to })] } });

const opening = (to: number, kind: 'opening' | 'dishwasher' = 'opening') =>
  kitchen({ layout: { bases: [base({ kind, from: 30, to })] } });

const outOfLevel = (cabinetsOutOfLevel: number) => kitchen({ layout: { site: { cabinetsOutOfLevel } } });

export const SUPPORT_CASES: RuleCases = {
  'overhang-unsupported': {
    severity: 'warn',
    raises: () => deep(35.75),
    spares: () => deep(31.9),
    says: ['12 in past', 'across the grain', '100 lb', '5/32 in', '1/16 in'],
    other: () => deep(33),
  },
  'ledger-needed': {
    severity: 'note',
    raises: () => cornerBases(55),
    spares: () => cornerBases(70),
    says: ['wall A', '25 in'],
    other: () => cornerBases(52),
  },
  'bracket-needed': {
    severity: 'warn',
    raises: () => opening(54.5),
    spares: () => opening(54),
    says: ['wall A', '24 1/2 in', '24 in'],
    other: () => opening(60),
  },
  'cabinets-out-of-level': {
    severity: 'warn',
    raises: () => outOfLevel(0.1875),
    spares: () => outOfLevel(0.125),
    says: ['3/16 in', '1/8 in'],
    other: () => outOfLevel(0.5),
  },
  'dishwasher-steam': {
    severity: 'note',
    raises: () => opening(54, 'dishwasher'),
    spares: () => opening(54),
    says: ['wall A (P)', '24 in of dishwasher'],
    other: () => opening(48, 'dishwasher'),
  },
};
