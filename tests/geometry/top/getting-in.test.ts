import type { SiteAccess } from '@/geometry/core/layout';
import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import { layTops } from '@/geometry/seams/lay-tops';
import { gettingIn } from '@/geometry/top/getting-in';
import { slideBack } from '@/geometry/top/slide-back';
import { wallFrames } from '@/geometry/top/wall-frame';
import { JOINT, layout, room, run, WALL } from '../../helpers/tops-builder';

const access: SiteAccess = { doorWidth: 32, doorHeight: 80, corridor: null, clearLength: null, crew: 2 };
const straight = layTops(layout({ runs: [run('1', 'A')] }), room([94], []), DEFAULT_SETTINGS).pieces;
const ell = layTops(
  layout({ runs: [run('1', 'A', { right: JOINT }), run('2', 'B', { left: JOINT })] }),
  room([90, 90], [90]),
  DEFAULT_SETTINGS,
).pieces;

describe('gettingIn', () => {
  it('carries a straight 94 by 25 in top flat or on edge through a 32 by 80 in door', () => {
    expect(gettingIn(straight, access, '1/16')).toMatchObject({ flat: true, onEdge: true, tips: true, obstacle: null });
  });

  it('turns it on edge round a corridor of 36 and 36 in, where flat only 51.3 in would go round', () => {
    const way = gettingIn(straight, { ...access, corridor: [36, 36] }, '1/16');
    expect(way).toMatchObject({ flat: false, onEdge: true, obstacle: null });
  });

  it('tips it over its end: sqrt(94^2 + 1.5^2) against the clear length', () => {
    const way = gettingIn(straight, { ...access, clearLength: 94 }, '1/16');
    expect(way.tippedLength).toBeCloseTo(Math.sqrt(94 ** 2 + 1.5 ** 2), 12);
    expect(way).toMatchObject({ tips: false, obstacle: '94 in over its end, and the clear length is 94 in' });
    expect(gettingIn(straight, { ...access, clearLength: 94.05 }, '1/16').obstacle).toBeNull();
  });

  it('says how wide an L of 90 in legs is at least, and what the door lets through', () => {
    const way = gettingIn(ell, access, '1/16');
    // From the outer corner square to the line over both tips: (89.75 + 25) / sqrt 2.
    expect(way.width).toBeCloseTo((89.75 + 25) / Math.SQRT2, 9);
    expect(way.obstacle).toBe('81 1/8 in wide at least, and the door is 32 in by 80 in');
    expect(gettingIn(ell, { ...access, doorHeight: 82 }, '1/16').obstacle).toBeNull();
  });

  it('names the corridor that a long section cannot turn in', () => {
    const way = gettingIn(straight, { ...access, corridor: [30, 34] }, '1/16');
    expect(way.obstacle).toBe('94 in long, too much to turn from a corridor of 30 in into one of 34 in');
  });
});

describe('slideBack', () => {
  const between = (left: number, right: number) => {
    const at = room([60, 100, 60], [left, right]);
    const tops = layTops(layout({ runs: [run('1', 'B', { left: WALL, right: WALL })] }), at, DEFAULT_SETTINGS);
    return slideBack(tops.runs[0]!, wallFrames(at));
  };

  it('slides between parallel walls and between walls that open towards the room', () => {
    expect(between(90, 90)).toEqual({ run: '1', slides: true, short: 0 });
    expect(between(92, 91)!.slides).toBe(true);
    expect(between(88, 92)!.slides).toBe(true);
  });

  it('has to be lowered in where the walls close: 60 in of 88 degrees both sides, less 1/2 in of clearance', () => {
    const way = between(88, 88)!;
    const rad = (88 * Math.PI) / 180;
    expect(way.slides).toBe(false);
    expect(way.short).toBeCloseTo((2 * 60 * Math.sin(rad)) / Math.tan(rad) - 0.5 / Math.sin(rad), 9);
  });

  it('says nothing of a run with an open end', () => {
    const at = room([60, 100], [88]);
    const tops = layTops(layout({ runs: [run('1', 'B', { left: WALL })] }), at, DEFAULT_SETTINGS);
    expect(slideBack(tops.runs[0]!, wallFrames(at))).toBeNull();
  });
});
