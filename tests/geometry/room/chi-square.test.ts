import { chiSquareProbability, chiSquareQuantile } from '@/geometry/room/chi-square';

/**
 * Upper 5 % points as printed in every table of the distribution, e.g. NIST/SEMATECH e-Handbook of Statistical Methods,
 * 1.3.6.7.4, column 0.95.
 */
const PRINTED: readonly (readonly [number, number])[] = [
  [1, 3.841],
  [2, 5.991],
  [3, 7.815],
  [4, 9.488],
  [5, 11.07],
  [6, 12.592],
  [7, 14.067],
  [8, 15.507],
  [9, 16.919],
  [10, 18.307],
  [15, 24.996],
  [20, 31.41],
  [30, 43.773],
  [50, 67.505],
  [100, 124.342],
];

describe('chiSquareQuantile', () => {
  it.each(PRINTED)('gives the printed 95 %% point for %i spare readings', (dof, value) => {
    expect(Math.abs(chiSquareQuantile(0.95, dof) - value)).toBeLessThan(5.1e-4);
  });

  it('is -2 ln(1 - p) for two spare readings', () => {
    for (const p of [0.001, 0.3, 0.5, 0.95, 0.999]) {
      expect(chiSquareQuantile(p, 2)).toBeCloseTo(-2 * Math.log(1 - p), 12);
    }
  });

  it('is the square of the two-sided normal critical values for one spare reading', () => {
    // references.md, two-sided normal: 0.05 1.9600, 0.01 2.5758, 0.001 3.2905.
    expect(Math.sqrt(chiSquareQuantile(0.95, 1))).toBeCloseTo(1.95996, 5);
    expect(Math.sqrt(chiSquareQuantile(0.99, 1))).toBeCloseTo(2.57583, 5);
    expect(Math.sqrt(chiSquareQuantile(0.999, 1))).toBeCloseTo(3.29053, 5);
  });

  it('undoes the probability from 1 to 200 spare readings', () => {
    for (const dof of [1, 2, 3, 7, 20, 77, 200]) {
      for (const p of [0.01, 0.5, 0.95, 0.9999]) {
        expect(chiSquareProbability(chiSquareQuantile(p, dof), dof)).toBeCloseTo(p, 12);
      }
    }
  });

  it('refuses probabilities and degrees of freedom outside their range', () => {
    expect(() => chiSquareQuantile(1, 3)).toThrow(RangeError);
    expect(() => chiSquareQuantile(0.5, 0)).toThrow(RangeError);
    expect(() => chiSquareProbability(3, -1)).toThrow(RangeError);
  });

  it('gives probability 0 at and under 0', () => {
    expect(chiSquareProbability(0, 4)).toBe(0);
    expect(chiSquareProbability(-3, 4)).toBe(0);
  });
});
