import type { Layout } from '@/geometry/core/layout';
import type { Point } from '@/geometry/core/point';
import { breakAt, type Break } from '@/components/editor/tools/break-wall';
import { sketchOf, slideWall, without } from '@/components/editor/tools/sketch';
import { stepTrace, TRACE_START, type TraceState } from '@/components/editor/tools/trace-tool';
import type { ToolEvent } from '@/components/editor/tools/tool';
import { applyEdit, type EditDraft } from '@/shared/layout/apply-edit';
import { emptyLayout } from '@/shared/layout/empty-layout';
import { startingShape } from '@/shared/layout/starting-shapes';

let serial = 0;
function edited(layout: Layout, draft: EditDraft): Layout {
  const id = `a0000000-0000-4000-8000-${String(++serial).padStart(12, '0')}`;
  const result = applyEdit(layout, { ...draft, id } as never);
  if (!result.ok) throw new Error(result.reason);
  return result.layout;
}

const tap = (at: Point, target: string | null = 'ground'): ToolEvent => ({
  kind: 'tap',
  at,
  target,
  on: null,
  reach: 5,
});
const drag = (kind: 'drag' | 'drop', target: string, from: Point, to: Point): ToolEvent => ({ kind, target, from, to, on: null, reach: 5 }); // prettier-ignore

/** Feeds events to the tool and applies what comes of them, as the canvas does. */
function play(events: readonly ToolEvent[], start: Layout = emptyLayout()) {
  let layout = start;
  let state: TraceState = TRACE_START;
  const refusals: string[] = [];
  for (const event of events) {
    const step = stepTrace(state, event, layout);
    state = step.state;
    if (step.refusal) refusals.push(step.refusal);
    if (step.edit) layout = edited(layout, step.edit.edit);
  }
  return { layout, state, refusals, sketch: sketchOf(layout) };
}

describe('tracing by taps', () => {
  it('makes walls between taps, drawn square where they nearly are: 4 taps 5 degrees off make a U', () => {
    const { sketch, layout } = play([tap([-60, -50]), tap([-57, 50]), tap([62, 54]), tap([60, -44])]);
    expect(sketch.walls).toHaveLength(3);
    const [a, b, c, d] = sketch.points;
    expect(a![0]).toBeCloseTo(b![0], 9);
    expect(b![1]).toBeCloseTo(c![1], 9);
    expect(c![0]).toBeCloseTo(d![0], 9);
    expect(layout.room.corners.map((corner) => corner.nominal)).toEqual([90, 90]);
  });

  it('snaps to 45 for a bay, and leaves 20 degrees off as it is drawn', () => {
    const bay = play([tap([0, 0]), tap([60, 0]), tap([101, -38])]).sketch.points[2]!;
    expect(bay[0] - 60).toBeCloseTo(-bay[1], 9);
    expect(play([tap([0, 0]), tap([60, 0]), tap([80, -60])]).sketch.points[2]).toEqual([80, -60]);
  });

  it('letters the walls from left to right also when they are drawn from right to left', () => {
    const { sketch, layout } = play([tap([60, -50]), tap([60, 50]), tap([-60, 50]), tap([-60, -50])]);
    expect(sketch.points[0]![0]).toBe(-60);
    expect(sketch.points.at(-1)![0]).toBe(60);
    expect(layout.room.corners.map((corner) => corner.nominal)).toEqual([90, 90]);
  });

  it('closes the room when the other open end is tapped', () => {
    const { layout } = play(
      [tap([120, -96], 'point 3'), tap([0, -96], 'point 0')],
      edited(emptyLayout(), startingShape('U')),
    );
    expect(layout.room.closed).toBe(true);
    expect(layout.room.walls).toHaveLength(4);
    expect(layout.room.corners).toHaveLength(4);
  });

  it('refuses a wall without length in a sentence', () => {
    const { refusals, sketch } = play([tap([121, -96])], edited(emptyLayout(), startingShape('U')));
    expect(refusals).toEqual(['That wall would have no length. Draw it longer.']);
    expect(sketch.walls).toHaveLength(3);
  });
});

