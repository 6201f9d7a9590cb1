import type { Point } from '@/geometry/core/point';
import type { RoomFit, RoomInput } from '@/geometry/room/types';
import { fitted } from '@/tests/builders/room-input';
import { seeded } from '@/tests/helpers/random';
import type { Random } from '@/tests/helpers/random';
import { tapeRoom } from '@/tests/helpers/taped-room';
import type { TapePlan } from '@/tests/helpers/taped-room';
import { DRAWINGS, trueRoom } from '@/tests/helpers/true-rooms';
import type { TrueRoom } from '@/tests/helpers/true-rooms';

/** A tracing with every corner up to 20 degrees and every wall up to 30 % off. */
function roughSketch(room: TrueRoom, random: Random): Point[] {
  const sketch: Point[] = [[0, 0]];
  let off = random.uniform(-20, 20);
  for (let i = 0; i + 1 < room.points.length; i++) {
    const [a, b] = [room.points[i]!, room.points[i + 1]!];
    const bearing = Math.atan2(b[1] - a[1], b[0] - a[0]) + (off * Math.PI) / 180;
    const length = Math.hypot(b[0] - a[0], b[1] - a[1]) * random.uniform(0.7, 1.3);
    const [x, y] = sketch[i]!;
    sketch.push([x + length * Math.cos(bearing), y + length * Math.sin(bearing)]);
    off += random.uniform(-20, 20);
  }
  return sketch;
}

function expectSame(a: RoomFit, b: RoomFit): void {
  a.points.forEach((p, i) => {
    expect(Math.hypot(p[0] - b.points[i]![0], p[1] - b.points[i]![1])).toBeLessThan(1e-5);
  });
}

const withoutNominal = (input: RoomInput): RoomInput => ({
  ...input,
  corners: input.corners.map(({ nominalDeg, ...c }) => (c.triangle ? c : { ...c, nominalDeg })),
});

describe.each(Object.keys(DRAWINGS))('a rough sketch of a %s', (name) => {
  const random = seeded(500 + Object.keys(DRAWINGS).indexOf(name));
  const rooms = Array.from({ length: 8 }, () =>
    trueRoom(
      name,
      random,
      Array.from({ length: 12 }, () => random.normal()),
    ),
  );
  const triangles = (room: TrueRoom): TapePlan => ({
    corners: room.nominalDeg.map(() => 'triangle'),
    ties: [[0, 2]],
    noise: 1,
  });

  it('changes nothing in the fit', () => {
    for (const room of rooms) {
      const input = tapeRoom(room, triangles(room), random);
      expectSame(fitted({ ...input, sketch: roughSketch(room, random) }), fitted(input));
    }
  });

  it('is enough to find a wall that nobody taped', () => {
    for (const room of rooms) {
      const input = tapeRoom(room, triangles(room), random);
      // The diagonal from the first point fixes wall B, at a slant.
      const walls = input.walls.map((w) => (w.id === 'B' ? { ...w, lengths: [] } : w));
      const fit = fitted({ ...input, walls, sketch: roughSketch(room, random) });
      const [p, q] = [room.points[1]!, room.points[2]!];
      const miss = Math.abs(fit.walls[1]!.adjusted - Math.hypot(q[0] - p[0], q[1] - p[1]));
      expect(miss).toBeLessThan(5 * fit.walls[1]!.sd);
    }
  });

  if (!DRAWINGS[name]!.closed) {
    it('says which way a triangle turns when the drawing does not', () => {
      for (const room of rooms) {
        const input = tapeRoom(room, triangles(room), random);
        expectSame(fitted({ ...withoutNominal(input), sketch: roughSketch(room, random) }), fitted(input));
      }
    });
  }
});
