import type { Layout } from '@/geometry/core/layout';
import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import { layTops } from '@/geometry/seams/lay-tops';
import { seamAlternatives } from '@/geometry/seams/seam-alternatives';
import { layout, room, run } from '../../helpers/tops-builder';

const job = (more: Partial<Layout> = {}) =>
  layout({
    runs: [run('1', 'A')],
    cutouts: [{ id: 'c1', on: '1', kind: 'sink', centre: 60, setback: 2, width: 30, depth: 21, radius: 0.75 }],
    ...more,
  });
const sets = (length: number, more: Partial<Layout> = {}) =>
  seamAlternatives(job(more), room([length], []), DEFAULT_SETTINGS);

describe('seamAlternatives', () => {
  it('lists first what layTops does by itself', () => {
    for (const length of [120, 150, 230]) {
      const [best] = sets(length);
      const tops = layTops(job(), room([length], []), DEFAULT_SETTINGS);
      expect(best!.best).toBe(true);
      expect(best!.at).toEqual(tops.seams.map((seam) => seam.at));
      expect(best!.visible).toBeCloseTo(
        tops.seams.reduce((sum, seam) => sum + seam.visible, 0),
        10,
      );
      expect(best!.pieces.map((piece) => piece.key)).toEqual(tops.pieces.map((piece) => piece.key));
    }
  });

  it('offers a piece that just fits a shorter slab', () => {
    const stock = layout().stock;
    const slabs = [...stock.slabs, { id: 'S72', length: 72, depth: 25, price: 27000, count: null }];
    const fitting = sets(120, { stock: { ...stock, slabs }, cutouts: [] }).flatMap((set) =>
      set.pieces.map((piece) => piece.back),
    );
    expect(fitting.some((length) => Math.abs(length - 71) < 1e-9)).toBe(true);
  });

  it('keeps every piece within the longest slab and lists up to eight sets, none twice', () => {
    const list = sets(250);
    expect(list.length).toBeGreaterThan(3);
    expect(list.length).toBeLessThanOrEqual(8);
    for (const set of list) for (const piece of set.pieces) expect(piece.back).toBeLessThanOrEqual(95 + 1e-6);
    expect(new Set(list.map((set) => set.at.join(' '))).size).toBe(list.length);
    expect(list.filter((set) => set.best)).toHaveLength(1);
  });

  it('moves no pinned seam, and lists nothing where all are pinned or none is needed', () => {
    const pinned = sets(200, { seams: [{ on: '1', at: 60 }] });
    expect(pinned.every((set) => set.at.includes(60))).toBe(true);
    expect(pinned.length).toBeGreaterThan(1);
    expect(sets(120, { seams: [{ on: '1', at: 60 }] })).toEqual([]);
    expect(sets(90)).toEqual([]);
  });
});
