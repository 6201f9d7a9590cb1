import type { RuleCases } from './case';
import { kitchen, STEADY } from './kitchen';

const year = (make: number, summer: number, winter: number, heated = true) =>
  kitchen({
    layout: {
      climate: {
        make: { tempF: 70, rh: make },
        summer: { tempF: 70, rh: summer },
        winter: { tempF: 70, rh: winter },
        heated,
      },
    },
  });

const wood = (species: string) =>
  kitchen({ layout: { climate: STEADY, material: { ...kitchen().layout.material, species } } });

/** 70 F and 29 % is 6.01 %, 28.8 % is 5.98 % moisture; 74 % is 14.13 %, 73 % is 13.86 %. */
export const SEASON_CASES: RuleCases = {
  'moisture-out-of-range': {
    severity: 'note',
    raises: () => year(50, 60, 28),
    spares: () => year(50, 60, 29.2),
    says: ['5.9 %', '6 to 14 %'],
    other: () => year(50, 85, 40),
  },
  'unheated-winter': {
    severity: 'note',
    raises: () => year(50, 60, 50, false),
    spares: () => year(50, 60, 50, true),
    says: ['1.7 %', '5.0 %'],
    other: () => year(50, 80, 40, false),
  },
  'made-out-of-range': {
    severity: 'warn',
    raises: () => year(61, 60, 40),
    spares: () => year(60, 60, 40),
    says: ['11.2 %', 'wetter', '7.7 %', '11.0 %'],
    other: () => year(30, 60, 40),
  },
  'species-unknown': {
    severity: 'warn',
    raises: () => wood('driftwood'),
    spares: () => wood('cherry'),
    says: ['Driftwood', 'hickory', '0.335 %'],
    other: () => wood('bog oak'),
  },
  'species-from-memory': {
    severity: 'note',
    raises: () => wood('mahogany'),
    spares: () => wood('beech'),
    says: ['mahogany', '0.205 %', 'from memory'],
    other: () => wood('sapele'),
  },
};
