import { closeTraverse, walk } from '@/geometry/room/close-traverse';
import { COMPASS_TRAVERSE } from '@/tests/fixtures/published/survey-networks';

const DEGREE = Math.PI / 180;

/** North is y and east is x, so an azimuth from north over east is a quarter turn less its angle from +x. */
const legs = COMPASS_TRAVERSE.legs.map(({ azimuthDeg, length }) => ({ bearing: (90 - azimuthDeg) * DEGREE, length }));
const start = [COMPASS_TRAVERSE.start.east, COMPASS_TRAVERSE.start.north] as const;

describe('closeTraverse', () => {
  it('finds the published misclosure of the loop traverse', () => {
    const [east, north] = walk(legs, start).misclosure;
    expect(Math.abs(north - COMPASS_TRAVERSE.sumLatitude)).toBeLessThan(0.001);
    expect(Math.abs(east - COMPASS_TRAVERSE.sumDeparture)).toBeLessThan(0.001);
    // The published closure is that of the rounded sums.
    expect(Math.abs(Math.hypot(east, north) - COMPASS_TRAVERSE.closure)).toBeLessThan(0.001);
  });

  it('gives the published corrected coordinates to 0.001 ft', () => {
    const { points } = closeTraverse(legs, start);
    COMPASS_TRAVERSE.legs.forEach((leg, i) => {
      expect(Math.abs(points[i + 1]![0] - leg.east)).toBeLessThan(0.0011);
      expect(Math.abs(points[i + 1]![1] - leg.north)).toBeLessThan(0.0011);
    });
  });

  it('leaves a walk that closes as it is', () => {
    const square = [0, 1, 2, 3].map((k) => ({ bearing: (-k * Math.PI) / 2, length: 100 }));
    closeTraverse(square).points.forEach((p, i) => {
      expect(p[0]).toBeCloseTo([0, 100, 100, 0, 0][i]!, 10);
      expect(p[1]).toBeCloseTo([0, 0, -100, -100, 0][i]!, 10);
    });
  });

  it('stays where it is when no leg has a length', () => {
    expect(closeTraverse([{ bearing: 1, length: 0 }]).points).toEqual([
      [0, 0],
      [0, 0],
    ]);
  });
});
