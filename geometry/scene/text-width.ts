import type { Face, TextStyle } from './display-list';
import { CHARACTERS, FONT_WIDTHS } from './font-widths';

/** Height of capitals and figures, as a share of the text size. */
const CAPITALS: Readonly<Record<Face, number>> = { label: 0.7, body: 0.668 };

/** What hangs below the baseline, as a share of the text size. */
const TAIL = 0.22;

/** Thousandths for a character that no table knows. */
const UNKNOWN = 600;

const PLACES: ReadonlyMap<string, number> = new Map([...CHARACTERS].map((c, i) => [c, i]));

/**
 * How wide a line of text is, without kerning, so a hair more than it is painted.
 *
 * @returns px, in the unit of `style.size`
 */
export function textWidth(text: string, style: Pick<TextStyle, 'face' | 'weight' | 'size'>): number {
  const table = FONT_WIDTHS[fontOf(style)];
  let thousandths = 0;
  for (const c of text) thousandths += table[PLACES.get(c) ?? -1] ?? UNKNOWN;
  return (thousandths * style.size) / 1000;
}

export type FontName = keyof typeof FONT_WIDTHS;

/** The font that paints a style; the reading face comes in two weights, the label face in three. */
export function fontOf({ face, weight }: Pick<TextStyle, 'face' | 'weight'>): FontName {
  if (face === 'body') return weight === 'regular' ? 'bodyRegular' : 'bodyBold';
  if (weight === 'extrabold') return 'labelExtrabold';
  return weight === 'bold' ? 'labelBold' : 'labelSemibold';
}

/** Height of capitals, px. */
export const capitalHeight = ({ face, size }: Pick<TextStyle, 'face' | 'size'>): number => CAPITALS[face] * size;

/** What hangs below the baseline, px. */
export const tailHeight = ({ size }: Pick<TextStyle, 'size'>): number => TAIL * size;
