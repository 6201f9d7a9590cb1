import type { NextMeasurement, RoomInput, TieInput } from '@/geometry/room/types';
import { fitted, roomInput, walls, WORKED_EXAMPLE } from '@/tests/builders/room-input';

const worst = (input: RoomInput): number => Math.max(...fitted(input).corners.map((c) => c.sdDeg));

/** The room with the suggested reading taken, reading exactly what the fit predicts. */
function withReading(input: RoomInput, next: NextMeasurement): RoomInput {
  const { points } = fitted(input);
  if (next.kind === 'triangle') {
    const corner = fitted(input).corners.find((c) => c.between.join() === next.between.join())!;
    const t = (corner.angleDeg * Math.PI) / 180;
    const c = Math.sqrt(next.a ** 2 + next.b ** 2 - 2 * next.a * next.b * Math.cos(t));
    const triangle = { a: next.a, b: next.b, c };
    const others = input.corners.filter((k) => k.between.join() !== next.between.join());
    const said = input.corners.find((k) => k.between.join() === next.between.join());
    return { ...input, corners: [...others, { ...said, between: next.between, triangle }] };
  }
  const index = (mark: { wall: string; at: number | 'end' }): number =>
    (input.walls.findIndex((w) => w.id === mark.wall) + (mark.at === 'end' ? 1 : 0)) % points.length;
  const [p, q] = [points[index(next.from)]!, points[index(next.to)]!];
  const tie: TieInput = { id: 'new', from: next.from, to: next.to, length: Math.hypot(q[0] - p[0], q[1] - p[1]) };
  return { ...input, ties: [...input.ties, tie] };
}

describe('fitRoom saying what to measure next', () => {
  it('promises the standard deviation that taking the reading brings', () => {
    const { next } = fitted(WORKED_EXAMPLE, { next: true });
    expect(worst(withReading(WORKED_EXAMPLE, next!))).toBeCloseTo(next!.worstCornerSdThenDeg, 4);
    expect(worst(WORKED_EXAMPLE)).toBeCloseTo(next!.worstCornerSdNowDeg, 10);
  });

  it('takes the best of all readings it may name', () => {
    const input = roomInput({
      walls: walls(96, 120, 84),
      corners: [
        { between: ['A', 'B'], nominalDeg: 90, angleDeg: 90.4 },
        { between: ['B', 'C'], nominalDeg: 90, angleDeg: 89.8 },
      ],
    });
    const { next } = fitted(input, { next: true });
    const all: NextMeasurement[] = [
      { kind: 'triangle', between: ['A', 'B'], a: 36, b: 48 },
      { kind: 'triangle', between: ['B', 'C'], a: 36, b: 48 },
      { kind: 'tie', from: { wall: 'A', at: 0 }, to: { wall: 'B', at: 'end' } },
      { kind: 'tie', from: { wall: 'A', at: 0 }, to: { wall: 'C', at: 'end' } },
      { kind: 'tie', from: { wall: 'A', at: 'end' }, to: { wall: 'C', at: 'end' } },
    ].map((m) => ({ ...m, worstCornerSdNowDeg: 0, worstCornerSdThenDeg: 0, why: '' }) as NextMeasurement);
    const sds = all.map((m) => worst(withReading(input, m)));
    const best = Math.min(...sds);
    const { worstCornerSdNowDeg, worstCornerSdThenDeg, why } = next!;
    expect(worstCornerSdThenDeg).toBeCloseTo(best, 4);
    expect(next).toEqual({ ...all[sds.indexOf(best)], worstCornerSdNowDeg, worstCornerSdThenDeg, why });
  });

  it('names the first found of two diagonals that are worth the same', () => {
    const { next } = fitted(roomInput({ closed: true, walls: walls(144, 120, 144, 120) }), { next: true });
    expect(next).toMatchObject({ kind: 'tie', from: { wall: 'A', at: 0 }, to: { wall: 'B', at: 'end' } });
  });

  it('prefers the diagonal of an L to its triangle: the longer lever fixes the corner better', () => {
    const { next } = fitted(roomInput({ walls: walls(96, 120) }), { next: true });
    expect(next).toMatchObject({ kind: 'tie', from: { wall: 'A', at: 0 }, to: { wall: 'B', at: 'end' } });
  });

  it('marks whole inches on walls shorter than the usual marks', () => {
    const input = roomInput({
      walls: walls(20.6, 30.2),
      ties: [{ id: 'd', from: { wall: 'A', at: 0 }, to: { wall: 'B', at: 'end' }, length: Math.hypot(20.6, 30.2) }],
    });
    expect(fitted(input, { next: true }).next).toMatchObject({ kind: 'triangle', between: ['A', 'B'], a: 20, b: 30 });
  });

  it('suggests no reading that was taken, whichever way round it was written', () => {
    const corners = [{ between: ['A', 'B'] as const, nominalDeg: 90, triangle: { a: 36, b: 48, c: 60 } }];
    const ties: TieInput[] = [
      { id: 'd', from: { wall: 'B', at: 'end' }, to: { wall: 'A', at: 0 }, length: Math.hypot(96, 120) },
    ];
    expect(fitted(roomInput({ walls: walls(96, 120), corners, ties }), { next: true }).next).toBeNull();
  });

  it('has nothing to suggest for a single wall', () => {
    expect(fitted(roomInput({ walls: walls(96) }), { next: true }).next).toBeNull();
  });

  it('never tapes along a wall of a ring: the last corner is the first one of the next wall', () => {
    const input = roomInput({
      closed: true,
      walls: walls(100, 100, 100),
      corners: ['AB', 'BC', 'CA'].map((p) => ({ between: [p[0]!, p[1]!], nominalDeg: 60 })),
    });
    expect(fitted(input, { next: true }).next?.kind ?? 'triangle').toBe('triangle');
  });

  it('says why in plain words, naming the loosest corner', () => {
    const { next } = fitted(WORKED_EXAMPLE, { next: true });
    expect(next!.why).toBe(
      'Tape from corner A-B to the right end of wall C. Corner B-C is the loosest, within 0.11 degrees; with it no corner is looser than 0.065 degrees.',
    );
  });
});
