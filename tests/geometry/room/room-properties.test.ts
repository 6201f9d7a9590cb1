import fc from 'fast-check';

import { adjustNetwork } from '@/geometry/room/adjust-network';
import type { NetworkObservation, NetworkPoint } from '@/geometry/room/network';
import type { RoomFit, RoomInput } from '@/geometry/room/types';
import { readRoomFile } from '@/shared/layout/read-room-file';
import { fitted } from '@/tests/builders/room-input';
import { seeded } from '@/tests/helpers/random';
import { tapeRoom } from '@/tests/helpers/taped-room';
import type { TapePlan } from '@/tests/helpers/taped-room';
import { DRAWINGS, trueAngleDeg, trueRoom } from '@/tests/helpers/true-rooms';
import type { TrueRoom } from '@/tests/helpers/true-rooms';

const NAMES = Object.keys(DRAWINGS);
const RUNS = { seed: 7, numRuns: 60 };

interface Case {
  readonly room: TrueRoom;
  readonly input: RoomInput;
}

/** A room and its readings; every corner read, one or two diagonals to spare. */
function makeCase(seed: number, noise: number): Case {
  const random = seeded(seed);
  const name = NAMES[random.below(NAMES.length)]!;
  const room = trueRoom(
    name,
    random,
    Array.from({ length: 12 }, () => random.normal()),
  );
  const corners = room.nominalDeg.map((): TapePlan['corners'][number] => (random.below(2) ? 'triangle' : 'angle'));
  return { room, input: tapeRoom(room, { corners, ties: [[0, 2]], noise }, random) };
}

const cases = (noise: number): fc.Arbitrary<Case> => fc.integer({ min: 1, max: 1e9 }).map((s) => makeCase(s, noise));

function expectSamePoints(a: RoomFit, b: RoomFit, tolerance: number): void {
  a.points.forEach((p, i) => {
    expect(Math.hypot(p[0] - b.points[i]![0], p[1] - b.points[i]![1])).toBeLessThan(tolerance);
  });
}

describe('fitRoom, whatever the room', () => {
  it('gives the exact room from exact readings', () => {
    fc.assert(
      fc.property(cases(0), ({ room, input }) => {
        const fit = fitted(input);
        fit.points.forEach((p, i) => {
          expect(Math.hypot(p[0] - room.points[i]![0], p[1] - room.points[i]![1])).toBeLessThan(1e-6);
        });
        fit.corners.forEach((c, i) => expect(Math.abs(c.angleDeg - trueAngleDeg(room, i))).toBeLessThan(1e-6));
        expect(fit.chi2).toBeLessThan(1e-9);
        expect(fit.suspects).toEqual([]);
      }),
      RUNS,
    );
  });

  it('does not care in which order corners and ties were read', () => {
    fc.assert(
      fc.property(cases(1), ({ input }) => {
        const a = fitted(input);
        const b = fitted({ ...input, corners: [...input.corners].reverse(), ties: [...input.ties].reverse() });
        expectSamePoints(a, b, 1e-9);
        expect(b.chi2).toBeCloseTo(a.chi2, 8);
      }),
      RUNS,
    );
  });

  it('gives redundancies that add up to the spare readings', () => {
    fc.assert(
      fc.property(cases(1), ({ input }) => {
        const fit = fitted(input);
        const rows = [...fit.walls, ...fit.corners, ...fit.ties];
        expect(rows.reduce((sum, r) => sum + r.redundancy!, 0)).toBeCloseTo(fit.dof, 6);
      }),
      RUNS,
    );
  });

  it('keeps the room and scales its uncertainty when every sd is scaled', () => {
    fc.assert(
      fc.property(cases(1), fc.double({ min: 0.2, max: 5, noNaN: true }), ({ input }, k) => {
        const a = fitted(input);
        const b = fitted({
          ...input,
          tapeSd: { fixed: input.tapeSd.fixed * k, perInch: input.tapeSd.perInch * k },
          corners: input.corners.map((c) =>
            c.angleDeg === undefined ? c : { ...c, angleSdDeg: (c.angleSdDeg ?? 0.2) * k },
          ),
        });
        expectSamePoints(a, b, 1e-7);
        expect(b.chi2 * k * k).toBeCloseTo(a.chi2, 6);
        a.walls.forEach((w, i) => expect(b.walls[i]!.sd / w.sd).toBeCloseTo(k, 6));
        a.corners.forEach((c, i) => expect(b.corners[i]!.sdDeg / c.sdDeg).toBeCloseTo(k, 6));
      }),
      RUNS,
    );
  });

  it('does not care about the units of the file', () => {
    fc.assert(
      fc.property(cases(1), ({ input }) => {
        const a = fitted(input);
        const b = fitted(inMillimeters(input));
        expectSamePoints(a, b, 1e-7);
        a.corners.forEach((c, i) => expect(b.corners[i]!.sdDeg).toBeCloseTo(c.sdDeg, 8));
      }),
      RUNS,
    );
  });

  it('gives the same ring, turned and moved, whichever wall is called the first', () => {
    const rings = cases(1).filter(({ input }) => input.closed);
    fc.assert(
      fc.property(rings, fc.integer({ min: 1, max: 11 }), ({ input }, shift) => {
        const k = shift % input.walls.length;
        const a = fitted({ ...input, ties: [] });
        const walls = [...input.walls.slice(k), ...input.walls.slice(0, k)];
        const b = fitted({ ...input, ties: [], walls });
        const n = walls.length;
        for (let i = 0; i < n; i++) {
          for (let j = 0; j < i; j++) {
            const [p, q] = [a.points[(i + k) % n]!, a.points[(j + k) % n]!];
            const [r, s] = [b.points[i]!, b.points[j]!];
            expect(Math.hypot(r[0] - s[0], r[1] - s[1])).toBeCloseTo(Math.hypot(p[0] - q[0], p[1] - q[1]), 7);
          }
        }
        expect(b.chi2).toBeCloseTo(a.chi2, 7);
      }),
      RUNS,
    );
  });

  it('gives the mirrored room when left and right are changed over', () => {
    const open = cases(1).filter(({ input }) => !input.closed);
    fc.assert(
      fc.property(open, ({ input }) => {
        const a = fitted({ ...input, ties: [] });
        const b = fitted(seenFromBehind(input));
        const n = a.corners.length;
        a.corners.forEach((c, i) => {
          // Outside becomes inside and the order of corners turns round.
          expect(b.corners[n - 1 - i]!.angleDeg).toBeCloseTo(360 - c.angleDeg, 7);
          expect(b.corners[n - 1 - i]!.sdDeg).toBeCloseTo(c.sdDeg, 7);
        });
      }),
      RUNS,
    );
  });
});

