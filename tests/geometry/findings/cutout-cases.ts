import type { Cutout } from '@/geometry/core/layout';
import type { RuleCases } from './case';
import { base, kitchen, sink } from './kitchen';

const withCutouts = (...cutouts: readonly Cutout[]) => kitchen({ layout: { cutouts: [...cutouts] } });
const overBase = (cutout: Partial<Cutout>, from = 27, to = 63) =>
  kitchen({ layout: { cutouts: [sink(cutout)], bases: [base({ kind: 'sink base', from, to })] } });

/** Cooktop 30 x 19 in a 25 in top: the strips are the setback, and 6 in less it. */
const cooktop = (overrides: Partial<Cutout>) =>
  withCutouts(sink({ kind: 'cooktop', width: 30, depth: 19, setback: 3, radius: 0.25, ...overrides }));

export const CUTOUT_CASES: RuleCases = {
  'narrow-strip': {
    severity: 'warn',
    raises: () => withCutouts(sink({ setback: 2.5 })),
    spares: () => withCutouts(sink({ setback: 2 })),
    says: ['The sink', '1 1/2 in at the back', '2 in'],
    other: () => withCutouts(sink({ setback: 3 })),
  },
  'cutout-off-top': {
    severity: 'stop',
    raises: () => {
      const context = withCutouts(sink({ centre: 14 }));
      return { ...context, tops: { ...context.tops, problems: [] } };
    },
    spares: () => withCutouts(sink({ centre: 15.5 })),
    says: ['The sink', 'the end of the top', '2 in'],
  },
  'cutouts-too-close': {
    severity: 'warn',
    raises: () => withCutouts(sink({ centre: 20 }), sink({ id: 'c2', kind: 'cooktop', centre: 51.5 })),
    spares: () => withCutouts(sink({ centre: 20 }), sink({ id: 'c2', kind: 'cooktop', centre: 52 })),
    says: ['sink', 'cooktop', '1 1/2 in', '2 in'],
    other: () => withCutouts(sink({ centre: 20 }), sink({ id: 'c2', kind: 'cooktop', centre: 51 })),
  },
  'sink-wider-than-base': {
    severity: 'stop',
    raises: () => overBase({ width: 35 }),
    spares: () => overBase({ width: 34.5 }),
    says: ['35 in wide', '36 in', '34 1/2 in'],
    other: () => overBase({ width: 38 }),
  },
  'cutout-outside-cabinet': {
    severity: 'warn',
    raises: () => overBase({ centre: 50 }),
    spares: () => overBase({ centre: 48 }),
    says: ['2 in past the sink base'],
    other: () => overBase({ centre: 52 }),
  },
  'cooktop-near-edge': {
    severity: 'warn',
    raises: () => cooktop({ setback: 2.25 }),
    spares: () => cooktop({ setback: 2.5 }),
    says: ['The cooktop', '2 1/4 in from the front', '2 1/2 in'],
    other: () => cooktop({ setback: 4 }),
  },
  'cooktop-heat': {
    severity: 'note',
    raises: () => cooktop({}),
    spares: () => withCutouts(sink()),
    says: ['P', '30 in'],
  },
  'undermount-end-grain': {
    severity: 'note',
    raises: () => withCutouts(sink({ mount: 'undermount' })),
    spares: () => withCutouts(sink({ mount: 'drop-in' })),
    says: ['The sink', '2 end-grain edges'],
  },
};
