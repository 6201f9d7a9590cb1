import type { Layout } from '@/geometry/core/layout';
import type { Point } from '@/geometry/core/point';
import { distance, dot, rightNormal, subtract, unit } from '@/geometry/core/vector';
import { snapCorner, type SnapAnchor } from './snap-sketch';
import {
  bearingOf,
  canClose,
  close,
  endsOf,
  extend,
  reversed,
  sketchOf,
  slideWall,
  traceEdit,
  turnsRight,
  wallIndex,
  withPoint,
  type Sketch,
} from './sketch';
import type { ToolEvent, ToolStep } from './tool';

/**
 * Drawing the room: a tap on free ground adds a wall from the open end, a drag moves a corner or slides a wall, a tap on
 * the other open end closes the room. Targets are called `point 2` and `wall A`; a drag on free ground comes as `ground`.
 */
export interface TraceState {
  /** The first corner of a room that has no walls yet. */
  readonly first: Point | null;
  /** `point 2` or `wall A`. */
  readonly selected: string | null;
}

export const TRACE_START: TraceState = { first: null, selected: null };

/** No wall is drawn shorter than this, inches. */
const LEAST = 3;

/** The tracing tool after one event. `layout.room.sketch` holds the corners as they lie on the drawing. */
export function stepTrace(state: TraceState, event: ToolEvent, layout: Layout): ToolStep<TraceState, Sketch> {
  const sketch = sketchOf(layout);
  switch (event.kind) {
    case 'cancel':
      return { state: { ...state, first: null }, preview: null };
    case 'tap':
      return onTap(state, event, sketch, layout);
    case 'drag':
    case 'drop':
      return onDrag(state, event, sketch, layout);
    case 'nudge':
      return onNudge(state, event, sketch);
  }
}

type Step = ToolStep<TraceState, Sketch>;

const done = (state: TraceState, sketch: Sketch, label: string): Step => ({
  state,
  preview: null,
  edit: { edit: traceEdit(sketch), label },
});

function onTap(state: TraceState, event: ToolEvent & { kind: 'tap' }, sketch: Sketch, layout: Layout): Step {
  const { at, target, reach } = event;
  const index = pointIndex(target);
  if (sketch.walls.length === 0) return tapFirst(state, at, reach);
  if (index !== null) {
    const other = state.selected === `point ${index === 0 ? sketch.points.length - 1 : 0}`;
    const isEnd = index === 0 || index === sketch.points.length - 1;
    if (other && isEnd && canClose(sketch))
      return done({ ...state, selected: null }, close(sketch, reach), 'closing the room');
    return { state: { ...state, selected: target }, preview: null };
  }
  if (target !== null && target !== 'ground') return { state: { ...state, selected: target }, preview: null };
  if (sketch.closed) return { state: { ...state, selected: null }, preview: null };
  const end = openEnd(state, sketch);
  return added(state, sketch, end, at, layout);
}

/** The first two taps of an empty room are its first wall. */
function tapFirst(state: TraceState, at: Point, reach: number): Step {
  if (!state.first || distance(state.first, at) < Math.max(LEAST, reach / 2))
    return { state: { ...state, first: [Math.round(at[0]), Math.round(at[1])] }, preview: null };
  return firstWall(state, state.first, at);
}

function firstWall(state: TraceState, from: Point, to: Point): Step {
  const end = snapCorner(to, [{ at: from, bearing: null }]).at;
  if (distance(from, end) < LEAST)
    return { state, preview: null, refusal: 'That wall would have no length. Draw it longer.' };
  const sketch: Sketch = { walls: ['A'], points: [from, end], closed: false };
  return done({ first: null, selected: 'point 1' }, sketch, 'wall A');
}

/** The end that goes on: the one selected, else the right one. */
function openEnd(state: TraceState, sketch: Sketch): 'left' | 'right' {
  return pointIndex(state.selected) === 0 && sketch.points.length > 1 ? 'left' : 'right';
}

function added(state: TraceState, sketch: Sketch, end: 'left' | 'right', to: Point, layout: Layout): Step {
  const right = end === 'right';
  const from = right ? sketch.points.at(-1)! : sketch.points[0]!;
  const bearing = bearingOf(sketch, right ? sketch.walls.length - 1 : 0);
  const at = snapCorner(to, [{ at: from, bearing }]).at;
  if (distance(from, at) < LEAST)
    return { state, preview: null, refusal: 'That wall would have no length. Draw it longer.' };
  const longer = extend(sketch, end, at);
  const label = right ? 'a wall' : 'a wall at the left';
  if (right && drawnBackwards(longer, layout))
    return done({ first: null, selected: 'point 0' }, { ...reversed(longer), walls: longer.walls }, label);
  return done({ first: null, selected: right ? `point ${longer.points.length - 1}` : 'point 0' }, longer, label);
}

/**
 * Walls are lettered from left to right. A chain drawn from right to left is turned round at its first bend, where it is
 * known which side the room is on, while nothing is measured on it.
 */
function drawnBackwards(sketch: Sketch, { room, bases }: Layout): boolean {
  const measured = room.walls.some((wall) => wall.length.length > 0) || bases.length > 0 || room.ties.length > 0;
  return !measured && sketch.walls.length === 2 && !turnsRight(sketch);
}

