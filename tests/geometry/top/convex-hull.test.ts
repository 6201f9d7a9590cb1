import fc from 'fast-check';
import type { Point } from '@/geometry/core/point';
import { convexHull, leastWidth } from '@/geometry/top/convex-hull';

const rectangle = (length: number, width: number, turn: number): Point[] =>
  [
    [0, 0],
    [length, 0],
    [length, width],
    [0, width],
  ].map(([x, y]) => [x! * Math.cos(turn) - y! * Math.sin(turn), x! * Math.sin(turn) + y! * Math.cos(turn)]);

describe('convexHull', () => {
  it('drops points inside and on the edges', () => {
    const hull = convexHull([...rectangle(4, 2, 0), [1, 1], [2, 0]]);
    expect(hull).toEqual(rectangle(4, 2, 0));
  });
});

describe('leastWidth', () => {
  it('is the short side of a rectangle whichever way it lies', () => {
    for (const turn of [0, 0.3, 1.2, 2.5]) {
      const least = leastWidth(rectangle(96, 25, turn));
      expect(least.width).toBeCloseTo(25, 10);
      expect(least.length).toBeCloseTo(96, 10);
    }
  });

  it('is the height of an equilateral triangle', () => {
    expect(
      leastWidth([
        [0, 0],
        [2, 0],
        [1, Math.sqrt(3)],
      ]).width,
    ).toBeCloseTo(Math.sqrt(3), 12);
  });

  it('takes an L of 60 by 60 and 25 deep at 45 degrees across its open side', () => {
    const l: Point[] = [
      [0, 0],
      [60, 0],
      [60, 25],
      [25, 25],
      [25, 60],
      [0, 60],
    ];
    // From the outer corner to the line over both tips: (60 + 25) / sqrt 2.
    expect(leastWidth(l).width).toBeCloseTo(60, 10);
    const long: Point[] = [
      [0, 0],
      [100, 0],
      [100, 25],
      [25, 25],
      [25, 100],
      [0, 100],
    ];
    expect(leastWidth(long).width).toBeCloseTo(125 / Math.SQRT2, 10);
  });

  it('agrees with the least of 2,000 turns on random points', () => {
    const tape = fc.integer({ min: -3200, max: 3200 }).map((n) => n / 64);
    const points = fc.array(fc.tuple(tape, tape), { minLength: 3, maxLength: 12 });
    fc.assert(
      fc.property(points, (list) => {
        const { width } = leastWidth(list);
        let sampled = Infinity;
        for (let i = 0; i < 2000; i++) {
          const t = (Math.PI * i) / 2000;
          const along = list.map(([x, y]) => x * Math.cos(t) + y * Math.sin(t));
          sampled = Math.min(sampled, Math.max(...along) - Math.min(...along));
        }
        expect(width).toBeLessThanOrEqual(sampled + 1e-9);
        // Over a turn of half a step a width grows by no more than the span of the points times that turn.
        expect(sampled - width).toBeLessThan(142 * (Math.PI / 2000));
      }),
      { seed: 9, numRuns: 150 },
    );
  });
});
