import type { Point } from '@/geometry/core/point';
import { scale } from '@/geometry/core/vector';
import { topsMove } from '@/components/tops/use-tops-drag';
import { snapTo } from '@/components/tops/tops-targets';
import { after, planOf, scullery, startOf } from './tops-job';

/** So far along the long run on the drawing, and a little across it, which must not count. */
function along(from: ReturnType<typeof startOf>, inches: number): Point {
  const { direction } = from.drawn.tops.runs.find((run) => run.id === '2')!.back;
  const [x, y] = scale(direction, inches);
  return [x - direction[1] * 3, y + direction[0] * 3];
}

describe('a sink dragged along its base', () => {
  it('goes as far as the finger along the run, to a sixteenth', () => {
    const from = startOf(scullery());
    const move = topsMove(from, 'cutout c1', along(from, 5.03), true)!;
    expect(move.edit).toMatchObject({ section: 'cutouts', item: 'c1', change: { centre: 80 } });
    expect(move.label).toBe('sink at 80 in');
    expect(move.rest).toBeUndefined();
  });

  it('comes to rest at the middle of a base when it is near: the sink base goes from 57 to 93', () => {
    const from = startOf(
      after(scullery(), { kind: 'changeItem', section: 'cutouts', item: 'c1', change: { centre: 70 } }),
    );
    const move = topsMove(from, 'cutout c1', along(from, 4.4), true)!;
    expect(move.edit).toMatchObject({ change: { centre: 75 } });
    expect(move.rest).toBe(75);
  });

  it('takes its strips and its seam along: the seam keeps to the middle, 8 in of it seen', () => {
    const moved = topsMove(startOf(scullery()), 'cutout c1', along(startOf(scullery()), -3), true)!;
    const plan = planOf(after(scullery(), moved.edit));
    expect(plan.seams[0]).toMatchObject({ at: 72, visible: 8, inCutout: 'c1' });
    expect([plan.cutouts[0]!.frontStrip, plan.cutouts[0]!.backStrip]).toEqual([3, 5]);
  });

  it('is nudged a whole step by a key along the run, and not at all by one across it', () => {
    const from = startOf(scullery());
    const { direction } = from.drawn.tops.runs.find((run) => run.id === '2')!.back;
    // The run lies along the screen but for a degree.
    expect(topsMove(from, 'cutout c1', [Math.sign(direction[0]) / 16, 0], false)!.edit).toMatchObject({
      change: { centre: 75 + 1 / 16 },
    });
    expect(topsMove(from, 'cutout c1', [0, 1 / 16], false)).toBeNull();
  });
});

describe('a seam', () => {
  it('is pinned by the first drag and its pin moved by the next', () => {
    const first = topsMove(startOf(scullery()), 'seam Q-R', along(startOf(scullery()), -6.3), true)!;
    expect(first.edit).toEqual({ kind: 'pinSeam', on: '2', at: 68.6875 });
    const pinned = after(scullery(), first.edit);
    const start = startOf(pinned);
    const next = topsMove(start, 'seam Q-R', along(start, 6.2), true)!;
    // 74 7/8 is near the sink's middle: there it comes to rest.
    expect(next.edit).toEqual({ kind: 'moveSeam', on: '2', from: 68.6875, at: 75 });
    expect(next.rest).toBe(75);
  });

  it('never goes past the left end of its wall', () => {
    const from = startOf(scullery());
    expect(topsMove(from, 'seam Q-R', along(from, -400), true)!.edit).toMatchObject({ at: 0 });
  });
});

describe('an island', () => {
  it('goes where the finger goes, in room axes, to a sixteenth', () => {
    const island = { id: 'I1', length: 60, depth: 30, at: [40, -60] as Point, bearing: 0 };
    const from = startOf(after(scullery(), { kind: 'addItem', section: 'islands', item: island }));
    const letter = from.plan.pieces.find((piece) => piece.on === 'I1')!.letter;
    const by: Point = [7, -4];
    const move = topsMove(from, `piece ${letter}`, by, true)!;
    const [x, y] = (move.edit as unknown as { change: { at: Point } }).change.at;
    const [cos, sin] = [Math.cos(from.turn), Math.sin(from.turn)];
    expect(Math.abs(x - (40 + by[0] * cos + by[1] * sin))).toBeLessThanOrEqual(1 / 32);
    expect(Math.abs(y - (-60 - by[0] * sin + by[1] * cos))).toBeLessThanOrEqual(1 / 32);
    expect(x * 16).toBe(Math.round(x * 16));
  });

  it('alone moves; a run stays at its wall', () => {
    expect(topsMove(startOf(scullery()), 'piece P', [5, 5], true)).toBeNull();
    expect(topsMove(startOf(scullery()), 'joint 1-2', [5, 5], true)).toBeNull();
  });
});

describe('snapTo', () => {
  it('takes the nearest place within 3/4 in, else the nearest sixteenth', () => {
    expect(snapTo(74.4, [75, 74])).toBe(74);
    expect(snapTo(74.24, [75])).toBe(74.25);
    expect(snapTo(74.26, [75])).toBe(75);
  });
});
