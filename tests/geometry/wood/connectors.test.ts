import fc from 'fast-check';
import { toRadians } from '@/geometry/core/angle';
import type { Point } from '@/geometry/core/point';
import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import { CONNECTOR_SIZES, deepestMortise, withSize } from '@/geometry/wood/connector-sizes';
import {
  connectorsAlong,
  endDistances,
  leastFromPoint,
  mortiseCover,
  stretchesInCutouts,
} from '@/geometry/wood/connectors';

const SETTINGS = DEFAULT_SETTINGS.connectors;
const square = (length: number) => ({ length, angles: [90, 90] as const });

const rectangle = (x0: number, y0: number, x1: number, y1: number): Point[] => [
  [x0, y0],
  [x1, y0],
  [x1, y1],
  [x0, y1],
];

describe('connectorsAlong', () => {
  it('sets out a 33 in joint every 6 in from both ends, first 3 in', () => {
    expect(connectorsAlong(square(33), SETTINGS)).toEqual([3, 9, 15, 18, 24, 30]);
  });

  it('puts one in the middle where the inmost two fall on each other', () => {
    expect(connectorsAlong(square(30), SETTINGS)).toEqual([3, 9, 15, 21, 27]);
    expect(connectorsAlong(square(30.5), SETTINGS)).toEqual([3, 9, 15.25, 21.5, 27.5]);
  });

  it('adds one in the middle where the last two would stand further apart than the spacing', () => {
    expect(connectorsAlong(square(25), SETTINGS)).toEqual([3, 9, 12.5, 16, 22]);
    expect(connectorsAlong(square(16), SETTINGS)).toEqual([3, 8, 13]);
  });

  it('gives one to a joint of 6 in and none to a shorter one', () => {
    expect(connectorsAlong(square(6), SETTINGS)).toEqual([3]);
    expect(connectorsAlong(square(5.9), SETTINGS)).toEqual([]);
  });

  it('moves the first one in at a 20 degree point, and leaves 1/4 in of wood beside it', () => {
    const [back, front] = endDistances([20, 25], SETTINGS);
    expect(back).toBe(4.5);
    expect(front).toBe(3);
    const centres = connectorsAlong({ length: 60, angles: [20, 25] }, SETTINGS);
    expect(centres[0]).toBe(4.5);
    expect(mortiseCover(4.5, toRadians(20), SETTINGS.width, SETTINGS.depth)).toBeGreaterThanOrEqual(0.25);
  });

  it('keeps out of a sink cutout and 1 1/2 in clear of a drawbolt', () => {
    const centres = connectorsAlong(square(48), SETTINGS, [[14, 34]], [9]);
    expect(centres.every((s) => s <= 14 || s >= 34)).toBe(true);
    const clear = SETTINGS.fromHardware + SETTINGS.width / 2;
    expect(Math.min(...centres.map((s) => Math.abs(s - 9)))).toBeGreaterThanOrEqual(clear - 1e-9);
    expect(centres).toContain(9 - clear);
  });

  it('never lies closer to an end, a point, a cutout or a bolt than it may, nor much further apart than the spacing', () => {
    // One in the middle may stand half a mortise and its cover further from its neighbors.
    const most = SETTINGS.spacing + (SETTINGS.width + SETTINGS.cover) / 2;
    fc.assert(
      fc.property(
        fc.double({ min: 12, max: 90, noNaN: true }),
        fc.double({ min: 15, max: 165, noNaN: true }),
        fc.double({ min: 15, max: 165, noNaN: true }),
        (length, left, right) => {
          const joint = { length, angles: [left, right] as const };
          const centres = connectorsAlong(joint, SETTINGS);
          const covers = centres.flatMap((s) =>
            [left, right].flatMap((f) => [
              mortiseCover(s, toRadians(f), SETTINGS.width, SETTINGS.depth),
              mortiseCover(length - s, Math.PI - toRadians(f), SETTINGS.width, SETTINGS.depth),
            ]),
          );
          const gaps = centres.slice(1).map((s, i) => s - centres[i]!);
          return covers.every((c) => c >= SETTINGS.cover - 1e-9) && gaps.every((g) => g > 0 && g <= most + 1e-9);
        },
      ),
      { seed: 451 },
    );
  });
});

