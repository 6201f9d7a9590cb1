import type { Point, Polygon } from '../../core/point';
import { boundingBox } from '../../core/polygon';
import type { Shift, TextRun, TextStyle } from '../display-list';
import { BLADE_HEIGHT } from '../primitives/blade-primitives';
import { layoutRuns } from '../run-layout';

/** A turned rectangle on the screen: px, y up, `turn` radians counter-clockwise. */
export interface LabelBox {
  readonly centre: Point;
  readonly width: number;
  readonly height: number;
  readonly turn: number;
}

/** px; the smallest figure of a fraction on screen. */
const SMALLEST = 11;
/** px beside the number on a blade, and its number's type. */
const BLADE_PAD = 17;
const BLADE_TEXT: TextStyle = { face: 'body', weight: 'bold', size: 18, ink: 'tapeInk' };
/** px kept clear round words. */
const CLEAR = 3;

/** Where a place of the drawing lies, px, moved by `shift`. */
export const toPx = ([x, y]: Point, pxPerInch: number, shift: Shift = [0, 0]): Point => [
  x * pxPerInch + shift[0],
  y * pxPerInch + shift[1],
];

/** Size of words and lengths in one line, with what is kept clear round them. */
export function wordsSize(
  runs: readonly TextRun[],
  style: TextStyle,
): { readonly width: number; readonly height: number } {
  const block = layoutRuns(runs, style, undefined, SMALLEST);
  return { width: block.width + 2 * CLEAR, height: block.ascent + block.descent + 2 * CLEAR };
}

export function bladeSize(inches: number | null, step: Extract<TextRun, { inches: number }>['step']) {
  const run: TextRun = inches === null ? { text: 'not taped' } : { inches, step, unit: true };
  const width = layoutRuns([run], BLADE_TEXT, undefined, SMALLEST).width + 2 * BLADE_PAD;
  return { width: width + 2 * CLEAR, height: BLADE_HEIGHT + 2 * CLEAR };
}

/** The box round a polygon of the drawing. */
export function boxOf(outline: Polygon, pxPerInch: number): LabelBox {
  const box = boundingBox(outline);
  const centre: Point = [(box.minX + box.maxX) / 2, (box.minY + box.maxY) / 2];
  return {
    centre: toPx(centre, pxPerInch),
    width: (box.maxX - box.minX) * pxPerInch,
    height: (box.maxY - box.minY) * pxPerInch,
    turn: 0,
  };
}

/** Its four corners, px. */
export function cornersOf({ centre, width, height, turn }: LabelBox): Point[] {
  const [c, s] = [Math.cos(turn), Math.sin(turn)];
  return ([[-1, -1], [1, -1], [1, 1], [-1, 1]] as const).map(([u, v]): Point => {
    const [x, y] = [(u * width) / 2, (v * height) / 2];
    return [centre[0] + x * c - y * s, centre[1] + x * s + y * c];
  }); // prettier-ignore
}

/** Whether two boxes lie on each other: none of their four side directions parts them. */
export function overlap(a: LabelBox, b: LabelBox): boolean {
  const [p, q] = [cornersOf(a), cornersOf(b)];
  return [a.turn, a.turn + Math.PI / 2, b.turn, b.turn + Math.PI / 2].every((angle) => {
    const axis: Point = [Math.cos(angle), Math.sin(angle)];
    const along = (points: readonly Point[]) => points.map(([x, y]) => x * axis[0] + y * axis[1]);
    const [u, v] = [along(p), along(q)];
    return Math.min(...u) < Math.max(...v) && Math.min(...v) < Math.max(...u);
  });
}
