import { applyEdit, type EditDraft } from '@/shared/layout/apply-edit';
import { emptyLayout } from '@/shared/layout/empty-layout';
import { startingShape } from '@/shared/layout/starting-shapes';
import type { Layout } from '@/geometry/core/layout';

let serial = 0;
const withId = (draft: EditDraft) =>
  ({ ...draft, id: `90000000-0000-4000-8000-${String(++serial).padStart(12, '0')}` }) as never;

function apply(layout: Layout, ...drafts: EditDraft[]): Layout {
  return drafts.reduce((now, draft) => {
    const result = applyEdit(now, withId(draft));
    if (!result.ok) throw new Error(result.reason);
    return result.layout;
  }, layout);
}

const read = (value: number) => ({ text: String(value), value });
const base = (id: string, wall: string, from: number, to: number) => ({
  kind: 'addItem' as const,
  section: 'bases' as const,
  item: { id, wall, from, to, kind: 'cabinet' as const, depth: 24, access: 'open' as const },
});

const taped = () =>
  apply(
    emptyLayout(),
    startingShape('U'),
    { kind: 'addReading', wall: 'B', reading: read(120.5) },
    { kind: 'setTriangle', between: ['A', 'B'], triangle: { a: read(36), b: read(48), c: read(60.5) } },
    { kind: 'setTriangle', between: ['B', 'C'], triangle: { a: read(27), b: read(36), c: read(45) } },
    base('b1', 'B', 6, 36),
    base('b2', 'B', 80, 110),
  );

const SPLIT: EditDraft = {
  kind: 'breakWall',
  wall: 'B',
  chain: ['B', 'D'],
  points: [
    [0, -96],
    [0, 0],
    [60, 0],
    [120, 0],
    [120, -96],
  ],
  left: 60,
  right: 60,
};

describe('breaking a wall', () => {
  it('keeps the tape over the whole wall as a cross between its two corners', () => {
    const { room } = apply(taped(), SPLIT);
    expect(room.walls.map((w) => [w.id, w.length.length])).toEqual([
      ['A', 0],
      ['B', 0],
      ['D', 0],
      ['C', 0],
    ]);
    expect(room.ties).toEqual([
      { id: 't1', from: { wall: 'B', at: 0 }, to: { wall: 'D', at: 'end' }, length: read(120.5) },
    ]);
  });

  it('hands both corner checks and the cabinets on to the part they belong to', () => {
    const layout = apply(taped(), SPLIT);
    expect(layout.room.corners.map((c) => [c.between.join('-'), c.triangle?.c.value, c.nominal])).toEqual([
      ['A-B', 60.5, 90],
      ['B-D', undefined, 180],
      ['D-C', 45, 90],
    ]);
    expect(layout.bases.map(({ wall, from, to }) => [wall, from, to])).toEqual([
      ['B', 6, 36],
      ['D', 20, 50],
    ]);
  });

  it('refuses a break through a cabinet, and undoes one exactly', () => {
    const before = taped();
    const through = applyEdit(before, withId({ ...SPLIT, left: 90, right: 90 } as EditDraft));
    expect(through).toEqual({
      ok: false,
      reason: 'The cabinet on this wall stands across the place. Move it first.',
    });
    const done = applyEdit(before, withId(SPLIT));
    if (!done.ok) throw new Error(done.reason);
    expect(apply(done.layout, done.inverse as EditDraft)).toEqual(before);
  });
});

describe('mirroring a room', () => {
  const MIRROR: EditDraft = { kind: 'mirrorRoom', lengths: { A: 96, B: 120.5, C: 84 } };

  it('swaps left and right of walls, marks and cabinets, and keeps every value', () => {
    const layout = apply(taped(), MIRROR);
    expect(layout.room.walls.map((w) => w.id)).toEqual(['C', 'B', 'A']);
    expect(layout.room.corners.map((c) => [c.between.join('-'), c.triangle!.a.value, c.triangle!.b.value])).toEqual([
      ['C-B', 36, 27],
      ['B-A', 48, 36],
    ]);
    expect(layout.bases.map(({ from, to }) => [from, to])).toEqual([
      [84.5, 114.5],
      [10.5, 40.5],
    ]);
  });

  it('done twice gives the room back', () => {
    const before = taped();
    expect(apply(before, MIRROR, MIRROR).room).toEqual(before.room);
  });

  it('is refused once tops are laid', () => {
    const laid = apply(taped(), {
      kind: 'addItem',
      section: 'runs',
      item: {
        id: '1',
        wall: 'B',
        from: 0,
        to: 'end',
        depth: 25,
        backGap: 0.25,
        left: { kind: 'wall', clearance: 0.25 },
        right: { kind: 'wall', clearance: 0.25 },
      },
    });
    expect(applyEdit(laid, withId(MIRROR))).toMatchObject({ ok: false });
  });
});

describe('bending a corner on the sketch', () => {
  it('changes what it was meant to be from 90 to 135, and leaves a 120 that is drawn so', () => {
    const bent = apply(emptyLayout(), startingShape('L'), { kind: 'moveCorner', index: 2, to: [80, 80] });
    expect(bent.room.corners[0]!.nominal).toBe(135);
    const set = apply(
      emptyLayout(),
      startingShape('L'),
      { kind: 'setNominal', between: ['A', 'B'], nominal: 120 },
      { kind: 'moveCorner', index: 2, to: [104, 60] },
    );
    expect(set.room.corners[0]!.nominal).toBe(120);
  });
});
