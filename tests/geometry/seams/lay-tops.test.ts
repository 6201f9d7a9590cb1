import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import { layTops } from '@/geometry/seams/lay-tops';
import { JOINT, layout, OPEN, room, run, WALL } from '../../helpers/tops-builder';

const L = layout({
  runs: [run('1', 'A', { left: OPEN, right: JOINT }), run('2', 'B', { left: JOINT, right: WALL })],
  cutouts: [{ id: 'c1', on: '2', kind: 'sink', centre: 60, setback: 2, width: 30, depth: 21, radius: 0.75 }],
});

describe('layTops', () => {
  const tops = layTops(L, room([80, 120, 84], [90, 90]), DEFAULT_SETTINGS);

  it('lays an L with a sink on 96 in slabs as three pieces lettered from P', () => {
    expect(tops.problems).toEqual([]);
    expect(tops.pieces.map((p) => [p.key, p.letter])).toEqual([
      ['1.1', 'P'],
      ['2.1', 'Q'],
      ['2.2', 'R'],
    ]);
  });

  it('puts the seam in the middle of the sink, where 4 in of it show', () => {
    expect(tops.seams).toEqual([
      expect.objectContaining({ on: '2', at: 60, inCutout: 'c1', pinned: false, letters: ['Q', 'R'] }),
    ]);
    expect(tops.seams[0]!.visible).toBeCloseTo(4, 10);
  });

  it('makes the square corner of two 25 in tops 25 x sqrt 2 long, 45 degrees both sides', () => {
    const [joint] = tops.joints;
    expect(joint!.length).toBeCloseTo(25 * Math.SQRT2, 10);
    expect(joint!.angles[0]).toBeCloseTo(45, 10);
    expect(joint!.letters).toEqual(['P', 'Q']);
    expect(joint!.openingPerSd).toBeCloseTo(25 * Math.SQRT2 * 0.1 * (Math.PI / 180), 10);
  });

  it('ends the last piece 1/4 in off wall C and takes the gaps off every edge', () => {
    const [p, q, r] = tops.pieces;
    expect(p!.back).toBeCloseTo(80 - 0.25 + 1, 10);
    expect(p!.front).toBeCloseTo(80 - 0.25 - 25 + 1, 10);
    expect(q!.back).toBeCloseTo(60 - 0.25, 10);
    expect(r!.back).toBeCloseTo(120 - 60 - 0.25, 10);
    expect(r!.right.kind).toBe('wall');
  });
});
