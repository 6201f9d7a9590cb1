import type { DisplayStep } from '../../tape/format-length';
import { layoutLength } from '../length-layout';
import { SMALLEST, styles } from '../paper/page-builder';
import type { CutMark } from '../slab/cut-marks';
import { textWidth } from '../text-width';

/** A mark's label beside its place on the edge: px along the page. Row 0 stands next to the slab. */
export interface MarkLabel {
  readonly mark: CutMark;
  readonly name: string;
  readonly x: number;
  readonly left: number;
  readonly right: number;
  readonly anchor: 'start' | 'end';
  readonly row: number;
}

/** px between a mark and its label: the first that does, wide before narrow. */
const BESIDE = [20, 8];
/** px between labels. */
const APART = 12;
/** px kept clear on both sides of a leader. */
const LEADER = 3;
/** More rows than this leave no room for the slab. */
export const MOST_ROWS = 5;

/**
 * Places the labels of one edge in rows so that no label touches another; leaders run through a label only where there
 * is no other way (the label's ground then covers them).
 *
 * @param xOf - px of a mark
 * @param limits - px; labels stay between them
 */
export function mapLabels(
  marks: readonly CutMark[],
  step: DisplayStep,
  xOf: (mark: CutMark) => number,
  limits: readonly [number, number],
): MarkLabel[] {
  const rising = [...marks].sort((a, b) => a.at - b.at);
  const falling = [...rising].reverse();
  const outward = [...rising.filter((m) => m.side === 'left'), ...falling.filter((m) => m.side === 'right')];
  const tries = [rising, falling, outward, [...outward].reverse()].map((order) =>
    placeInOrder(order, step, xOf, limits),
  );
  return tries.reduce((best, next) => (cost(next) < cost(best) ? next : best));
}

function placeInOrder(
  marks: readonly CutMark[],
  step: DisplayStep,
  xOf: (mark: CutMark) => number,
  limits: readonly [number, number],
): MarkLabel[] {
  const placed: MarkLabel[] = [];
  for (const mark of marks) {
    const choices = BESIDE.flatMap((beside) => {
      const label = measureLabel(mark, step, xOf(mark), limits, beside);
      return Array.from({ length: marks.length + 1 }, (_, row): MarkLabel => ({ ...label, row }));
    }).filter((choice) => !placed.some((other) => touches(choice, other)));
    const loss = (choice: MarkLabel) => crossings(choice, placed) * 100 + choice.row;
    placed.push(choices.reduce((best, next) => (loss(next) < loss(best) ? next : best)));
  }
  return placed;
}

function measureLabel(
  mark: CutMark,
  step: DisplayStep,
  x: number,
  limits: readonly [number, number],
  beside: number,
): Omit<MarkLabel, 'row'> {
  const name = nameOf(mark);
  const number = layoutLength(mark.at, step, styles.mark, false, SMALLEST).width;
  const width = Math.max(textWidth(name, styles.label), number);
  // A left piece's label ends before the cut, a right piece's begins behind it; at the page's edge it moves inward.
  const wanted = mark.side === 'left' ? x - beside - width : x + (mark.word === 'trim' ? 8 : beside);
  const left = Math.min(Math.max(wanted, limits[0]), limits[1] - width);
  return { mark, name, x, left, right: left + width, anchor: mark.side === 'left' ? 'end' : 'start' };
}

function nameOf({ letter, word, cut }: CutMark): string {
  if (word === 'trim') return 'trim';
  return letter ? `${letter} ${word}` : `cut ${cut}`;
}

const touches = (a: MarkLabel, b: MarkLabel): boolean =>
  a.row === b.row && a.left < b.right + APART && b.left < a.right + APART;

function crossings(label: MarkLabel, others: readonly MarkLabel[]): number {
  return others.filter((other) => {
    if (label.row === other.row) return false;
    const [high, low] = label.row > other.row ? [label, other] : [other, label];
    return high.x + LEADER > low.left && high.x - LEADER < low.right;
  }).length;
}

function cost(labels: readonly MarkLabel[]): number {
  const crossed = labels.reduce((sum, label, i) => sum + crossings(label, labels.slice(0, i)), 0);
  return crossed * 100 + rowsOf(labels) * 10 + labels.reduce((sum, label) => sum + label.row, 0);
}

/** Rows that the labels take. */
export const rowsOf = (labels: readonly MarkLabel[]): number => Math.max(0, ...labels.map((label) => label.row + 1));
