import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import { layTops } from '@/geometry/seams/lay-tops';
import { assembledSections, spanOf } from '@/geometry/wood/sections';
import { JOINT, layout, room, run } from '@/tests/helpers/tops-builder';

const u = (assembled: readonly ['shop' | 'site', 'shop' | 'site']) =>
  layTops(
    layout({
      runs: [
        run('1', 'A', { right: JOINT }),
        run('2', 'B', { left: JOINT, right: JOINT }),
        run('3', 'C', { left: JOINT }),
      ],
      joints: [
        { between: ['1', '2'], kind: 'miter', assembled: assembled[0] },
        { between: ['2', '3'], kind: 'miter', assembled: assembled[1] },
      ],
    }),
    room([80, 90, 80], [90, 90]),
    DEFAULT_SETTINGS,
  );

describe('assembledSections', () => {
  it('carries a U glued in the shop as one, and each piece alone when nothing is', () => {
    expect(assembledSections(u(['shop', 'shop']))).toEqual([['P', 'Q', 'R']]);
    expect(assembledSections(u(['site', 'site']))).toEqual([['P'], ['Q'], ['R']]);
  });

  it('parts it at the joint that is closed on site', () => {
    expect(assembledSections(u(['shop', 'site']))).toEqual([['P', 'Q'], ['R']]);
    expect(assembledSections(u(['site', 'shop']))).toEqual([['P'], ['Q', 'R']]);
  });
});

describe('spanOf', () => {
  it('is the longest straight measure between corners of all pieces', () => {
    const square = {
      outline: [
        [0, 0],
        [30, 0],
        [30, 40],
        [0, 40],
      ] as const,
    };
    expect(spanOf([square])).toBe(50);
    expect(spanOf([])).toBe(0);
  });
});
