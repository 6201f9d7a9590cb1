import { found, proveCases } from './case';
import { kitchen } from './kitchen';
import { SEASON_CASES } from './season-cases';

describe('findings of wood and climate', () => {
  proveCases(SEASON_CASES);

  it('warns of an unheated house when the wood changes by more than 5 % in a year', () => {
    const cold = {
      make: { tempF: 68, rh: 45 },
      summer: { tempF: 75, rh: 65 },
      winter: { tempF: 40, rh: 80 },
      heated: false,
    };
    expect(found(kitchen({ layout: { climate: cold } }), 'unheated-winter')[0]!.severity).toBe('warn');
  });

  it('asks for the middle of the year before cutting', () => {
    expect(found(SEASON_CASES['made-out-of-range']!.raises(), 'made-out-of-range')[0]!.action).toContain('about 9.3 %');
  });
});
