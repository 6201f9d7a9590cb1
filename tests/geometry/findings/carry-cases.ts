import { run, WALL } from '@/tests/helpers/tops-builder';
import type { RuleCases } from './case';
import { kitchen, STEADY } from './kitchen';

const weighing = (weight: number, crew: number) => {
  const context = kitchen({ walls: [60], layout: { access: { ...kitchen().layout.access, crew } } });
  return { ...context, pieces: context.pieces.map((piece) => ({ ...piece, weight })) };
};

const passage = (obstacle: string | null) => ({ ...kitchen(), passages: [{ letters: ['P', 'Q'], obstacle }] });

/** A top between two walls of 60 in that stand this far from its back, degrees, with 1/4 in clear at both. */
const between = (angleDeg: number) =>
  kitchen({
    walls: [60, 90, 60],
    angles: [angleDeg, angleDeg],
    layout: { runs: [run('1', 'B', { left: WALL, right: WALL })], climate: STEADY },
  });

export const CARRY_CASES: RuleCases = {
  // 2 x 60 x cos t in narrower at the walls' ends, less 1/2 in / sin t of play: 0.128 in at 89.7 degrees.
  'lower-from-above': {
    severity: 'note',
    raises: () => between(89.7),
    spares: () => between(89.77),
    says: ['wall B (P)', '1/8 in wider', 'may be 0 in wider'],
    other: () => between(89),
  },
  'section-wont-go-in': {
    severity: 'warn',
    raises: () => passage('118 in over its end, and the clear length is 108 in'),
    spares: () => passage(null),
    says: ['P and Q', '118 in', '108 in'],
    other: () => passage('120 in over its end, and the clear length is 108 in'),
  },
  'heavy-section': {
    severity: 'warn',
    raises: () => weighing(68.5, 2),
    spares: () => weighing(68, 2),
    says: ['69 lb', '3 people', 'crew is 2', '68 lb', 'Lifting index 0.8'],
    other: () => weighing(90, 2),
  },
};
