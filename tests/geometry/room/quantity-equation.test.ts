import fc from 'fast-check';

import type { NetworkQuantity } from '@/geometry/room/network';
import { quantityEquation } from '@/geometry/room/quantity-equation';

const QUANTITIES: readonly (readonly [string, NetworkQuantity])[] = [
  ['a distance between points', { kind: 'distance', from: { point: 0 }, to: { point: 2 } }],
  ['a distance from a mark to a point', { kind: 'distance', from: { point: 0, toward: 1, at: 20 }, to: { point: 3 } }],
  [
    'a distance between marks on two walls',
    { kind: 'distance', from: { point: 1, toward: 0, at: 36 }, to: { point: 1, toward: 2, at: 48 } },
  ],
  [
    'a distance between marks on walls apart',
    { kind: 'distance', from: { point: 0, toward: 1, at: 10 }, to: { point: 2, toward: 3, at: 30 } },
  ],
  ['an angle', { kind: 'angle', at: 1, from: 0, to: 2 }],
  ['a bearing', { kind: 'bearing', from: 3, to: 1 }],
];

const near = (x: number): fc.Arbitrary<number> => fc.double({ min: x - 15, max: x + 15, noNaN: true });
const points = fc.tuple(near(0), near(0), near(90), near(0), near(90), near(-110), near(10), near(-100));

describe('quantityEquation', () => {
  it.each(QUANTITIES)('gives the derivatives of %s that differences give', (_, quantity) => {
    const equation = quantityEquation(quantity);
    fc.assert(
      fc.property(points, (values) => {
        const at = Float64Array.from(values);
        const gradient = new Float64Array(equation.slots.length);
        equation.evaluate(at, gradient);
        const analytic = new Float64Array(at.length);
        equation.slots.forEach((slot, i) => (analytic[slot]! += gradient[i]!));
        at.forEach((x, slot) => {
          const h = 1e-4;
          const shifted = (by: number): number => equation.evaluate(at.map((v, i) => (i === slot ? x + by : v)));
          const difference = (shifted(h) - shifted(-h)) / (2 * h);
          expect(Math.abs(analytic[slot]! - difference)).toBeLessThan(1e-7);
        });
      }),
      { seed: 5, numRuns: 100 },
    );
  });

  it('opens an angle counter-clockwise from its first leg, 0 to 360 degrees', () => {
    const equation = quantityEquation({ kind: 'angle', at: 0, from: 1, to: 2 });
    const degrees = (...c: number[]): number => (equation.evaluate(Float64Array.from(c)) * 180) / Math.PI;
    expect(degrees(0, 0, 1, 0, 0, 1)).toBeCloseTo(90, 12);
    expect(degrees(0, 0, 0, 1, 1, 0)).toBeCloseTo(270, 12);
    expect(degrees(0, 0, 1, 0, -1, 0)).toBeCloseTo(180, 12);
  });

  it('measures a mark from its own end of the wall', () => {
    const equation = quantityEquation({ kind: 'distance', from: { point: 0, toward: 1, at: 30 }, to: { point: 1 } });
    expect(equation.evaluate(Float64Array.from([0, 0, 60, 80]))).toBeCloseTo(70, 12);
  });
});
