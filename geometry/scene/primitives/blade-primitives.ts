import type { Point } from '../../core/point';
import type { DrawItem, Ink, TextRun, TextStyle } from '../display-list';
import { layoutRuns } from '../run-layout';
import {
  boxPath,
  pathThrough,
  project,
  turned,
  type Path,
  type PathPrimitive,
  type Primitive,
  type Segment,
  type View,
} from './primitive';
import { textPrimitives } from './text-primitives';

type Blade = Extract<DrawItem, { kind: 'blade' }>;
type Badge = Extract<DrawItem, { kind: 'badge' }>;

/** px. The number is half the blade's height. */
export const BLADE_HEIGHT = 36;
const BLADE_PAD = 17;
const HOOK = 5;
const TICK_GAP = 4.4;

const BLADE_TEXT: TextStyle = { face: 'body', weight: 'bold', size: 18, ink: 'tapeInk' };
const NOT_TAPED: TextStyle = { face: 'body', weight: 'bold', size: 16, ink: 'ink2' };

/** A blade of the tape: ticks on its upper edge, a dark hook at the measuring end, the length in its middle. */
export function bladePrimitives(blade: Blade, view: View): Primitive[] {
  const run: TextRun =
    blade.inches === null ? { text: 'not taped' } : { inches: blade.inches, step: blade.step, unit: true };
  const style: TextStyle = blade.inches === null ? NOT_TAPED : BLADE_TEXT;
  const text = layoutRuns([run], style, undefined, view.smallest);
  const width = text.width + 2 * BLADE_PAD;
  const at = project(view, blade.at, blade.shift);
  const to = (x: number, y: number): Point => turned(at, [x * view.pixel, y * view.pixel], blade.turn);
  const body = boxPath(at, width * view.pixel, BLADE_HEIGHT * view.pixel, blade.turn);
  const label = textPrimitives(
    { at: blade.at, anchor: 'middle', middle: true, turn: blade.turn, ...(blade.shift ? { shift: blade.shift } : {}) },
    [run],
    style,
    view,
  );
  if (blade.inches === null) {
    const dash = [5 * view.pixel, 4 * view.pixel];
    return [
      { kind: 'path', path: body, fill: 'card', line: { paint: 'ink2', width: 1.5 * view.pixel, dash } },
      ...label,
    ];
  }
  return [
    ...ring(blade, body, view),
    { kind: 'path', path: body, fill: 'tape', line: { paint: 'tapeInk', width: 1.3 * view.pixel } },
    ticks(width, to, view),
    hook(blade, width, at, to, view),
    ...label,
    ...(blade.state === 'twice' ? [check(width, to, view)] : []),
  ];
}

function ring(blade: Blade, body: Path, view: View): PathPrimitive[] {
  if (blade.state !== 'selected' && blade.state !== 'retake') return [];
  const paint: Ink = blade.state === 'selected' ? 'chalk' : 'red';
  return [{ kind: 'path', path: body, line: { paint, width: 6 * view.pixel } }];
}

function ticks(width: number, to: (x: number, y: number) => Point, view: View): PathPrimitive {
  const path: Segment[] = [];
  const top = -BLADE_HEIGHT / 2;
  for (let i = 1; i * TICK_GAP < width - HOOK - 2; i++) {
    const x = -width / 2 + HOOK + i * TICK_GAP;
    const long = i % 8 === 0 ? 9 : i % 2 === 0 ? 5.5 : 3.5;
    path.push(...pathThrough([to(x, top), to(x, top + long)], false));
  }
  return { kind: 'path', path, line: { paint: 'tapeInk', width: 1 * view.pixel } };
}

function hook(blade: Blade, width: number, at: Point, to: (x: number, y: number) => Point, view: View): PathPrimitive {
  const x = (blade.hookRight ? 1 : -1) * (width / 2 - HOOK / 2 + 1.5);
  const centre = to(x, 0);
  return {
    kind: 'path',
    path: boxPath(centre, HOOK * view.pixel, (BLADE_HEIGHT + 6) * view.pixel, blade.turn),
    fill: 'hook',
  };
}

/** Taped twice. */
function check(width: number, to: (x: number, y: number) => Point, view: View): PathPrimitive {
  const x = width / 2 - 14;
  const y = BLADE_HEIGHT / 2 - 11;
  return {
    kind: 'path',
    path: pathThrough([to(x, y), to(x + 3.5, y + 4), to(x + 10, y - 4)], false),
    line: { paint: 'tapeInk', width: 1.8 * view.pixel },
  };
}

const BADGE_HEIGHT = 48;
const CLIPPED = 12;

/** A corner's tag with one clipped corner: angle over one word. */
export function badgePrimitives(badge: Badge, view: View): Primitive[] {
  const ink: Ink = badge.state === 'retake' ? 'red' : badge.state === 'unchecked' ? 'ink2' : 'ink';
  const angle: TextStyle = { face: 'body', weight: 'bold', size: 18, ink };
  const word: TextStyle = { face: 'label', weight: 'semibold', size: 16, ink };
  const figure = badge.angleDeg === null ? '?' : `${badge.angleDeg.toFixed(1)}°`;
  const width = Math.max(
    78,
    ...[
      layoutRuns([{ text: figure }], angle, undefined, 11),
      layoutRuns([{ text: badge.word }], word, undefined, 11),
    ].map((block) => block.width + 24),
  );
  const at = project(view, badge.at, badge.shift);
  const [w, h, p] = [width / 2, BADGE_HEIGHT / 2, view.pixel];
  const outline: readonly Point[] = [[-w, -h], [w, -h], [w, h - CLIPPED], [w - CLIPPED, h], [-w, h]]; // prettier-ignore
  const shift = badge.shift ?? [0, 0];
  const line = (up: number, text: string, style: TextStyle) =>
    textPrimitives(
      { at: badge.at, anchor: 'middle', middle: true, shift: [shift[0], shift[1] + up] },
      [{ text }],
      style,
      view,
    );
  return [
    {
      kind: 'path',
      path: pathThrough(
        outline.map(([x, y]): Point => [at[0] + x * p, at[1] + y * p]),
        true,
      ),
      fill: badge.state === 'retake' ? 'redT' : 'card',
      line: {
        paint: ink,
        width: (badge.state === 'retake' ? 2.4 : 1.8) * p,
        ...(badge.state === 'unchecked' ? { dash: [5 * p, 4 * p] } : {}),
      },
    },
    ...line(9, figure, angle),
    ...line(-12, badge.word, word),
  ];
}
