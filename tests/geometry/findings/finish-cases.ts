import type { Finish } from '@/geometry/core/layout';
import { OPEN, run } from '@/tests/helpers/tops-builder';
import type { RuleCases } from './case';
import { kitchen } from './kitchen';

const finished = (finish: Finish) => kitchen({ layout: { finish } });

const rounded = (radius: number) =>
  kitchen({
    layout: {
      runs: [
        run('1', 'A', {
          left: { kind: 'open', overhang: 0, radius },
          right: { kind: 'open', overhang: 0, radius: 1 },
        }),
      ],
    },
  });

const bareEnd = (bare: boolean) => {
  const context = kitchen({ layout: { runs: [run('1', 'A', { left: OPEN, right: OPEN })] } });
  const pieces = context.tops.pieces.map((piece) => ({ ...piece, left: { ...piece.left, finished: !bare } }));
  return { ...context, tops: { ...context.tops, pieces } };
};

export const FINISH_CASES: RuleCases = {
  'end-unfinished': {
    severity: 'warn',
    raises: () => bareEnd(true),
    spares: () => bareEnd(false),
    says: ['left end of piece P'],
  },
  'sharp-corner': {
    severity: 'note',
    raises: () => rounded(0.25),
    spares: () => rounded(0.5),
    says: ['left end of piece P', '1/4 in', '1/2 in'],
    other: () => rounded(0),
  },
  'finish-none': {
    severity: 'warn',
    raises: () => finished({ kind: 'none' }),
    spares: () => finished({ kind: 'oil' }),
    says: ['no finish', 'one coat'],
  },
  'finish-food-prep': {
    severity: 'warn',
    raises: () => finished({ kind: 'film', foodPrep: true }),
    spares: () => finished({ kind: 'film', foodPrep: false }),
    says: ['film finish', '3 coats'],
    other: () => finished({ kind: 'film', foodPrep: true, coats: 4 }),
  },
  'oily-rags': {
    severity: 'note',
    raises: () => finished({ kind: 'oil' }),
    spares: () => finished({ kind: 'none' }),
    says: ['Oil', '3 coats'],
    other: () => finished({ kind: 'hard wax' }),
  },
};
