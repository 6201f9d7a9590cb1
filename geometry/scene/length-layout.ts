import { formatLength, splitLength, type DisplayStep } from '../tape/format-length';
import type { TextStyle } from './display-list';
import { capitalHeight, textWidth } from './text-width';

/** Share of the whole number's size that its fraction has, before the smallest size allowed. */
const FRACTION = 0.66;
const UNIT = 0.7;

export interface LengthPiece {
  readonly text: string;
  /** Left end of the baseline, px, x to the right and y down from the start of the length's baseline. */
  readonly x: number;
  readonly y: number;
  readonly style: TextStyle;
}

/** A length with its fraction stacked, laid out in px from the left end of its baseline, y down. */
export interface LengthLayout {
  readonly width: number;
  /** Height above and depth below the baseline. */
  readonly ascent: number;
  readonly descent: number;
  readonly pieces: readonly LengthPiece[];
  readonly bar: { readonly x: number; readonly y: number; readonly width: number; readonly height: number } | null;
  /** The same as plain text: "59 11/16". */
  readonly text: string;
}

/**
 * Stacks the fraction of a length, rounded to the step.
 *
 * @param inches - finite
 * @param unit - whether the unit stands behind it, small
 * @param smallest - px; no figure of the fraction is smaller
 */
export function layoutLength(
  inches: number,
  step: DisplayStep,
  style: TextStyle,
  unit: boolean,
  smallest: number,
): LengthLayout {
  const split = splitLength(inches, step);
  const plain = formatLength(inches, step).replace(/ mm$/, '');
  const text = unit ? `${plain} ${split.unit}` : plain;
  const metric = split.unit === 'mm';
  const stacked = split.numerator > 0 && !metric;
  const whole = metric ? plain : wholeText(split.negative, split.whole, stacked);
  const laid = new Line(style);
  if (whole) laid.add(whole, style, 0);
  const bar = stacked ? laid.addFraction(String(split.numerator), String(split.denominator), smallest) : null;
  if (unit) laid.add(split.unit, { ...style, weight: 'regular', size: Math.max(style.size * UNIT, smallest) }, 0.16);
  return { width: laid.x, ascent: laid.ascent, descent: laid.descent, pieces: laid.pieces, bar, text };
}

function wholeText(negative: boolean, whole: number, stacked: boolean): string {
  const sign = negative ? '-' : '';
  return whole === 0 && stacked ? sign : `${sign}${whole}`;
}

/** Grows to the right; gaps are shares of the whole number's size. */
class Line {
  x = 0;
  ascent: number;
  descent = 0;
  readonly pieces: LengthPiece[] = [];

  constructor(private readonly style: TextStyle) {
    this.ascent = capitalHeight(style);
  }

  add(text: string, style: TextStyle, gap: number): void {
    if (this.pieces.length > 0) this.x += gap * this.style.size;
    this.pieces.push({ text, x: this.x, y: 0, style });
    this.x += textWidth(text, style);
  }

  addFraction(top: string, bottom: string, smallest: number): LengthLayout['bar'] {
    const style = { ...this.style, size: Math.max(this.style.size * FRACTION, smallest) };
    if (this.pieces.length > 0) this.x += 0.1 * this.style.size;
    const widths = [textWidth(top, style), textWidth(bottom, style)] as const;
    const width = Math.max(...widths);
    const height = Math.max(style.size * 0.085, 1);
    const gap = height / 2 + style.size * 0.14;
    const middle = -capitalHeight(this.style) / 2;
    this.pieces.push({ text: top, x: this.x + (width - widths[0]) / 2, y: middle - gap, style });
    this.pieces.push({
      text: bottom,
      x: this.x + (width - widths[1]) / 2,
      y: middle + gap + capitalHeight(style),
      style,
    });
    const bar = { x: this.x, y: middle, width, height };
    this.ascent = Math.max(this.ascent, gap - middle + capitalHeight(style));
    this.descent = Math.max(this.descent, middle + gap + capitalHeight(style));
    this.x += width;
    return bar;
  }
}
