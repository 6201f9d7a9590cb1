import type { Island } from '@/geometry/core/layout';
import { findingsOf } from '@/geometry/findings/catalogue';
import { kitchen } from './kitchen';

/** Maple 1 1/2 in thick, mixed staves: 8.18 in across the grain and 32 in along it are within overhang / 180. */
const found = (hangs: Island['hangs']) =>
  findingsOf(kitchen({ layout: { islands: [{ id: 'I', length: 72, depth: 36, at: [20, -80], hangs }] } }))
    .filter(({ code, at }) => code === 'overhang-unsupported' && at.run === 'I')
    .map(({ at, text }) => ({ side: at.detail, text }));

describe('overhang of an island', () => {
  it('is looked at on the side where people sit', () => {
    const [one, ...more] = found({ back: 12 });
    expect(more).toEqual([]);
    expect(one!.side).toBe('back');
    expect(one!.text).toMatch(/^The island \(.+\) hangs 12 in past the cabinets at the back, across the grain/);
  });

  it('holds just inside the limit, across and along the grain', () => {
    expect(found({ front: 8.1, back: 8.1, left: 31.9, right: 31.9 })).toEqual([]);
    expect(found({ front: 8.3, back: 8.3, left: 32.2, right: 32.2 }).map(({ side }) => side)).toEqual([
      'front',
      'back',
      'left',
      'right',
    ]);
  });

  it('is carried to the edge where nothing was typed', () => {
    expect(found(undefined)).toEqual([]);
  });
});
