import fc from 'fast-check';
import { basicGravity, gravityAt } from '@/geometry/wood/gravity';
import { SPECIES } from '@/geometry/wood/species';
import { densityLbPerCubicInch, pieceWeight, WATER_LB_PER_CUBIC_FOOT } from '@/geometry/wood/weight';

const KG_PER_CUBIC_METER = 1000 / WATER_LB_PER_CUBIC_FOOT;
const kgPerCubicMeter = (gravity12: number, moisture: number) =>
  densityLbPerCubicInch(gravity12, moisture) * 1728 * KG_PER_CUBIC_METER;

describe('gravityAt', () => {
  // Wood Handbook eq. 4-11, computed for basic gravity 0.56.
  it('raises a basic gravity of 0.56 to 0.6147 at 12 %', () => {
    expect(gravityAt(0.56, 12)).toBeCloseTo(0.6147, 4);
  });

  it('is undone by basicGravity, and stays put from 30 % up', () => {
    expect(basicGravity(gravityAt(0.56, 12))).toBeCloseTo(0.56, 12);
    expect(gravityAt(0.56, 30)).toBe(0.56);
    expect(gravityAt(0.56, 60)).toBe(0.56);
  });
});

describe('densityLbPerCubicInch', () => {
  // Wood Handbook chapter 4: density = water x G x (1 + x / 100), with eq. 4-11; computed values.
  it('gives 705.6 kg/m3 for gravity 0.63 at 12 %, 44.0 lb/ft3', () => {
    expect(kgPerCubicMeter(0.63, 12)).toBeCloseTo(705.6, 1);
    expect(densityLbPerCubicInch(0.63, 12) * 1728).toBeCloseTo(44.05, 2);
  });

  it('gives 688.5 kg/m3 at 12 % and 678.7 at 8 % for basic gravity 0.56', () => {
    expect(kgPerCubicMeter(gravityAt(0.56, 12), 12)).toBeCloseTo(688.5, 1);
    expect(kgPerCubicMeter(gravityAt(0.56, 12), 8)).toBeCloseTo(678.7, 1);
  });
});

describe('pieceWeight', () => {
  it('weighs a maple slab of 1.5 x 25.5 x 96 in at 12 % at 93.6 lb', () => {
    expect(pieceWeight(25.5 * 96, 1.5, 'hard maple', 12)).toBeCloseTo(93.6, 1);
  });

  it('takes an unknown wood as the heaviest of the table', () => {
    const heaviest = SPECIES.reduce((a, b) => (b.gravity12.value > a.gravity12.value ? b : a));
    expect(pieceWeight(100, 1, 'driftwood', 9)).toBe(pieceWeight(100, 1, heaviest.key, 9));
  });

  it('grows with area, thickness and moisture', () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...SPECIES.map((s) => s.key)),
        fc.double({ min: 10, max: 5000, noNaN: true }),
        fc.double({ min: 0.5, max: 4, noNaN: true }),
        fc.double({ min: 0, max: 25, noNaN: true }),
        (species, area, thickness, moisture) => {
          const weight = pieceWeight(area, thickness, species, moisture);
          return (
            pieceWeight(area + 1, thickness, species, moisture) > weight &&
            pieceWeight(area, thickness + 0.1, species, moisture) > weight &&
            pieceWeight(area, thickness, species, moisture + 1) > weight
          );
        },
      ),
      { seed: 421 },
    );
  });
});
