import type { Layout } from '@/geometry/core/layout';
import { measureRoom } from '@/geometry/plan/lay-room';
import { marksThatFit, squareTape, triangleAngle, triangleProblem } from '@/components/room/corner-marks';
import { closesWithin, fitWords } from '@/components/room/fit-words';
import { longerThanTheRest } from '@/components/room/ReadingPad';
import { nextTarget, observationOf, spareAfter, targetName, walkOf, wantsCross } from '@/components/room/tape-walk';
import { applyEdit, type EditDraft } from '@/shared/layout/apply-edit';
import { emptyLayout } from '@/shared/layout/empty-layout';
import { startingShape, type StartingShape } from '@/shared/layout/starting-shapes';

let serial = 0;
function edited(layout: Layout, ...drafts: EditDraft[]): Layout {
  return drafts.reduce((now, draft) => {
    const id = `b0000000-0000-4000-8000-${String(++serial).padStart(12, '0')}`;
    const result = applyEdit(now, { ...draft, id } as never);
    if (!result.ok) throw new Error(result.reason);
    return result.layout;
  }, layout);
}

const shape = (name: StartingShape) => edited(emptyLayout(), startingShape(name));
const read = (value: number) => ({ text: String(value), value });
const wall = (id: string, value: number): EditDraft => ({ kind: 'addReading', wall: id, reading: read(value) });
const corner = (left: string, right: string, c: number): EditDraft => ({
  kind: 'setTriangle',
  between: [left, right],
  triangle: { a: read(36), b: read(48), c: read(c) },
});
const cross = (id: string, from: [string, number | 'end'], to: [string, number | 'end'], d: number): EditDraft => ({
  kind: 'setTie',
  tie: { id, from: { wall: from[0], at: from[1] }, to: { wall: to[0], at: to[1] }, length: read(d) },
});

/** A U of 96 by 120 by 96 with square corners, every reading exact. */
const SQUARE_U = [wall('A', 96), wall('B', 120), wall('C', 96), corner('A', 'B', 60), corner('B', 'C', 60)] as const;
const TIES = [
  cross('t1', ['A', 0], ['C', 'end'], 120),
  cross('t2', ['A', 0], ['B', 'end'], Math.hypot(96, 120)),
  cross('t3', ['B', 0], ['C', 'end'], Math.hypot(96, 120)),
] as const;

const words = (layout: Layout) => fitWords(layout, measureRoom(layout.room, { next: true }));

describe('the order of the tape walk', () => {
  it('goes wall, corner, wall, corner, wall', () => {
    expect(walkOf(shape('U'), null).map(observationOf)).toEqual([
      'wall A',
      'corner A-B',
      'wall B',
      'corner B-C',
      'wall C',
    ]);
  });

  it('passes over what is taken and comes round to what was skipped', () => {
    const layout = edited(shape('U'), wall('B', 120), corner('B', 'C', 60), wall('C', 96));
    const next = nextTarget(layout, null, { kind: 'wall', wall: 'A' });
    expect(next && targetName(layout, next)).toBe('Corner A-B');
    expect(nextTarget(layout, null, { kind: 'corner', between: ['A', 'B'] })).toEqual({ kind: 'wall', wall: 'A' });
  });

  it('asks for crosses until two readings are spare: a U needs 5, so it asks for 2', () => {
    const taped = edited(shape('U'), ...SQUARE_U);
    expect(spareAfter(taped)).toBe(0);
    expect(wantsCross(taped)).toBe(true);
    expect(wantsCross(edited(taped, TIES[0]))).toBe(true);
    expect(wantsCross(edited(taped, TIES[0], TIES[1]))).toBe(false);
    expect(wantsCross(edited(shape('straight'), wall('A', 96)))).toBe(false);
  });

  it('counts the three conditions of a closed ring as readings: four walls and one corner hold a room of four', () => {
    const four = edited(shape('closed'), wall('A', 108), wall('B', 132), wall('C', 108), wall('D', 132));
    expect(spareAfter(four)).toBe(-1);
    expect(spareAfter(edited(four, corner('A', 'B', 60)))).toBe(0);
  });
});

describe('the fit report', () => {
  it('says what closes and how much is spare', () => {
    const layout = edited(shape('U'), ...SQUARE_U, ...TIES);
    expect(words(layout)).toMatchObject({
      mood: 'right',
      fact: 'Closes within 1/16 in',
      detail: '8 readings, 3 spare. You can lay tops.',
    });
    expect(closesWithin(measureRoom(layout.room).fit!, '1/16')).toBe('1/16 in');
  });

  it('names wall B with what it should read when it was taped 3/4 in long', () => {
    const long = SQUARE_U.map((edit) => (edit.kind === 'addReading' && edit.wall === 'B' ? wall('B', 120.75) : edit));
    const report = words(edited(shape('U'), ...long, ...TIES));
    expect(report).toMatchObject({ mood: 'retake', fact: 'Re-take wall B', target: { kind: 'wall', wall: 'B' } });
    expect(report.detail).toMatch(/^Off by about 3\/4 in\. The other 7 readings agree/);
  });

  it('names nobody with one spare reading', () => {
    const long = SQUARE_U.map((edit) => (edit.kind === 'addReading' && edit.wall === 'B' ? wall('B', 123) : edit));
    const report = words(edited(shape('U'), ...long, TIES[0]));
    expect(report.mood).toBe('unsure');
    expect(`${report.fact} ${report.detail}`).not.toMatch(/wall [A-C]|corner/);
  });

  it('says that a slip cannot be noticed with nothing to spare', () => {
    expect(words(edited(shape('U'), ...SQUARE_U)).mood).toBe('bare');
  });
});

describe('marks for a corner check', () => {
  it('suggests the longest 3-4-5 that fits, its long leg on the longer wall', () => {
    expect(marksThatFit(60, 120)[0]).toEqual([36, 48]);
    expect(marksThatFit(120, 40)[0]).toEqual([48, 36]);
    expect(marksThatFit(20, 120)[0]).toEqual([18, 24]);
    expect(marksThatFit(5, 5)).toEqual([[9, 12]]);
  });

  it('says what a square corner reads: 60 in for 36 and 48', () => {
    expect(squareTape(36, 48, 90)).toBeCloseTo(60, 12);
    expect(triangleAngle(36, 48, 60, 90)).toBeCloseTo(90, 12);
    expect(triangleAngle(36, 48, 60, 270)).toBeCloseTo(270, 12);
  });

  it('refuses a tape longer than both marks together or shorter than their difference', () => {
    expect(triangleProblem(36, 48, 84, '1/16')).toMatch(/at most 84 in apart/);
    expect(triangleProblem(36, 48, 12, '1/16')).toMatch(/at least 12 in apart/);
    expect(triangleProblem(36, 48, 60, '1/16')).toBeNull();
  });
});

describe('a wall of a closed room', () => {
  it('cannot be as long as all others together', () => {
    const layout = edited(shape('closed'), wall('A', 108), wall('B', 132), wall('C', 108));
    const target = { kind: 'wall', wall: 'D' } as const;
    expect(longerThanTheRest(layout, target, 348)).toBe(
      'All other walls together are 348 in long, so this one cannot be 348 in and the room still close.',
    );
    expect(longerThanTheRest(layout, target, 347)).toBeNull();
    expect(longerThanTheRest(shape('U'), { kind: 'wall', wall: 'A' }, 900)).toBeNull();
  });
});
