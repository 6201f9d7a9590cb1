import type { Layout } from '@/geometry/core/layout';
import type { Point } from '@/geometry/core/point';
import { along, rightNormal, unit } from '@/geometry/core/vector';
import type { LabelledEdit } from './tool';
import { endsOf, footOnWall, lengthOf, newWall, wallIndex, type Sketch } from './sketch';

/** Usual sizes, inches; the tape finds the true ones. */
const PIPE = { width: 8, depth: 6 };
const STEP = 12;

/** No part of a broken wall is drawn shorter than this, inches. */
const LEAST = 2;

export type Break = 'split' | 'outside corner' | 'pipe column';

export type BreakResult = LabelledEdit | { readonly refusal: string };

/** The edit that breaks a wall at a place on it: in two, by an outside corner, or round a boxed-in pipe. */
export function breakAt(layout: Layout, sketch: Sketch, wall: string, near: Point, kind: Break): BreakResult {
  const index = wallIndex(sketch, wall);
  if (index < 0) return { refusal: 'The wall is gone.' };
  const length = lengthOf(sketch, index);
  const width = kind === 'pipe column' ? Math.min(PIPE.width, length - 2 * LEAST) : 0;
  if (length < 2 * LEAST + Math.max(width, 1)) return { refusal: 'The wall is too short to break.' };
  const at = Math.round(footOnWall(sketch, index, near));
  const left = Math.min(length - LEAST - width, Math.max(LEAST, at - width / 2));
  if (kind === 'outside corner') return stepIn(layout, sketch, index, left);
  const [from, to] = endsOf(sketch, index);
  const direction = unit(from, to)!;
  const start = along(from, direction, left);
  if (kind === 'split') return broken(sketch, index, 1, [start], { left, right: left }, `split of wall`);
  const inward = rightNormal(direction);
  const end = along(start, direction, width);
  const inner = [start, along(start, inward, PIPE.depth), along(end, inward, PIPE.depth), end];
  return broken(sketch, index, 4, inner, { left, right: left + width }, 'pipe column on wall');
}

/** An outside corner: the right part of the wall steps into the room, and the next wall begins there. */
function stepIn(layout: Layout, sketch: Sketch, index: number, left: number): BreakResult {
  const wall = sketch.walls[index]!;
  if ((layout.room.walls.find((w) => w.id === wall)?.length.length ?? 0) > 0)
    return {
      refusal: 'This wall was taped as one straight wall. Take its reading away, or split it, before it gets a corner.',
    };
  const [from, to] = endsOf(sketch, index);
  const direction = unit(from, to)!;
  const inward = rightNormal(direction);
  const start = along(from, direction, left);
  const inner = [start, along(start, inward, STEP)];
  const moved: Sketch = {
    ...sketch,
    points: sketch.points.map((point) => (point === to ? along(to, inward, STEP) : point)),
  };
  return broken(moved, index, 2, inner, { left, right: left }, 'outside corner on wall');
}

function broken(
  sketch: Sketch,
  index: number,
  more: number,
  inner: readonly Point[],
  span: { readonly left: number; readonly right: number },
  words: string,
): BreakResult {
  const wall = sketch.walls[index]!;
  const fresh: string[] = [];
  for (let i = 0; i < more; i++) fresh.push(newWall(sketch.walls, fresh));
  const points = [...sketch.points.slice(0, index + 1), ...inner, ...sketch.points.slice(index + 1)];
  return {
    edit: {
      kind: 'breakWall',
      wall,
      chain: [wall, ...fresh],
      points: points.map(([x, y]): [number, number] => [x, y]),
      ...span,
    },
    label: words,
  };
}
