import { adjustNetwork } from '@/geometry/room/adjust-network';
import type { Adjustment } from '@/geometry/room/adjust-network';
import type { NetworkObservation, NetworkPoint } from '@/geometry/room/network';
import {
  BENNING_8_2,
  GHILANI_14_5,
  GHILANI_16_1,
  GHILANI_21_10,
  MIKHAIL_7_1,
  MIKHAIL_9_1,
  STRANG_BORRE,
} from '@/tests/fixtures/published/survey-networks';
import type { PublishedNetwork } from '@/tests/fixtures/published/survey-networks';

const DEGREE = Math.PI / 180;

interface Solved {
  readonly adjustment: Adjustment;
  readonly index: (name: string) => number;
  readonly at: (name: string) => readonly [number, number];
}

function solve(network: PublishedNetwork): Solved {
  const names = [...Object.keys(network.fixed), ...Object.keys(network.start)];
  const index = (name: string): number => {
    const i = names.indexOf(name);
    if (i < 0) throw new Error(`no point ${name}`);
    return i;
  };
  const points: NetworkPoint[] = names.map((name) => {
    const free = name in network.start;
    return { start: (network.start[name] ?? network.fixed[name])!, freeX: free, freeY: free };
  });
  const observations: NetworkObservation[] = [
    ...network.angles.map(([at, back, fore, deg, seconds]): NetworkObservation => ({
      quantity: { kind: 'angle', at: index(at), from: index(fore), to: index(back) },
      value: deg * DEGREE,
      sd: (seconds / 3600) * DEGREE,
    })),
    ...network.distances.map(([from, to, value, sd]): NetworkObservation => ({
      quantity: { kind: 'distance', from: { point: index(from) }, to: { point: index(to) } },
      value,
      sd,
    })),
  ];
  const result = adjustNetwork(points, observations);
  if (result.kind !== 'adjusted') throw new Error(result.kind);
  return { adjustment: result.adjustment, index, at: (name) => result.adjustment.points[index(name)]! };
}

const unitSd = ({ adjustment }: Solved): number => Math.sqrt(adjustment.chi2 / adjustment.dof);

const largest = ({ adjustment }: Solved): number => Math.max(...adjustment.standardised.map((w) => Math.abs(w ?? 0)));

