import fc from 'fast-check';
import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import {
  changeCoefficient,
  leastBackGap,
  movementOf,
  shrinkageOf,
  swellingOf,
  upToSixteenth,
  widthChange,
} from '@/geometry/wood/movement';
import { SPECIES, speciesOf } from '@/geometry/wood/species';

const YEAR = {
  make: { tempF: 68, rh: 45 },
  summer: { tempF: 75, rh: 65 },
  winter: { tempF: 68, rh: 25 },
  heated: true,
} as const;

const maple = (
  grain: 'mixed' | 'flat' | 'edge' = 'mixed',
  depth = 25,
  year = YEAR as Parameters<typeof movementOf>[1],
) => movementOf({ species: 'hard maple', grain }, year, depth, DEFAULT_SETTINGS);

describe('widthChange', () => {
  // Wood Handbook chapter 13, worked example: flat-grained white fir, C_T 0.00245, 232 mm, 8 % to 11 %.
  it('grows 232 mm of white fir by 1.705 mm from 8 to 11 %', () => {
    expect(widthChange(232, 0.00245, 8, 11)).toBeCloseTo(1.705, 3);
    expect(232 + widthChange(232, 0.00245, 8, 11)).toBeCloseTo(233.7, 1);
  });

  it('shrinks it by the same on the way back', () => {
    expect(widthChange(232, 0.00245, 11, 8)).toBeCloseTo(-1.705, 3);
  });
});

describe('changeCoefficient', () => {
  it('takes the tangential figure flat, the radial one on edge, and their mean for mixed staves', () => {
    const oak = speciesOf('red oak')!;
    expect(changeCoefficient(oak, 'flat')).toBe(0.00369);
    expect(changeCoefficient(oak, 'edge')).toBe(0.00158);
    expect(changeCoefficient(oak, 'mixed')).toBeCloseTo(0.002635, 9);
  });
});

describe('movementOf', () => {
  it('settles a 68 F 45 %, 75 F 65 %, 68 F 25 % year at 8.5, 11.9 and 5.4 % moisture', () => {
    const { emc } = maple();
    expect([emc.make, emc.summer, emc.winter].map((m) => m.toFixed(1))).toEqual(['8.5', '11.9', '5.4']);
  });

  it('moves 25 in of mixed maple 0.420 in through that year, 0.218 up and 0.201 down', () => {
    // By hand: 25 x 0.00259 x (11.862 - 5.379); x (11.862 - 8.489); x (8.489 - 5.379).
    const movement = maple();
    expect(movement.coefficient).toBeCloseTo(0.00259, 9);
    expect(movement.acrossPerDepth).toBeCloseTo(25 * 0.00259 * (movement.emc.summer - movement.emc.winter), 12);
    expect(movement.acrossPerDepth).toBeCloseTo(0.42, 2);
    expect(movement.swelling).toBeCloseTo(0.218, 3);
    expect(movement.shrinkage).toBeCloseTo(0.201, 3);
  });

  it('cuts the slot for the 21 in between the screw lines: 0.19 + 0.353, up to 9/16', () => {
    expect(maple().slot).toBe(9 / 16);
  });

  it('fits a slot to the shank alone when the lines fall together', () => {
    expect(maple('mixed', 4).slot).toBe(3 / 16 + 1 / 16);
    expect(maple('mixed', 2).slot).toBe(upToSixteenth(0.19));
  });

  it('says that 5.4 % lies outside the 6 to 14 % the figures hold for, and 8 to 12 % does not', () => {
    expect(maple().extrapolated).toBe(true);
    const mild = { ...YEAR, winter: { tempF: 68, rh: 35 } };
    expect(maple('mixed', 25, mild).extrapolated).toBe(false);
  });

  it('reckons an unknown wood as the liveliest of the table and says so', () => {
    const unknown = movementOf({ species: 'driftwood', grain: 'flat' }, YEAR, 25, DEFAULT_SETTINGS);
    expect(unknown.coefficient).toBe(Math.max(...SPECIES.map((s) => s.tangential.value)));
    expect([unknown.assumedSpecies, maple().assumedSpecies]).toEqual([true, false]);
  });

  it('swells nothing when it is made wetter than the house ever is', () => {
    const wet = { ...YEAR, make: { tempF: 68, rh: 80 } };
    expect(maple('mixed', 25, wet).swelling).toBe(0);
    expect(maple('mixed', 25, wet).shrinkage).toBeCloseTo(maple('mixed', 25, wet).acrossPerDepth, 12);
  });

  it('grows with depth, and never moves less than it swells or shrinks', () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...SPECIES.map((s) => s.key)),
        fc.constantFrom('mixed' as const, 'flat' as const, 'edge' as const),
        fc.double({ min: 5, max: 60, noNaN: true }),
        fc.double({ min: 0.1, max: 20, noNaN: true }),
        (species, grain, depth, more) => {
          const less = movementOf({ species, grain }, YEAR, depth, DEFAULT_SETTINGS);
          const deeper = movementOf({ species, grain }, YEAR, depth + more, DEFAULT_SETTINGS);
          return (
            deeper.acrossPerDepth > less.acrossPerDepth &&
            deeper.slot >= less.slot &&
            less.acrossPerDepth >= Math.max(less.swelling, less.shrinkage) - 1e-12 &&
            Math.abs(less.swelling + less.shrinkage - less.acrossPerDepth) < 1e-12
          );
        },
      ),
      { seed: 411 },
    );
  });

  it('grows with a wetter summer', () => {
    fc.assert(
      fc.property(fc.double({ min: 50, max: 90, noNaN: true }), (rh) => {
        const wetter = { ...YEAR, summer: { tempF: 75, rh: rh + 2 } };
        return (
          maple('mixed', 25, wetter).swelling > maple('mixed', 25, { ...YEAR, summer: { tempF: 75, rh } }).swelling
        );
      }),
      { seed: 412 },
    );
  });
});

describe('leastBackGap', () => {
  it('takes the swelling of each run up to the next sixteenth', () => {
    expect(swellingOf(25, maple())).toBeCloseTo(0.2184, 4);
    expect(leastBackGap(25, maple())).toBe(1 / 4);
    expect(leastBackGap(12, maple())).toBe(1 / 8);
    expect(shrinkageOf(25, maple())).toBeCloseTo(0.2014, 4);
  });
});

describe('upToSixteenth', () => {
  it('keeps a whole sixteenth and raises anything over it', () => {
    expect(upToSixteenth(0.25)).toBe(0.25);
    expect(upToSixteenth(0.1 + 0.15)).toBe(0.25);
    expect(upToSixteenth(0.2501)).toBe(0.3125);
    expect(upToSixteenth(0)).toBe(0);
  });
});
