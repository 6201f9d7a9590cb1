import { toRadians } from '../../core/angle';
import type { Point } from '../../core/point';
import { boundingBox } from '../../core/polygon';
import { add, along, leftNormal, rotate, scale, subtract, unit } from '../../core/vector';
import type { DisplayStep } from '../../tape/format-length';
import type { DrawItem, Scene } from '../display-list';
import { readable, text } from './scene-styles';
import { WALL_THICKNESS } from './wall-bodies';

export interface CornerPicture {
  /** Letters of the walls left and right of the corner. */
  readonly labels: readonly [string, string];
  /** Where the marks are, inches from the corner. */
  readonly a: number;
  readonly b: number;
  /** The tape from mark to mark; null while it is not read. */
  readonly c: number | null;
  /** Interior angle to draw, degrees. */
  readonly angleDeg: number;
  /** Bearing of the left wall towards the corner, radians, so that the picture lies as the room does. */
  readonly bearing: number;
  readonly step: DisplayStep;
}

/** How much longer than its mark a wall is drawn. */
const BEYOND = 1.35;
const BLADE_OFF = 26;

/** One corner with its two marks and the tape between them; the corner is at the origin. Inches. */
export function cornerScene(picture: CornerPicture): Scene {
  const { a, b, labels, bearing } = picture;
  // The room is on the right-hand side of both walls: the second one leaves the corner turned right by 180 less the angle.
  const into: Point = [Math.cos(bearing), Math.sin(bearing)];
  const leave = rotate(into, Math.PI + toRadians(picture.angleDeg));
  const back = scale(into, -1);
  const left = { far: scale(back, a * BEYOND), mark: scale(back, a), out: leftNormal(into) };
  const right = { far: scale(leave, b * BEYOND), mark: scale(leave, b), out: leftNormal(leave) };
  const items: DrawItem[] = [
    ...body(left.far, [0, 0], left.out),
    ...body([0, 0], right.far, right.out),
    { layer: 'walls', kind: 'polyline', points: [left.far, [0, 0], right.far], stroke: { ink: 'ink', width: 4.5 } },
    { layer: 'readings', kind: 'line', from: left.mark, to: right.mark, stroke: { ink: 'chalk', width: 4 } },
    tick(left.mark, left.out),
    tick(right.mark, right.out),
    blade('a', scale(left.mark, 0.5), left.out, into, picture.a, picture.step),
    blade('b', scale(right.mark, 0.5), right.out, leave, picture.b, picture.step),
    ...across(left.mark, right.mark, picture),
    letter(labels[0], left.far, scale(left.out, -1)),
    letter(labels[1], right.far, scale(right.out, -1)),
  ];
  return {
    bounds: boundingBox([left.far, right.far, [0, 0]]),
    items,
    title: `Corner ${labels.join('-')}`,
    alt: `Marks ${a} in from the corner on wall ${labels[0]} and ${b} in on wall ${labels[1]}, with the tape between them.`,
  };
}

function body(from: Point, to: Point, out: Point): DrawItem[] {
  const lift = scale(out, WALL_THICKNESS);
  return [
    { layer: 'walls', kind: 'polygon', outline: [from, to, add(to, lift), add(from, lift)], fill: 'wall' },
    // The corner of the two bodies is filled by each wall reaching a little over it.
    { layer: 'walls', kind: 'polygon', outline: [to, add(to, lift), add(to, scale(out, 0.01))], fill: 'wall' },
  ];
}

function tick(at: Point, out: Point): DrawItem {
  const half = 4;
  return { layer: 'readings', kind: 'line', from: along(at, out, half), to: along(at, out, -half), stroke: { ink: 'red', width: 4 } }; // prettier-ignore
}

function blade(id: string, at: Point, out: Point, direction: Point, inches: number, step: DisplayStep): DrawItem {
  const { turn, flipped } = readable(direction);
  return {
    layer: 'readings',
    id,
    kind: 'blade',
    at: along(at, out, WALL_THICKNESS),
    shift: [out[0] * BLADE_OFF, out[1] * BLADE_OFF],
    inches,
    step,
    turn,
    state: 'set',
    ...(flipped ? { hookRight: true } : {}),
  };
}

function across(from: Point, to: Point, { c, step }: CornerPicture): DrawItem[] {
  const { turn, flipped } = readable(subtract(to, from));
  const at: Point = scale(add(from, to), 0.5);
  if (!unit(from, to)) return [];
  return [{ layer: 'readings', id: 'c', kind: 'blade', at, inches: c, step, turn, state: c === null ? 'empty' : 'selected', ...(flipped ? { hookRight: true } : {}) }]; // prettier-ignore
}

function letter(label: string, far: Point, inward: Point): DrawItem {
  return { layer: 'letters', kind: 'text', at: scale(far, 0.92), shift: [inward[0] * 26, inward[1] * 26], text: label, style: text.wall, anchor: 'middle', middle: true }; // prettier-ignore
}
