import type { Layout } from '@/geometry/core/layout';
import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import { layTops } from '@/geometry/seams/lay-tops';
import { boxPairs } from '@/geometry/top/box-pairs';
import { lengthInside, overlapDepth } from '@/geometry/top/overlap';
import { JOINT, layout, room, run } from '../../helpers/tops-builder';

const problems = (more: Partial<Layout>, lengths: readonly number[], angles: readonly number[]) =>
  layTops(layout(more), room(lengths, angles), DEFAULT_SETTINGS).problems.map((problem) => problem.message);

describe('checkDecks', () => {
  it('names two tops that lie on each other, and how far', () => {
    const galley = [run('1', 'A'), run('2', 'C')];
    expect(problems({ runs: galley }, [90, 60, 90], [90, 90])).toEqual([]);
    expect(problems({ runs: galley }, [90, 45, 90], [90, 90])).toEqual([
      'Run 1 and run 2 lie on each other by 5 1/2 in.',
    ]);
    expect(problems({ runs: [run('1', 'A', { to: 50 }), run('2', 'A', { from: 48 })] }, [90], [])).toEqual([
      'Run 1 and run 2 lie on each other by 2 in.',
    ]);
    const islands = [{ id: 'I', length: 60, depth: 30, at: [10, -50] as const }];
    expect(problems({ runs: [run('1', 'A')], islands }, [90], [])).toEqual([
      'Run 1 and island I lie on each other by 5 1/4 in.',
    ]);
  });

  it('names the wall that an overhang runs into', () => {
    const into = run('1', 'A', { right: { kind: 'open', overhang: 1, radius: 0 } });
    expect(problems({ runs: [into] }, [60, 60], [90])).toEqual(['Run 1 lies across 25 in of wall B.']);
  });

  it('misses the rest of a face where a through run is too short', () => {
    const joints: Layout['joints'] = [{ between: ['1', '2'], kind: 'butt', through: '1', assembled: 'shop' }];
    const runs = [run('1', 'A', { right: JOINT, from: 40 }), run('2', 'B', { left: JOINT })];
    expect(problems({ runs, joints }, [60, 60], [90])).toEqual([
      'Run 1 is 5 1/4 in too short to stand against the whole end of run 2.',
    ]);
  });

  it('says where a seam is pinned on a top that is not there', () => {
    expect(problems({ runs: [run('1', 'A')], seams: [{ on: '7', at: 20 }] }, [60], [])).toEqual([
      'A seam is pinned on top 7, which is not laid.',
    ]);
  });
});

describe('overlapDepth', () => {
  const box = (x: number, y: number, w: number, h: number) =>
    [
      [x, y],
      [x + w, y],
      [x + w, y + h],
      [x, y + h],
    ] as const;

  it('is the least shift that parts two outlines, 0 when they touch', () => {
    expect(overlapDepth(box(0, 0, 10, 10), box(8, 3, 10, 10))).toBeCloseTo(2, 12);
    expect(overlapDepth(box(0, 0, 10, 10), box(10, 0, 10, 10))).toBe(0);
    expect(
      overlapDepth(box(0, 0, 10, 10), [
        [20, 5],
        [30, 5],
        [25, 9],
      ]),
    ).toBe(0);
  });

  it('stands in for an outline with a hollow by the root of the shared area', () => {
    const hollow = [
      [0, 0],
      [10, 0],
      [10, 10],
      [6, 10],
      [6, 4],
      [0, 4],
    ] as const;
    expect(overlapDepth(hollow, box(0, 5, 5, 5))).toBe(0);
    expect(overlapDepth(hollow, box(4, 4, 4, 4))).toBeCloseTo(Math.sqrt(2 * 4), 12);
  });

  it('measures the part of a line inside an outline, its margin left out', () => {
    expect(lengthInside(box(0, 0, 10, 10), [-5, 5], [20, 5], 0)).toBeCloseTo(10, 12);
    expect(lengthInside(box(0, 0, 10, 10), [-5, 5], [20, 5], 1)).toBeCloseTo(8, 12);
    expect(lengthInside(box(0, 0, 10, 10), [-5, 10], [20, 10], 0.01)).toBe(0);
    expect(lengthInside(box(0, 0, 10, 10), [4, 4], [6, 6], 0)).toBeCloseTo(2 * Math.SQRT2, 12);
  });
});

describe('boxPairs', () => {
  it('finds each overlapping pair once, whichever way the list runs', () => {
    const at = (minX: number, minY: number) => ({ minX, minY, maxX: minX + 10, maxY: minY + 10 });
    const boxes = [at(30, 0), at(0, 0), at(5, 5), at(9, -9.5), at(36, 20)];
    expect([...boxPairs(boxes)].sort()).toEqual([
      [1, 2],
      [1, 3],
    ]);
  });
});
