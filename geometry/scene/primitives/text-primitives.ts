import type { Point } from '../../core/point';
import type { Ink, Shift, TextPlace, TextRun, TextStyle } from '../display-list';
import type { LengthLayout } from '../length-layout';
import { layoutRuns, type TextBlock, type TextLine } from '../run-layout';
import { capitalHeight, textWidth } from '../text-width';
import { boxPath, project, turned, type Primitive, type View } from './primitive';

/** px of ground round text, sideways and up and down. */
const PAD: Readonly<Record<'ground' | 'frame', Shift>> = { ground: [4, 3], frame: [10, 8] };
const FRAME_WIDTH = 2;

const SHARE = { start: 0, middle: 0.5, end: 1 } as const;

/**
 * Text, lengths and both mixed, in lines, with their ground and frame.
 *
 * @param runs - what is written, in order
 * @param wrap - px, or undefined for one line
 */
export function textPrimitives(
  place: TextPlace,
  runs: readonly TextRun[],
  style: TextStyle,
  view: View,
  options: { readonly wrap?: number; readonly hollow?: boolean } = {},
): Primitive[] {
  const block = layoutRuns(runs, style, options.wrap, view.smallest);
  const at = project(view, place.at, place.shift);
  const turn = place.turn ?? 0;
  const down = place.middle ? (capitalHeight(style) - block.drop) / 2 : 0;
  const to = (x: number, y: number): Point => turned(at, [x * view.pixel, (y + down) * view.pixel], turn);
  const lines = block.lines.flatMap((line) =>
    linePrimitives(line, -line.width * SHARE[place.anchor], to, { view, turn, anchor: place.anchor, ...options }),
  );
  return [...groundPrimitives(place, block, style, to, view), ...lines];
}

interface LineOptions {
  readonly view: View;
  readonly turn: number;
  readonly anchor: TextPlace['anchor'];
  readonly hollow?: boolean;
}

function linePrimitives(
  line: TextLine,
  left: number,
  to: (x: number, y: number) => Point,
  options: LineOptions,
): Primitive[] {
  const only = line.parts.length === 1 ? line.parts[0] : undefined;
  if (only?.kind === 'text') {
    // Alone on its line, text keeps its anchor: a painter with the font at hand then centres it to the hair.
    return [plainText(only.text, only.style, to(0, line.baseline), line.width, options)];
  }
  return line.parts.flatMap((part) => {
    const x = left + part.x;
    if (part.kind === 'length') return lengthPrimitives(part.length, part.style, [x, line.baseline], to, options);
    const width = textWidth(part.text, part.style);
    return [plainText(part.text, part.style, to(x, line.baseline), width, { ...options, anchor: 'start' })];
  });
}

function plainText(text: string, style: TextStyle, [x, y]: Point, width: number, options: LineOptions): Primitive {
  const { view, anchor, turn, hollow } = options;
  return {
    kind: 'text',
    x,
    y,
    text,
    face: style.face,
    weight: style.weight,
    size: style.size * view.pixel,
    paint: style.ink,
    anchor,
    width: width * view.pixel,
    turn,
    ...(hollow ? { hollow } : {}),
  };
}

function lengthPrimitives(
  length: LengthLayout,
  style: TextStyle,
  [x, y]: Point,
  to: (x: number, y: number) => Point,
  options: LineOptions,
): Primitive[] {
  const start = { ...options, anchor: 'start' as const };
  const children = length.pieces.map((piece) =>
    plainText(piece.text, piece.style, to(x + piece.x, y + piece.y), textWidth(piece.text, piece.style), start),
  );
  if (length.bar) {
    const { bar } = length;
    const ink = length.pieces[0]!.style.ink;
    children.push({
      kind: 'path',
      path: boxPath(
        to(x + bar.x + bar.width / 2, y + bar.y),
        bar.width * options.view.pixel,
        bar.height * options.view.pixel,
        options.turn,
      ),
      fill: ink,
    });
  }
  if (!length.bar) return children;
  const [left, top] = to(x, y);
  const { pixel } = options.view;
  const { face, weight, size } = style;
  const place = { x: left, y: top, width: length.width * pixel, turn: options.turn, face, weight, size: size * pixel };
  return [{ kind: 'span', text: length.text, ...place, children }];
}

function groundPrimitives(
  place: TextPlace,
  block: TextBlock,
  style: TextStyle,
  to: (x: number, y: number) => Point,
  view: View,
): Primitive[] {
  if (!place.ground && !place.frame) return [];
  const [padX, padY] = PAD[place.frame ? 'frame' : 'ground'];
  const ascent = Math.max(block.ascent, capitalHeight(style));
  const descent = place.frame ? block.descent * 0.4 : block.descent;
  const width = block.width + 2 * padX;
  const height = ascent + block.drop + descent + 2 * padY;
  const centre = to(block.width * (0.5 - SHARE[place.anchor]), (block.drop + descent - ascent) / 2);
  const path = boxPath(centre, width * view.pixel, height * view.pixel, place.turn ?? 0);
  const fill: Ink | undefined = place.ground;
  const line = place.frame ? { paint: place.frame, width: FRAME_WIDTH * view.pixel } : undefined;
  return [{ kind: 'path', path, ...(fill ? { fill } : {}), ...(line ? { line } : {}) }];
}
