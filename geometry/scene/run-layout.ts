import type { TextRun, TextStyle } from './display-list';
import { layoutLength, type LengthLayout } from './length-layout';
import { capitalHeight, tailHeight, textWidth } from './text-width';

/** Part of a laid line: plain text of one style, or a length. x from the line's left end, px. */
export type LinePart =
  | { readonly kind: 'text'; readonly x: number; readonly text: string; readonly style: TextStyle }
  | { readonly kind: 'length'; readonly x: number; readonly length: LengthLayout; readonly style: TextStyle };

export interface TextLine {
  readonly parts: readonly LinePart[];
  readonly width: number;
  /** px from the first line's baseline down to this one's. */
  readonly baseline: number;
}

/** Mixed text in lines. px, y down, from the left end of the first baseline. */
export interface TextBlock {
  readonly lines: readonly TextLine[];
  readonly width: number;
  /** Height above the first baseline and depth below the last, tails of letters included. */
  readonly ascent: number;
  readonly descent: number;
  /** From the first baseline to the last. */
  readonly drop: number;
}

/** Share of the size from one baseline to the next where nothing needs more. */
const LEADING = 1.36;
/** px that are kept clear between the lowest fraction of a line and the highest of the next. */
const CLEAR = 3;

/**
 * Lays text and lengths in lines.
 *
 * @param wrap - px; lines break at spaces only, so a longer word makes a longer line
 * @param smallest - px; no figure of a fraction is smaller
 */
export function layoutRuns(
  runs: readonly TextRun[],
  style: TextStyle,
  wrap: number | undefined,
  smallest: number,
): TextBlock {
  const lines = breakLines(toWords(runs, style, smallest), wrap ?? Infinity);
  const laid: TextLine[] = [];
  let baseline = 0;
  let above: Word[] = [];
  for (const line of lines) {
    if (laid.length > 0) baseline += Math.max(style.size * LEADING, descentOf(above) + ascentOf(line) + CLEAR);
    laid.push(layLine(line, baseline));
    above = line;
  }
  return {
    lines: laid,
    width: Math.max(0, ...laid.map((line) => line.width)),
    ascent: ascentOf(lines[0] ?? []),
    descent: descentOf(above),
    drop: baseline,
  };
}

/** Atoms that no space parts; `space` is the room before it on a line. */
interface Word {
  readonly atoms: Atom[];
  readonly space: { readonly width: number; readonly style: TextStyle } | null;
}

type Atom =
  | { readonly kind: 'text'; readonly text: string; readonly style: TextStyle; readonly width: number }
  | { readonly kind: 'length'; readonly length: LengthLayout; readonly style: TextStyle; readonly width: number };

function toWords(runs: readonly TextRun[], base: TextStyle, smallest: number): Word[] {
  const words: Word[] = [];
  let space: Word['space'] = null;
  let open: Word | null = null;
  const push = (atom: Atom) => {
    if (!open) words.push((open = { atoms: [], space }));
    open.atoms.push(atom);
  };
  for (const run of runs) {
    const style = run.style ?? base;
    if ('inches' in run) {
      const length = layoutLength(run.inches, run.step, style, run.unit ?? false, smallest);
      push({ kind: 'length', length, style, width: length.width });
      continue;
    }
    for (const part of run.text.split(/( +)/)) {
      if (part === '') continue;
      if (!part.startsWith(' ')) {
        push({ kind: 'text', text: part, style, width: textWidth(part, style) });
        continue;
      }
      open = null;
      space = { width: textWidth(' ', style), style };
    }
  }
  return words;
}

function breakLines(words: readonly Word[], wrap: number): Word[][] {
  const lines: Word[][] = [];
  let width = 0;
  for (const word of words) {
    const own = word.atoms.reduce((sum, atom) => sum + atom.width, 0);
    const line = lines.at(-1);
    const room = word.space?.width ?? 0;
    if (line && width + room + own <= wrap) {
      line.push(word);
      width += room + own;
    } else {
      lines.push([word]);
      width = own;
    }
  }
  return lines;
}

/** Neighbouring texts of one style become one part, so that a painter and a reader of the paper get whole phrases. */
function layLine(words: readonly Word[], baseline: number): TextLine {
  const parts: LinePart[] = [];
  let x = 0;
  const addText = (text: string, style: TextStyle, width: number) => {
    const last = parts.at(-1);
    if (last?.kind === 'text' && last.style === style) parts[parts.length - 1] = { ...last, text: last.text + text };
    else if (text !== ' ') parts.push({ kind: 'text', x, text, style });
    x += width;
  };
  words.forEach((word, i) => {
    if (i > 0 && word.space) addText(' ', word.space.style, word.space.width);
    for (const atom of word.atoms) {
      if (atom.kind === 'text') {
        addText(atom.text, atom.style, atom.width);
        continue;
      }
      parts.push({ kind: 'length', x, length: atom.length, style: atom.style });
      x += atom.width;
    }
  });
  return { parts, width: x, baseline };
}

function ascentOf(words: readonly Word[]): number {
  const heights = words.flatMap((word) =>
    word.atoms.map((atom) => (atom.kind === 'text' ? capitalHeight(atom.style) : atom.length.ascent)),
  );
  return Math.max(0, ...heights);
}

function descentOf(words: readonly Word[]): number {
  const depths = words.flatMap((word) =>
    word.atoms.map((atom) => (atom.kind === 'text' ? tailHeight(atom.style) : atom.length.descent)),
  );
  return Math.max(0, ...depths);
}