describe('dragging', () => {
  const U = edited(emptyLayout(), startingShape('U'));

  it('previews a corner and gives one edit only when it is let go', () => {
    const moving = stepTrace(TRACE_START, drag('drag', 'point 3', [120, -96], [121, -140]), U);
    expect(moving.edit).toBeUndefined();
    expect(moving.preview!.points[3]).toEqual([120, -140]);
    const { sketch } = play([drag('drop', 'point 3', [120, -96], [121, -140])], U);
    expect(sketch.points[3]).toEqual([120, -140]);
  });

  it('drops the preview on Escape', () => {
    const step = stepTrace(TRACE_START, { kind: 'cancel' }, U);
    expect(step).toEqual({ state: TRACE_START, preview: null });
  });

  it('slides a wall sideways and keeps its neighbours square: B 12 in out makes A and C 108 long', () => {
    const { sketch } = play([drag('drop', 'wall B', [60, 0], [60, 12])], U);
    expect(sketch.points.map(([x, y]) => [Math.round(x), Math.round(y)])).toEqual([
      [0, -96],
      [0, 12],
      [120, 12],
      [120, -96],
    ]);
  });

  it('closes the room when one open end is dragged onto the other', () => {
    const { layout } = play([drag('drop', 'point 3', [120, -96], [2, -95])], U);
    expect(layout.room.closed).toBe(true);
    expect(layout.room.walls).toHaveLength(3);
  });

  it('nudges a corner by 1/16 in', () => {
    const { sketch } = play([{ kind: 'nudge', target: 'point 3', by: [1 / 16, 0], on: null }], U);
    expect(sketch.points[3]).toEqual([120.0625, -96]);
  });
});

describe('walls taken away and broken', () => {
  const U = edited(emptyLayout(), startingShape('U'));

  it('lets the neighbours of a removed wall meet in one corner', () => {
    const bay = sketchOf(edited(emptyLayout(), startingShape('bay')));
    const left = without(bay, 'C');
    expect(left.walls).toEqual(['A', 'B', 'D', 'E']);
    expect(left.points).toHaveLength(5);
    expect(left.points[2]![0]).toBeCloseTo(84, 9);
    expect(left.points[2]![1]).toBeCloseTo(84, 9);
  });

  it('opens a ring of three when one of its walls goes', () => {
    const ring = { walls: ['A', 'B', 'C'], points: [[0, 0], [0, 90], [90, 0]] as Point[], closed: true }; // prettier-ignore
    const left = without(ring, 'B');
    expect(left.closed).toBe(false);
    expect(left.walls).toHaveLength(2);
    expect(left.points).toHaveLength(3);
  });

  it.each<[Break, number, number[]]>([
    ['split', 4, [90, 180, 90]],
    ['outside corner', 5, [90, 90, 270, 90]],
    ['pipe column', 7, [90, 90, 270, 270, 90, 90]],
  ])('%s makes %i walls with corners %j', (kind, walls, corners) => {
    const result = breakAt(U, sketchOf(U), 'B', [60, 0], kind);
    if ('refusal' in result) throw new Error(result.refusal);
    const { room } = edited(U, result.edit);
    expect(room.walls).toHaveLength(walls);
    expect(room.corners.map((corner) => corner.nominal)).toEqual(corners);
  });

  it('does not put an outside corner into a wall that was taped as straight', () => {
    const taped = edited(U, { kind: 'addReading', wall: 'B', reading: { text: '120', value: 120 } });
    expect(breakAt(taped, sketchOf(taped), 'B', [60, 0], 'outside corner')).toEqual({
      refusal: 'This wall was taped as one straight wall. Take its reading away, or split it, before it gets a corner.',
    });
  });

  it('slides no wall that has no direction', () => {
    const flat = { walls: ['A'], points: [[0, 0], [0, 0]] as Point[], closed: false }; // prettier-ignore
    expect(slideWall(flat, 0, 5)).toBe(flat);
  });
});
