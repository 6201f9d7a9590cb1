import { layRuns } from '@/geometry/top/lay-runs';
import { scribeRun } from '@/geometry/top/scribe';
import { highestBump, offsetAt } from '@/geometry/room/profile';
import { layout, room, run } from '../../helpers/tops-builder';

const profile = [
  { at: 0, off: 0 },
  { at: 30, off: -0.25 },
  { at: 60, off: 0.5 },
  { at: 96, off: 0 },
];

describe('wall profile', () => {
  it('is straight between stations and level past the outer ones', () => {
    expect(offsetAt(profile, 15)).toBe(-0.125);
    expect(offsetAt(profile, 45)).toBe(0.125);
    expect(offsetAt([{ at: 10, off: 0.25 }], 80)).toBe(0.25);
    expect(offsetAt([], 5)).toBe(0);
  });

  it('finds the highest bump on either side of the wall line', () => {
    expect(highestBump(profile, 0, 96)).toBe(0.25);
    expect(highestBump(profile, 45, 96)).toBe(0);
    expect(highestBump(profile, 0, 15)).toBe(0.125);
    expect(highestBump(profile, 0, 96, 'back')).toBe(0.5);
    expect(highestBump([...profile].reverse(), 0, 96)).toBe(0.25);
  });
});

describe('scribeRun', () => {
  const bowed = room([96], []);
  const at = { ...bowed, walls: [{ ...bowed.walls[0]!, profile }] };
  const own = run('1', 'A');
  const laid = layRuns(layout({ runs: [own] }), at);
  const wall = laid.walls.byId.get('A')!;

  it('gives the gap at every station: back gap at the bump, 1 in in the hollow', () => {
    const scribe = scribeRun(own, laid.runs[0]!, wall, 1);
    expect(scribe.stations.map(({ at: where, gap }) => [where, gap])).toEqual([
      [0, 0.5],
      [30, 0.25],
      [60, 1],
      [96, 0.5],
    ]);
    expect(scribe).toMatchObject({ largestGap: 1, covered: true, shift: 0, takeOff: 0, depthLeft: 25 });
  });

  it('moves the top back 1/2 in for a 1/2 in backsplash and takes 1/2 in off at the bump', () => {
    const scribe = scribeRun(own, laid.runs[0]!, wall, 0.5);
    expect(scribe).toMatchObject({ largestGap: 1, covered: false, shift: 0.5, takeOff: 0.5, depthLeft: 24.5 });
    // Nowhere is a gap left that the backsplash does not cover, nor less than the back gap to move in.
    for (const { gap, takeOff } of scribe.stations) {
      const left = gap - scribe.shift + takeOff;
      expect(left).toBeGreaterThanOrEqual(0.25 - 1e-12);
      expect(left).toBeLessThanOrEqual(0.5 + 1e-12);
    }
    // The scribe line starts where the moved gap falls below 1/4 in: between 30 and 60 that is at 50 in.
    expect(scribe.stations.map((station) => [station.at, station.takeOff])).toEqual([
      [0, 0.25],
      [30, 0.5],
      [50, 0],
      [60, 0],
      [78, expect.closeTo(0, 12)],
      [96, 0.25],
    ]);
  });

  it('brings the gap down to the back gap where there is no backsplash', () => {
    expect(scribeRun(own, laid.runs[0]!, wall, 0)).toMatchObject({ shift: 0.75, takeOff: 0.75, depthLeft: 24.25 });
  });
});
