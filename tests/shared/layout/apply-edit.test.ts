import fc from 'fast-check';

import { applyEdit, applyEdits, editSchema, type Edit, type EditDraft } from '@/shared/layout/apply-edit';
import { emptyLayout } from '@/shared/layout/empty-layout';
import { layoutSchema } from '@/shared/layout/layout-schema';
import type { Layout } from '@/geometry/core/layout';

let serial = 0;
const withId = (draft: EditDraft): Edit =>
  ({ ...draft, id: `00000000-0000-4000-8000-${String(++serial).padStart(12, '0')}` }) as Edit;

const reading = (value: number) => ({ text: String(value), value });

const U_ROOM: EditDraft = {
  kind: 'traceRoom',
  walls: ['A', 'B', 'C'],
  points: [
    [0, 0],
    [0, 96],
    [118, 96],
    [118, 12],
  ],
  closed: false,
};

const RUN = {
  id: '1',
  wall: 'A',
  from: 0,
  to: 'end',
  depth: 25,
  backGap: 0.25,
  left: { kind: 'open', overhang: 1, radius: 1 },
  right: { kind: 'joint' },
} as const;

function apply(layout: Layout, ...drafts: EditDraft[]): Layout {
  return drafts.reduce((now, draft) => {
    const result = applyEdit(now, withId(draft));
    if (!result.ok) throw new Error(result.reason);
    return result.layout;
  }, layout);
}

describe('applyEdit', () => {
  it('traces three walls with the two corners between them, both sketched at 90', () => {
    const layout = apply(emptyLayout(), U_ROOM);
    expect(layout.room.walls.map((w) => w.id)).toEqual(['A', 'B', 'C']);
    expect(layout.room.corners).toEqual([
      { between: ['A', 'B'], nominal: 90 },
      { between: ['B', 'C'], nominal: 90 },
    ]);
  });

  it('keeps the text typed beside its value, and a second tape beside the first', () => {
    const layout = apply(
      emptyLayout(),
      U_ROOM,
      { kind: 'addReading', wall: 'A', reading: { text: "8' 1/4", value: 96.25 } },
      { kind: 'addReading', wall: 'A', reading: { text: '96 3/16', value: 96.1875 } },
    );
    expect(layout.room.walls[0]!.length.map((r) => r.text)).toEqual(["8' 1/4", '96 3/16']);
  });

  it('keeps readings of walls that stay when the room is traced again', () => {
    const layout = apply(emptyLayout(), U_ROOM, { kind: 'addReading', wall: 'B', reading: reading(118.625) }, {
      ...U_ROOM,
      walls: ['A', 'B'],
      points: [
        [0, 0],
        [0, 96],
        [118, 96],
      ],
    } as EditDraft);
    expect(layout.room.walls[1]!.length[0]!.value).toBe(118.625);
    expect(layout.room.corners).toHaveLength(1);
  });

  it('refuses a reading of a wall that is gone, with a sentence', () => {
    const result = applyEdit(emptyLayout(), withId({ kind: 'addReading', wall: 'Z', reading: reading(10) }));
    expect(result).toEqual({ ok: false, reason: 'The wall this belongs to is gone.' });
  });

  it('takes cutouts, seams and joints away with their run, and the inverse brings all of it back', () => {
    const before = apply(
      emptyLayout(),
      U_ROOM,
      { kind: 'addItem', section: 'runs', item: RUN },
      { kind: 'addItem', section: 'runs', item: { ...RUN, id: '2', wall: 'B', left: { kind: 'joint' } } },
      { kind: 'pinSeam', on: '2', at: 60 },
      { kind: 'setJoint', joint: { between: ['1', '2'], kind: 'butt', through: '2', assembled: 'shop' } },
    );
    const removed = applyEdit(before, withId({ kind: 'removeItem', section: 'runs', item: '2' }));
    if (!removed.ok) throw new Error(removed.reason);
    expect(removed.layout.seams).toEqual([]);
    expect(removed.layout.joints).toEqual([]);
    expect(apply(removed.layout, removed.inverse)).toEqual(before);
  });

  it('refuses a value that does not fit, naming the field, and changes nothing', () => {
    const before = apply(emptyLayout(), U_ROOM, { kind: 'addItem', section: 'runs', item: RUN });
    const result = applyEdit(
      before,
      withId({ kind: 'changeItem', section: 'runs', item: '1', change: { depth: -3 } } as EditDraft),
    );
    expect(result.ok).toBe(false);
    if (!result.ok) expect(result.reason).toMatch(/run cannot take this value: depth/);
  });

  it('undoes one person’s edit and keeps another person’s later edit of another wall', () => {
    const start = apply(emptyLayout(), U_ROOM);
    const mine = applyEdit(start, withId({ kind: 'addReading', wall: 'A', reading: reading(96.25) }));
    if (!mine.ok) throw new Error(mine.reason);
    const theirs = apply(mine.layout, { kind: 'addReading', wall: 'C', reading: reading(84) });
    const undone = apply(theirs, mine.inverse);
    expect(undone.room.walls.map((w) => w.length.length)).toEqual([0, 0, 1]);
  });

  it('refuses an undo where somebody changed the same wall since', () => {
    const start = apply(emptyLayout(), U_ROOM);
    const mine = applyEdit(start, withId({ kind: 'addReading', wall: 'A', reading: reading(96.25) }));
    if (!mine.ok) throw new Error(mine.reason);
    const theirs = apply(mine.layout, { kind: 'replaceReading', wall: 'A', index: 0, reading: reading(97) });
    const undone = applyEdit(theirs, withId(mine.inverse));
    expect(undone).toEqual({ ok: false, reason: 'It was changed again since.' });
  });

  it('applies what still fits of a batch and gives the rest back with its values', () => {
    const lost = withId({ kind: 'addReading', wall: 'Q', reading: reading(12) });
    const { applied, refused, layout } = applyEdits(emptyLayout(), [withId(U_ROOM), lost]);
    expect(applied).toHaveLength(1);
    expect(refused[0]!.edit).toBe(lost);
    expect(layout.room.walls).toHaveLength(3);
  });
});