describe('mortiseCover', () => {
  it('follows (s - b/2) sin f - d cos f: 3 in from a 45 degree point leaves 0.950 in', () => {
    expect(mortiseCover(3, toRadians(45), 0.9375, 1.1875)).toBeCloseTo((3 - 0.46875 - 1.1875) * Math.SQRT1_2, 9);
  });

  it('is the distance from the mortise corner to the edge in the plane', () => {
    const [s, f, b, d] = [4, toRadians(35), 1, 1.25];
    // The joint runs along +x from the point, the piece's other edge leaves it at f; the near deep corner is (s - b/2, d).
    const corner: Point = [s - b / 2, d];
    const toEdge = corner[0] * Math.sin(f) - corner[1] * Math.cos(f);
    expect(mortiseCover(s, f, b, d)).toBeCloseTo(toEdge, 12);
  });

  it('comes through a sharp point', () => {
    expect(mortiseCover(1, toRadians(30), 0.9375, 1.1875)).toBeLessThan(0);
  });
});

describe('leastFromPoint', () => {
  it('grows as the point gets sharper', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 6, max: 88, noNaN: true }),
        (angle) => leastFromPoint(toRadians(angle), SETTINGS) > leastFromPoint(toRadians(angle + 1), SETTINGS),
      ),
      { seed: 452 },
    );
  });

  it('asks for nothing where the joint runs along the edge', () => {
    expect(leastFromPoint(0, SETTINGS)).toBe(0);
    expect(leastFromPoint(Math.PI, SETTINGS)).toBe(0);
  });
});

describe('stretchesInCutouts', () => {
  it('blocks the part of a seam that runs through a sink, with the mortise and its cover to spare', () => {
    const [stretch] = stretchesInCutouts([50, 0], [50, -25], [rectangle(35, -23, 65, -2)], SETTINGS);
    const side = SETTINGS.width / 2 + SETTINGS.cover;
    expect(stretch![0]).toBeCloseTo(2 - side, 9);
    expect(stretch![1]).toBeCloseTo(23 + side, 9);
  });

  it('blocks where a cutout beside the seam is nearer than the mortise is deep', () => {
    const reach = SETTINGS.depth + SETTINGS.cover;
    const near = [rectangle(50 + reach - 0.01, -20, 70, -5)];
    const far = [rectangle(50 + reach + 0.01, -20, 70, -5)];
    expect(stretchesInCutouts([50, 0], [50, -25], near, SETTINGS)).toHaveLength(1);
    expect(stretchesInCutouts([50, 0], [50, -25], far, SETTINGS)).toHaveLength(0);
  });

  it('blocks nothing on a joint of no length', () => {
    expect(stretchesInCutouts([1, 1], [1, 1], [rectangle(0, 0, 5, 5)], SETTINGS)).toEqual([]);
  });
});

describe('CONNECTOR_SIZES', () => {
  it('offers tenons, dowels and biscuits, each thinner than half a 1 1/2 in top', () => {
    expect(new Set(CONNECTOR_SIZES.map((s) => s.kind))).toEqual(new Set(['loose tenon', 'dowel', 'biscuit']));
    for (const size of CONNECTOR_SIZES) expect(size.thickness).toBeLessThanOrEqual(0.75);
  });

  it('changes the mortise and leaves the shop its distances', () => {
    const dowel = CONNECTOR_SIZES.find((s) => s.kind === 'dowel')!;
    expect(withSize(SETTINGS, dowel)).toEqual({ ...SETTINGS, kind: 'dowel', width: dowel.width, depth: dowel.depth });
  });
});

describe('deepestMortise', () => {
  it('goes exactly as deep as the cover allows', () => {
    const f = toRadians(30);
    const depth = deepestMortise(3, f, SETTINGS);
    expect(mortiseCover(3, f, SETTINGS.width, depth)).toBeCloseTo(SETTINGS.cover, 9);
  });

  it('has no limit at a square end and no room right at the point', () => {
    expect(deepestMortise(3, toRadians(90), SETTINGS)).toBeGreaterThan(1e6);
    expect(deepestMortise(0.5, toRadians(30), SETTINGS)).toBe(0);
  });
});