describe('adjustNetwork against published networks', () => {
  it('gives the point of Strang & Borre Example 10.1 / 12.4 and its standard deviations', () => {
    // Far-off points west and south turn a distance into a coordinate, so that its sd can be asked for.
    const far = { west: [-1e7, 170.7234], south: [170.7029, -1e7] } as const;
    const net = solve({ ...STRANG_BORRE, fixed: { ...STRANG_BORRE.fixed, ...far } });
    expect(net.at('P')[0]).toBeCloseTo(170.7029, 4);
    expect(net.at('P')[1]).toBeCloseTo(170.7234, 4);
    expect(net.adjustment.dof).toBe(1);
    expect(unitSd(net)).toBeCloseTo(3.303, 3);
    // The published sds are scaled by the unit sd; ours are a priori.
    const sdTowards = (name: string): number =>
      unitSd(net) *
      Math.sqrt(
        net.adjustment.predict({
          kind: 'distance',
          from: { point: net.index(name) },
          to: { point: net.index('P') },
        }).variance,
      );
    expect(sdTowards('west')).toBeCloseTo(0.03303, 5);
    expect(sdTowards('south')).toBeCloseTo(0.02335, 5);
  });

  it('shows one spare distance as the same 3.303 at every reading of Strang & Borre', () => {
    const { standardised } = solve(STRANG_BORRE).adjustment;
    for (const w of standardised) expect(Math.abs(w!)).toBeCloseTo(3.303, 3);
  });

  it('gives Wisconsin and Campus of Ghilani Example 14.5', () => {
    const net = solve(GHILANI_14_5);
    expect(net.at('Wisconsin')[0]).toBeCloseTo(2415776.9044, 3);
    expect(net.at('Wisconsin')[1]).toBeCloseTo(391043.2945, 3);
    expect(net.at('Campus')[0]).toBeCloseTo(2416892.6955, 3);
    expect(net.at('Campus')[1]).toBeCloseTo(387603.2551, 3);
    expect(unitSd(net)).toBeCloseTo(13.5905, 3);
  });

  it('detects but cannot name the wrong distance of Example 14.5', () => {
    const { standardised } = solve(GHILANI_14_5).adjustment;
    for (const w of standardised) expect(Math.abs(w!)).toBeCloseTo(13.5905, 3);
    const [first, ...rest] = GHILANI_14_5.distances;
    const mended = solve({ ...GHILANI_14_5, distances: [['Badger', 'Wisconsin', 5870.64, first![3]], ...rest] });
    expect(unitSd(mended)).toBeLessThan(1);
  });

  it('gives points 3 and 4 of Benning Example 8-2', () => {
    const net = solve(BENNING_8_2);
    expect(net.at('3')[0]).toBeCloseTo(-0.0096, 4);
    expect(net.at('3')[1]).toBeCloseTo(-0.0226, 4);
    expect(net.at('4')[0]).toBeCloseTo(999.993, 4);
    expect(net.at('4')[1]).toBeCloseTo(0.0174, 4);
    expect(unitSd(net)).toBeCloseTo(0.688, 3);
  });

  it('gives the traverse point of Ghilani Example 16.1 from distances and clockwise angles', () => {
    const net = solve(GHILANI_16_1);
    expect(net.at('U')[0]).toBeCloseTo(1173.0886, 3);
    expect(net.at('U')[1]).toBeCloseTo(1099.9872, 3);
    expect(net.adjustment.dof).toBe(3);
  });

  it('gives the points of Ghilani Problem 21.10 with its bad angle in', () => {
    const net = solve(GHILANI_21_10);
    expect(net.at('C')[0]).toBeCloseTo(9787.825, 3);
    expect(net.at('C')[1]).toBeCloseTo(8038.5354, 3);
    expect(net.at('D')[0]).toBeCloseTo(9260.8604, 3);
    expect(net.at('D')[1]).toBeCloseTo(4843.9341, 3);
    expect(unitSd(net)).toBeCloseTo(9.29, 3);
  });

  it('snoops angle D-A-B of Problem 21.10 at 29.19 and finds nothing more without it', () => {
    const net = solve(GHILANI_21_10);
    const worst = net.adjustment.standardised.findIndex((w) => Math.abs(w!) === largest(net));
    expect(GHILANI_21_10.angles[worst]!.slice(0, 3)).toEqual(['D', 'A', 'B']);
    expect(largest(net)).toBeCloseTo(29.19, 2);
    const rest = solve({ ...GHILANI_21_10, angles: GHILANI_21_10.angles.filter((_, i) => i !== worst) });
    expect(unitSd(rest)).toBeCloseTo(1.093, 3);
    expect(largest(rest)).toBeCloseTo(1.88, 2);
  });

  it('gives point R of Mikhail & Ackermann Example 9.1', () => {
    const net = solve(MIKHAIL_9_1);
    expect(net.at('R')[0]).toBeCloseTo(5.0986, 4);
    expect(net.at('R')[1]).toBeCloseTo(4.8986, 4);
  });

  it('takes one second off every angle of the triangle of Mikhail & Ackermann Example 7.1', () => {
    // A base of 100 held fixed leaves the apex as the only unknown; the three angles have one spare.
    const [a, b, c] = MIKHAIL_7_1.readings;
    const second = DEGREE / 3600;
    const result = adjustNetwork(
      [
        { start: [0, 0], freeX: false, freeY: false },
        { start: [100, 0], freeX: false, freeY: false },
        { start: [70, 60], freeX: true, freeY: true },
      ],
      [
        { quantity: { kind: 'angle', at: 0, from: 1, to: 2 }, value: a * DEGREE, sd: second },
        { quantity: { kind: 'angle', at: 1, from: 2, to: 0 }, value: b * DEGREE, sd: second },
        { quantity: { kind: 'angle', at: 2, from: 0, to: 1 }, value: c * DEGREE, sd: second },
      ],
    );
    if (result.kind !== 'adjusted') throw new Error(result.kind);
    expect(result.adjustment.dof).toBe(1);
    result.adjustment.residuals.forEach((residual, i) => {
      const adjusted = MIKHAIL_7_1.readings[i]! + residual / DEGREE;
      expect((adjusted - MIKHAIL_7_1.adjusted[i]!) * 3600).toBeCloseTo(0, 5);
    });
  });
});