const length = fc.integer({ min: 16, max: 4000 }).map((n) => n / 16);
const wall = fc.constantFrom('A', 'B', 'C', 'D');
const anyEdit: fc.Arbitrary<EditDraft> = fc.oneof(
  fc.record({ kind: fc.constant('addReading' as const), wall, reading: length.map(reading) }),
  fc.record({ kind: fc.constant('removeReading' as const), wall, index: fc.nat(2) }),
  fc.record({ kind: fc.constant('removeWall' as const), wall }),
  fc.record({
    kind: fc.constant('addWall' as const),
    wall: fc.constantFrom('D', 'E'),
    end: fc.constantFrom('left' as const, 'right' as const),
    to: fc.tuple(length, length),
  }),
  fc.record({ kind: fc.constant('splitWall' as const), wall, newWall: wall, at: fc.tuple(length, length) }),
  fc.record({ kind: fc.constant('closeRing' as const), closed: fc.boolean() }),
  fc.record({
    kind: fc.constant('setAngle' as const),
    between: fc.constantFrom(['A', 'B'] as [string, string], ['B', 'C'] as [string, string]),
    angle: fc.integer({ min: 60, max: 300 }),
  }),
  fc.record({ kind: fc.constant('moveCorner' as const), index: fc.nat(4), to: fc.tuple(length, length) }),
  fc.record({
    kind: fc.constant('addItem' as const),
    section: fc.constant('runs' as const),
    item: fc.constantFrom('1', '2', '3').map((id) => ({ ...RUN, id })),
  }),
  fc.record({
    kind: fc.constant('removeItem' as const),
    section: fc.constant('runs' as const),
    item: fc.constantFrom('1', '2', '3'),
  }),
  fc.record({ kind: fc.constant('pinSeam' as const), on: fc.constantFrom('1', '2'), at: length.map((n) => n / 4) }),
  fc.record({
    kind: fc.constant('markReading' as const),
    observation: fc.constantFrom('wall A', 'tie t1'),
    mark: fc.constantFrom('trust' as const, 'ignore' as const, null),
  }),
  fc.record({ kind: fc.constant('setMaterial' as const), value: fc.record({ thickness: length.map((n) => n / 100) }) }),
  fc.record({ kind: fc.constant('keepLetters' as const), value: fc.constant({ '1.1': 'P' }) }),
);

describe('edits in any order', () => {
  it('keep the layout valid, and undone backwards give the first one back (2,000 edits)', () => {
    let undone = 0;
    fc.assert(
      fc.property(fc.array(anyEdit, { minLength: 10, maxLength: 10 }), (drafts) => {
        const start = apply(emptyLayout(), U_ROOM);
        let now = start;
        const inverses: EditDraft[] = [];
        for (const draft of drafts) {
          const edit = withId(draft);
          expect(editSchema.safeParse(edit).success).toBe(true);
          const result = applyEdit(now, edit);
          if (!result.ok) continue;
          now = result.layout;
          inverses.push(result.inverse as EditDraft);
        }
        expect(layoutSchema.safeParse(now).success).toBe(true);
        for (const inverse of inverses.reverse()) {
          now = apply(now, JSON.parse(JSON.stringify(inverse)) as EditDraft);
          undone++;
        }
        expect(now).toEqual(start);
      }),
      { numRuns: 200, seed: 11 },
    );
    expect(undone).toBeGreaterThan(500);
  });
});
