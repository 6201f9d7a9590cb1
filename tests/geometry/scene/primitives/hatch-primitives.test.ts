import fc from 'fast-check';

import { area, contains } from '@/geometry/core/polygon';
import type { Point } from '@/geometry/core/point';
import { scanLines } from '@/geometry/scene/primitives/scan-lines';

const SQUARE: readonly Point[] = [[0, 0], [100, 0], [100, 100], [0, 100]]; // prettier-ignore
const HOLE: readonly Point[] = [[30, 30], [70, 30], [70, 70], [30, 70]]; // prettier-ignore

const total = (strokes: readonly (readonly [Point, Point])[]) =>
  strokes.reduce((sum, [a, b]) => sum + Math.hypot(b[0] - a[0], b[1] - a[1]), 0);

describe('scanLines', () => {
  it("covers an area evenly at any angle: stroke length times spacing is the area (Cavalieri's principle)", () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: Math.PI, noNaN: true }), (angle) => {
        const covered = total(scanLines([SQUARE], 0.5, angle)) * 0.5;
        return Math.abs(covered - area(SQUARE)) < 0.01 * area(SQUARE);
      }),
      { seed: 11, numRuns: 60 },
    );
  });

  it('leaves holes free', () => {
    const strokes = scanLines([SQUARE, HOLE], 3, 0.4);
    const middles = strokes.map(([a, b]): Point => [(a[0] + b[0]) / 2, (a[1] + b[1]) / 2]);
    expect(middles.some((p) => contains(HOLE, p))).toBe(false);
    expect(total(strokes) * 3).toBeCloseTo(area(SQUARE) - area(HOLE), -2);
  });

  it('puts strokes of neighbouring shapes on the same lines', () => {
    const next = SQUARE.map(([x, y]): Point => [x + 100, y]);
    const rows = (ring: readonly Point[]) => scanLines([ring], 7, 0).map(([a]) => a[1]);
    expect(rows(next)).toEqual(rows(SQUARE));
  });
});
