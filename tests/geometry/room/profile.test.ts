import fc from 'fast-check';

import { highestBump, inOrder, offsetAt } from '@/geometry/room/profile';

/** Straight at the left, a 1/4 in bump at 60 in, a 1/8 in hollow at 100 in. */
const PROFILE = [
  { at: 0, off: 0 },
  { at: 60, off: -0.25 },
  { at: 100, off: 0.125 },
];

describe('wall profile', () => {
  it('is straight between stations', () => {
    expect(offsetAt(PROFILE, 30)).toBeCloseTo(-0.125, 12);
    expect(offsetAt(PROFILE, 60)).toBe(-0.25);
    expect(offsetAt(PROFILE, 80)).toBeCloseTo(-0.0625, 12);
  });

  it('keeps the nearest reading beyond the first and the last station', () => {
    expect(offsetAt(PROFILE.slice(1), 10)).toBe(-0.25);
    expect(offsetAt(PROFILE, 140)).toBe(0.125);
  });

  it('is flat where nothing was read', () => {
    expect(offsetAt([], 40)).toBe(0);
    expect(highestBump([], 0, 90)).toBe(0);
  });

  it('finds the highest bump between two places, at a station or at an end', () => {
    expect(highestBump(PROFILE, 0, 120)).toBe(0.25);
    expect(highestBump(PROFILE, 0, 30)).toBeCloseTo(0.125, 12);
    expect(highestBump(PROFILE, 95, 120)).toBe(0);
  });

  it('takes a hollow for what sticks out on the far side of the wall', () => {
    expect(highestBump(PROFILE, 0, 120, 'back')).toBe(0.125);
    expect(highestBump(PROFILE, 0, 60, 'back')).toBe(0);
  });

  it('does not care in which order the stations were read', () => {
    const shuffled = [PROFILE[2]!, PROFILE[0]!, PROFILE[1]!];
    expect(inOrder(shuffled)).toEqual(PROFILE);
    expect(offsetAt(shuffled, 30)).toBeCloseTo(-0.125, 12);
    expect(highestBump(shuffled, 0, 30)).toBeCloseTo(0.125, 12);
  });

  it('has no place between two others that sticks out further than the highest bump says', () => {
    const station = fc.record({
      at: fc.integer({ min: 0, max: 120 }),
      off: fc.double({ min: -1, max: 1, noNaN: true }),
    });
    fc.assert(
      fc.property(
        fc.uniqueArray(station, { selector: (s) => s.at, minLength: 1, maxLength: 8 }),
        fc.double({ min: 0, max: 120, noNaN: true }),
        (profile, at) => {
          expect(-offsetAt(profile, at)).toBeLessThanOrEqual(highestBump(profile, 0, 120) + 1e-12);
          expect(offsetAt(profile, at)).toBeLessThanOrEqual(highestBump(profile, 0, 120, 'back') + 1e-12);
        },
      ),
      { seed: 9, numRuns: 300 },
    );
  });
});
