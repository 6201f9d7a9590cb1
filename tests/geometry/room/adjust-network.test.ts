import { adjustNetwork } from '@/geometry/room/adjust-network';
import type { NetworkObservation, NetworkPoint } from '@/geometry/room/network';

const fixed = (x: number, y: number): NetworkPoint => ({ start: [x, y], freeX: false, freeY: false });
const free = (x: number, y: number): NetworkPoint => ({ start: [x, y], freeX: true, freeY: true });
const tape = (from: number, to: number, value: number, sd = 0.05): NetworkObservation => ({
  quantity: { kind: 'distance', from: { point: from }, to: { point: to } },
  value,
  sd,
});

describe('adjustNetwork', () => {
  it('meets two circles exactly, with the covariance of right-angled crossing', () => {
    const result = adjustNetwork([fixed(0, 0), fixed(50, 0), free(20, 30)], [tape(0, 2, 30), tape(1, 2, 40)]);
    if (result.kind !== 'adjusted') throw new Error(result.kind);
    const { adjustment } = result;
    // A 30-40-50 triangle: foot at 18, height 24.
    expect(adjustment.points[2]![0]).toBeCloseTo(18, 9);
    expect(adjustment.points[2]![1]).toBeCloseTo(24, 9);
    expect(adjustment.dof).toBe(0);
    expect(adjustment.standardised).toEqual([null, null]);
    const { variance } = adjustment.predict({ kind: 'distance', from: { point: 0 }, to: { point: 2 } });
    expect(Math.sqrt(variance)).toBeCloseTo(0.05, 10);
  });

  it('calls a point that only one circle holds open, and says where it may go', () => {
    const result = adjustNetwork([fixed(0, 0), free(20, 0)], [tape(0, 1, 30)]);
    if (result.kind !== 'open') throw new Error(result.kind);
    expect(result.directions).toHaveLength(1);
    const [, shift] = result.directions[0]!;
    expect(Math.abs(shift![0])).toBeLessThan(1e-6);
    expect(Math.abs(shift![1])).toBeCloseTo(1, 6);
  });

  it('reads a bearing against east, counter-clockwise', () => {
    const north: NetworkObservation = { quantity: { kind: 'bearing', from: 0, to: 1 }, value: Math.PI / 2, sd: 0.001 };
    const result = adjustNetwork([fixed(0, 0), free(3, 8)], [tape(0, 1, 10), north]);
    if (result.kind !== 'adjusted') throw new Error(result.kind);
    expect(result.adjustment.points[1]![0]).toBeCloseTo(0, 8);
    expect(result.adjustment.points[1]![1]).toBeCloseTo(10, 8);
  });

  it('comes to rest where three tapes cannot meet and stretch the figure flat', () => {
    // Two fixed points 100 apart, tapes of 30 and 40 from them: the best point lies between, on the line.
    const result = adjustNetwork(
      [fixed(0, 0), fixed(100, 0), free(40, 12)],
      [tape(0, 2, 30), tape(1, 2, 40), tape(1, 2, 41)],
    );
    if (result.kind !== 'open') throw new Error(result.kind);
    expect(result.points[2]![1]).toBeCloseTo(0, 3);
    // Of 100 in, 30 + 40.5 are there; the 29.5 in that are missing are shared 2 to 1, as one tape stands against two.
    expect(result.points[2]![0]).toBeCloseTo(30 + (2 / 3) * 29.5, 3);
  });

  it('weighs a reading by the square of its standard deviation', () => {
    const points = [fixed(0, 0), { start: [90, 0] as const, freeX: true, freeY: false }];
    const result = adjustNetwork(points, [tape(0, 1, 100, 0.1), tape(0, 1, 101, 0.2)]);
    if (result.kind !== 'adjusted') throw new Error(result.kind);
    expect(result.adjustment.points[1]![0]).toBeCloseTo(100.2, 9);
    expect(result.adjustment.redundancies[0]).toBeCloseTo(0.2, 9);
    expect(result.adjustment.redundancies[1]).toBeCloseTo(0.8, 9);
    expect(result.adjustment.residualCorrelation(0, 1)).toBeCloseTo(-1, 9);
  });

  it('refuses a network without unknowns and a standard deviation of 0', () => {
    expect(() => adjustNetwork([fixed(0, 0), fixed(1, 0)], [tape(0, 1, 1)])).toThrow(RangeError);
    expect(() => adjustNetwork([fixed(0, 0), free(1, 0)], [tape(0, 1, 1, 0)])).toThrow(RangeError);
  });
});