function onDrag(state: TraceState, event: ToolEvent & { kind: 'drag' | 'drop' }, sketch: Sketch, layout: Layout): Step {
  const { target, from, to, reach } = event;
  const drop = event.kind === 'drop';
  const index = pointIndex(target);
  if (target === 'ground') return onGroundDrag(state, event, sketch, layout);
  if (index === null) return onSlide(state, event, sketch);
  const start = sketch.points[index];
  if (!start) return { state, preview: null };
  const wanted: Point = [start[0] + to[0] - from[0], start[1] + to[1] - from[1]];
  const far = otherEnd(sketch, index);
  const next = { ...state, selected: target };
  if (far !== null && distance(wanted, sketch.points[far]!) <= reach && sketch.walls.length >= 3) {
    const closing = withPoint(sketch, index, sketch.points[far]!);
    if (!drop) return { state: next, preview: closing };
    return done({ ...next, selected: null }, close(closing, reach), 'closing the room');
  }
  const moved = withPoint(sketch, index, snapCorner(wanted, anchorsOf(sketch, index)).at);
  if (!drop) return { state: next, preview: moved };
  return tooShort(moved) ?? done(next, moved, 'moving a corner');
}

function onSlide(state: TraceState, event: ToolEvent & { kind: 'drag' | 'drop' }, sketch: Sketch): Step {
  const wall = event.target.replace(/^wall /, '');
  const index = wallIndex(sketch, wall);
  const direction = index < 0 ? null : unit(...endsOf(sketch, index));
  if (!direction) return { state, preview: null };
  const by = Math.round(dot(subtract(event.to, event.from), rightNormal(direction)));
  const moved = slideWall(sketch, index, by);
  const next = { ...state, selected: event.target };
  if (event.kind === 'drag') return { state: next, preview: moved };
  if (by === 0) return { state: next, preview: null };
  return tooShort(moved) ?? done(next, moved, 'moving a wall');
}

/** A drag on free ground draws a wall: the first one from where it began, any other from the open end. */
function onGroundDrag(
  state: TraceState,
  event: ToolEvent & { kind: 'drag' | 'drop' },
  sketch: Sketch,
  layout: Layout,
): Step {
  if (sketch.closed) return { state, preview: null };
  const step =
    sketch.walls.length === 0
      ? firstWall(state, [Math.round(event.from[0]), Math.round(event.from[1])], event.to)
      : added(state, sketch, openEnd(state, sketch), event.to, layout);
  if (event.kind === 'drop') return step;
  const draft = step.edit?.edit;
  const preview = draft?.kind === 'traceRoom' ? { walls: draft.walls, points: draft.points, closed: false } : null;
  return { state, preview };
}

function onNudge(state: TraceState, event: ToolEvent & { kind: 'nudge' }, sketch: Sketch): Step {
  const index = pointIndex(event.target);
  const next = { ...state, selected: event.target };
  if (index !== null) {
    const at = sketch.points[index];
    if (!at) return { state, preview: null };
    const moved = withPoint(sketch, index, [at[0] + event.by[0], at[1] + event.by[1]]);
    return tooShort(moved) ?? done(next, moved, 'moving a corner');
  }
  const wall = wallIndex(sketch, event.target.replace(/^wall /, ''));
  const direction = wall < 0 ? null : unit(...endsOf(sketch, wall));
  if (!direction) return { state, preview: null };
  const by = dot(event.by, rightNormal(direction));
  if (Math.abs(by) < 1e-9) return { state: next, preview: null };
  const moved = slideWall(sketch, wall, by);
  return tooShort(moved) ?? done(next, moved, 'moving a wall');
}

function tooShort(sketch: Sketch): Step | null {
  const short = sketch.walls.some((_, i) => distance(...endsOf(sketch, i)) < 1);
  if (!short) return null;
  return { state: TRACE_START, preview: null, refusal: 'A wall would have no length there. Nothing was moved.' };
}

/** The fixed ends of the walls that meet in a corner, each with the bearing of the wall beyond it. */
function anchorsOf(sketch: Sketch, index: number): SnapAnchor[] {
  const count = sketch.points.length;
  const anchors: SnapAnchor[] = [];
  const before = sketch.closed ? (index - 1 + count) % count : index - 1;
  const after = sketch.closed ? (index + 1) % count : index + 1;
  if (before >= 0) anchors.push({ at: sketch.points[before]!, bearing: bearingOf(sketch, before - 1) });
  if (after < count) anchors.push({ at: sketch.points[after]!, bearing: bearingOf(sketch, after) });
  return anchors;
}

/** The open end across from an open end, or null. */
function otherEnd(sketch: Sketch, index: number): number | null {
  if (sketch.closed || sketch.points.length < 4) return null;
  const last = sketch.points.length - 1;
  return index === 0 ? last : index === last ? 0 : null;
}

function pointIndex(target: string | null): number | null {
  const found = target === null ? null : /^point (\d+)$/.exec(target);
  return found ? Number(found[1]) : null;
}
