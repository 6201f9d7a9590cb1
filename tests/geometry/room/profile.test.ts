import fc from 'fast-check';

import { deepestHollow, highestBump, inOrder, measuredFace, offsetAt } from '@/geometry/room/profile';

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
    expect(deepestHollow([], 0, 90)).toBe(0);
  });

  it('finds the highest bump between two places, at a station or at an end', () => {
    expect(highestBump(PROFILE, 0, 120)).toBe(0.25);
    expect(highestBump(PROFILE, 0, 30)).toBeCloseTo(0.125, 12);
    expect(highestBump(PROFILE, 95, 120)).toBe(0);
  });

  it('finds the deepest hollow', () => {
    expect(deepestHollow(PROFILE, 0, 120)).toBe(0.125);
    expect(deepestHollow(PROFILE, 0, 60)).toBe(0);
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
          expect(offsetAt(profile, at)).toBeLessThanOrEqual(deepestHollow(profile, 0, 120) + 1e-12);
        },
      ),
      { seed: 9, numRuns: 300 },
    );
  });

  it('draws the face with its bump standing into the room, on the right-hand side of the wall', () => {
    const face = measuredFace([0, 0], [120, 0], PROFILE);
    expect(face).toHaveLength(4);
    expect(face[1]).toEqual([60, -0.25]);
    expect(face[2]![1]).toBeCloseTo(0.125, 12);
    expect(face[3]).toEqual([120, 0.125]);
    expect(measuredFace([0, 0], [120, 0], PROFILE, 10)[1]).toEqual([60, -2.5]);
  });

  it('draws a wall without readings straight', () => {
    expect(measuredFace([0, 0], [120, 0], [])).toEqual([
      [0, 0],
      [120, 0],
    ]);
  });
});
