import fc from 'fast-check';
import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import { chooseScrew, screwFor } from '@/geometry/wood/screws';

const SCREWS = DEFAULT_SETTINGS.screws;

describe('chooseScrew', () => {
  // Common practice: screw 2 1/2 in, 1 1/2 in below the cabinet's top, top 1 1/2 in: 1 in bites, 1/2 in is left.
  it('takes 2 1/2 in through a 1 1/2 in rail into a 1 1/2 in top: 1 in bites, 1/2 in is left', () => {
    expect(chooseScrew({ rail: 1.5 }, 1.5, DEFAULT_SETTINGS)).toEqual({ length: 2.5, bite: 1, left: 0.5 });
  });

  it('takes 1 5/8 in through a 3/4 in rail into a 1 1/4 in top, which leaves exactly 3/8 in', () => {
    expect(chooseScrew({ rail: 0.75 }, 1.25, DEFAULT_SETTINGS)).toEqual({ length: 1.625, bite: 0.875, left: 0.375 });
  });

  it('gives none when the shortest comes too near to the face, and none when the longest does not bite', () => {
    expect(chooseScrew({ rail: 0.25 }, 1, DEFAULT_SETTINGS)).toBeNull();
    expect(chooseScrew({ rail: 3 }, 1.5, DEFAULT_SETTINGS)).toBeNull();
  });

  it('always bites, always leaves 3/8 in, and no longer stock length would', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 3.5, noNaN: true }),
        fc.double({ min: 0.5, max: 3, noNaN: true }),
        (rail, thickness) => {
          const screw = chooseScrew({ rail }, thickness, DEFAULT_SETTINGS);
          if (!screw) return 'problem' in screwFor(rail, thickness, SCREWS);
          const longer = SCREWS.lengths.filter((length) => length > screw.length);
          return (
            screw.bite > 0 &&
            screw.left >= SCREWS.leftAbove &&
            longer.every((length) => rail + thickness - length < SCREWS.leftAbove)
          );
        },
      ),
      { seed: 461 },
    );
  });
});

describe('screwFor', () => {
  it('names the shortest stock screw when all are too long and the longest when all are too short', () => {
    expect(screwFor(0.25, 1, SCREWS)).toEqual({ problem: 'shortest too long', length: 1, bite: 0.75, left: 0.25 });
    expect(screwFor(3.25, 1.5, SCREWS)).toEqual({ problem: 'longest too short', length: 3, bite: -0.25, left: 1.75 });
  });

  it('says so when nothing is in stock', () => {
    expect(screwFor(1.5, 1.5, { ...SCREWS, lengths: [] })).toMatchObject({ problem: 'shortest too long', length: 0 });
  });
});
