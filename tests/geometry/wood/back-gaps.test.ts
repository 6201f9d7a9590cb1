import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import { layTops } from '@/geometry/seams/lay-tops';
import { wallFrames } from '@/geometry/top/wall-frame';
import { backGaps } from '@/geometry/wood/back-gaps';
import { layout, room, run } from '@/tests/helpers/tops-builder';

function gapsOf(profile: readonly { at: number; off: number }[], from = 0, to: number | 'end' = 'end') {
  const straight = room([90], []);
  const shape = { ...straight, walls: [{ ...straight.walls[0]!, profile }] };
  const laid = layTops(layout({ runs: [run('1', 'A', { from, to })] }), shape, DEFAULT_SETTINGS).runs[0]!;
  return backGaps(laid, 0.25, wallFrames(shape).byId.get('A')!);
}

describe('backGaps', () => {
  it('is the back gap all along a straight wall', () => {
    expect(gapsOf([])).toMatchObject({ least: 0.25, most: 0.25 });
  });

  it('is the back gap at a bump of 1/4 and 1/2 in where the wall is straight', () => {
    const gaps = gapsOf([
      { at: 0, off: 0 },
      { at: 40, off: -0.25 },
      { at: 80, off: 0 },
    ]);
    expect(gaps.least).toBeCloseTo(0.25, 9);
    expect(gaps.most).toBeCloseTo(0.5, 9);
  });

  it('is widest in the deepest hollow and says where', () => {
    const gaps = gapsOf([
      { at: 0, off: 0 },
      { at: 30, off: 0.375 },
      { at: 80, off: -0.125 },
    ]);
    expect(gaps.most).toBeCloseTo(0.25 + 0.125 + 0.375, 9);
    expect(gaps.mostAt).toBe(30);
  });

  it('leaves out what lies beside the run', () => {
    const gaps = gapsOf(
      [
        { at: 0, off: 0 },
        { at: 10, off: 1 },
        { at: 20, off: 0 },
        { at: 90, off: 0 },
      ],
      20,
    );
    expect(gaps.most).toBeCloseTo(0.25, 9);
  });
});
