import type { Base, Cutout } from '@/geometry/core/layout';
import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import { layTops } from '@/geometry/seams/lay-tops';
import { wallFrames } from '@/geometry/top/wall-frame';
import { edgeGap, fastenerInRoom, fastenersOfTops } from '@/geometry/wood/fasteners';
import { layout, room, run } from '@/tests/helpers/tops-builder';

const SCREWS = DEFAULT_SETTINGS.screws;
const SLOT = 9 / 16;

const cabinet = (id: string, from: number, to: number, kind: Base['kind'] = 'cabinet'): Base => ({
  id,
  wall: 'A',
  from,
  to,
  kind,
  depth: 24,
  access: 'open',
});

const sink: Cutout = { id: 'c1', on: '1', kind: 'sink', centre: 45, setback: 2, width: 30, depth: 21, radius: 0.75 };

function fastenersFor(bases: readonly Base[], cutouts: readonly Cutout[] = [], length = 90) {
  const shape = room([length], []);
  const tops = layTops(
    layout({ runs: [run('1', 'A')], cutouts: [...cutouts], bases: [...bases] }),
    shape,
    DEFAULT_SETTINGS,
  );
  const walls = [...wallFrames(shape).byId.values()];
  return { tops, fasteners: fastenersOfTops(tops, bases, walls, SCREWS, SLOT) };
}

describe('fastenersOfTops', () => {
  it('fixes the front line 2 1/2 in behind the front edge and slots the line 1 1/2 in before the back', () => {
    const { fasteners } = fastenersFor([cabinet('b1', 0, 30)]);
    const front = fasteners.filter((f) => f.row === 'front');
    const back = fasteners.filter((f) => f.row === 'back');
    expect(new Set(front.map((f) => f.y))).toEqual(new Set([2.5]));
    expect(new Set(back.map((f) => f.y))).toEqual(new Set([23.5]));
    expect(front.every((f) => f.slot === SCREWS.shank)).toBe(true);
    expect(back.every((f) => f.slot === SLOT)).toBe(true);
  });

  it('puts one at either side of a cabinet and more between, at most 16 in apart', () => {
    const { fasteners } = fastenersFor([cabinet('b1', 0, 30), cabinet('b2', 30, 48)]);
    const front = fasteners.filter((f) => f.row === 'front');
    expect(front.filter((f) => f.base === 'b1').map((f) => f.x)).toEqual([1.5, 15, 28.5]);
    expect(front.filter((f) => f.base === 'b2').map((f) => f.x)).toEqual([31.5, 46.5]);
  });

  it('leaves a dishwasher and an opening without any', () => {
    const { fasteners } = fastenersFor([
      cabinet('b1', 0, 30),
      cabinet('d', 30, 54, 'dishwasher'),
      cabinet('b2', 54, 90),
    ]);
    expect(fasteners.some((f) => f.x > 30 && f.x < 54)).toBe(false);
    expect(new Set(fasteners.map((f) => f.base))).toEqual(new Set(['b1', 'b2']));
  });

  it('drills none into a sink cutout or within 1 1/2 in of it', () => {
    const { tops, fasteners } = fastenersFor([cabinet('b1', 0, 90)], [sink]);
    const cutouts = tops.pieces[0]!.cutouts;
    expect(cutouts).toHaveLength(1);
    expect(fasteners.length).toBeGreaterThan(4);
    for (const { x, y } of fasteners) expect(edgeGap(cutouts[0]!.outline, [x, y])).toBeGreaterThanOrEqual(1.5 - 1e-9);
  });

  it('carries a top with no base drawn along its whole length', () => {
    const { fasteners } = fastenersFor([], [], 40);
    expect(fasteners.filter((f) => f.row === 'front').map((f) => f.x)).toEqual([1.5, 1.5 + 37 / 3, 1.5 + 74 / 3, 38.5]);
  });

  it('keeps clear of a seam, and of the joint of a corner', () => {
    const shape = room([100, 90], [90]);
    const tops = layTops(
      layout({
        runs: [run('1', 'A', { right: { kind: 'joint' } }), run('2', 'B', { left: { kind: 'joint' } })],
        joints: [{ between: ['1', '2'], kind: 'miter', assembled: 'shop' }],
      }),
      shape,
      DEFAULT_SETTINGS,
    );
    const all = fastenersOfTops(tops, [], [...wallFrames(shape).byId.values()], SCREWS, SLOT);
    expect(all.length).toBeGreaterThan(8);
    for (const fastener of all) {
      const piece = tops.pieces.find((p) => p.letter === fastener.letter)!;
      expect(edgeGap(piece.shape, [fastener.x, fastener.y])).toBeGreaterThanOrEqual(1.5 - 1e-9);
    }
  });

  it('lies in the room where its piece lies', () => {
    const { tops, fasteners } = fastenersFor([cabinet('b1', 0, 30)]);
    const first = fasteners.find((f) => f.row === 'back')!;
    // Wall A runs along y = 0 and the room lies below it: back edge 1/4 in out, screws 1 1/2 in before it.
    const [x, y] = fastenerInRoom(tops.pieces[0]!, first);
    expect(x).toBeCloseTo(1.5, 9);
    expect(y).toBeCloseTo(-0.25 - 1.5, 9);
  });
});
