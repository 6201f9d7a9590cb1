import type { RuleCases } from './case';
import { kitchen } from './kitchen';

const weighing = (weight: number, crew: number) => {
  const context = kitchen({ walls: [60], layout: { access: { ...kitchen().layout.access, crew } } });
  return { ...context, pieces: context.pieces.map((piece) => ({ ...piece, weight })) };
};

const passage = (obstacle: string | null) => ({ ...kitchen(), passages: [{ letters: ['P', 'Q'], obstacle }] });

export const CARRY_CASES: RuleCases = {
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