/** The same readings as a file in millimeters would give them. */
function inMillimeters(input: RoomInput): RoomInput {
  const mm = (inches: number): number => inches * 25.4;
  const read = readRoomFile({
    units: 'mm',
    closed: input.closed,
    tapeSd: { fixed: mm(input.tapeSd.fixed), perInch: input.tapeSd.perInch },
    walls: input.walls.map((w) => ({ id: w.id, length: w.lengths.map(mm) })),
    corners: input.corners.map((c) => ({
      between: c.between,
      nominal: c.nominalDeg,
      ...(c.triangle && { triangle: { a: mm(c.triangle.a), b: mm(c.triangle.b), c: `${mm(c.triangle.c)} mm` } }),
      ...(c.angleDeg !== undefined && { angle: c.angleDeg, sd: c.angleSdDeg }),
    })),
    ties: input.ties.map((t) => ({ ...t, length: mm(t.length) })),
  });
  if (!read.ok) throw new Error(read.error.message);
  return read.input;
}

/** The walls from right to left, as somebody on their other side sees them. */
function seenFromBehind(input: RoomInput): RoomInput {
  return {
    ...input,
    ties: [],
    walls: [...input.walls].reverse(),
    corners: input.corners.map((c) => ({
      ...c,
      between: [c.between[1], c.between[0]],
      nominalDeg: 360 - c.nominalDeg!,
      ...(c.triangle && { triangle: { ...c.triangle, a: c.triangle.b, b: c.triangle.a } }),
      ...(c.angleDeg !== undefined && { angleDeg: 360 - c.angleDeg }),
    })),
  };
}

describe('adjustNetwork under a rigid motion', () => {
  it('moves and turns the free point with its fixed points, residuals and redundancies unchanged', () => {
    const fixed = [
      [0, 0],
      [120, 10],
      [40, 150],
    ] as const;
    const start = [60, 60] as const;
    const readings = [86.2, 79.1, 91.4];
    const angle = (Math.PI * 2) / 7;
    fc.assert(
      fc.property(
        fc.double({ min: -Math.PI, max: Math.PI, noNaN: true }),
        fc.double({ min: -500, max: 500, noNaN: true }),
        fc.double({ min: -500, max: 500, noNaN: true }),
        (turn, dx, dy) => {
          const place = ([x, y]: readonly [number, number]): readonly [number, number] => [
            x * Math.cos(turn) - y * Math.sin(turn) + dx,
            x * Math.sin(turn) + y * Math.cos(turn) + dy,
          ];
          const solve = (map: typeof place) => {
            const points: NetworkPoint[] = [
              ...fixed.map((p) => ({ start: map(p), freeX: false, freeY: false })),
              { start: map(start), freeX: true, freeY: true },
            ];
            const observations: NetworkObservation[] = [
              ...readings.map((value, i): NetworkObservation => ({
                quantity: { kind: 'distance', from: { point: i }, to: { point: 3 } },
                value,
                sd: 0.1,
              })),
              { quantity: { kind: 'angle', at: 3, from: 1, to: 2 }, value: angle * 1.5, sd: 0.01 },
            ];
            const result = adjustNetwork(points, observations);
            if (result.kind !== 'adjusted') throw new Error(result.kind);
            return result.adjustment;
          };
          const still = solve((p) => p);
          const moved = solve(place);
          const expected = place(still.points[3]!);
          expect(moved.points[3]![0]).toBeCloseTo(expected[0], 7);
          expect(moved.points[3]![1]).toBeCloseTo(expected[1], 7);
          still.redundancies.forEach((r, i) => expect(moved.redundancies[i]).toBeCloseTo(r, 8));
          still.residuals.forEach((v, i) => expect(moved.residuals[i]).toBeCloseTo(v, 6));
        },
      ),
      { seed: 11, numRuns: 100 },
    );
  });
});
