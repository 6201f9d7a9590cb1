import { layoutRuns } from '../run-layout';
import { SMALLEST, styles, type PageBuilder } from '../paper/page-builder';
import type { CutStep } from './cut-steps';

/** px: where the columns of the table begin, from its left edge. */
export interface TableColumns {
  readonly left: number;
  readonly width: number;
}

const DONE_AT = 48;
const DO_AT = 98;
/** Share of what is left of the tick box that tells how to set the saw. */
const SET_SHARE = 0.37;
const HEAD_HEIGHT = 30;
/** Room above and below the text of a row, and the least height of one: roomy, and where that saves a page, tight. */
const ROW = { roomy: { pad: 8, least: 39 }, tight: { pad: 4.5, least: 33 } } as const;

export type RowRoom = keyof typeof ROW;
const TICK = 27;

export interface MeasuredStep {
  readonly step: CutStep;
  readonly height: number;
}

/** Heights of the rows in a table of this width, px. */
export function measureSteps(steps: readonly CutStep[], columns: TableColumns, room: RowRoom): MeasuredStep[] {
  const { pad, least } = ROW[room];
  const { doWidth, setWidth } = widths(columns);
  return steps.map((step) => {
    const left = layoutRuns(step.doThis, styles.body, doWidth, SMALLEST);
    const right = step.set.map((runs) => layoutRuns(runs, styles.body, setWidth, SMALLEST));
    const leftHeight = left.ascent + left.drop + left.descent;
    const rightHeight = right.reduce((sum, block) => sum + block.ascent + block.drop + block.descent + 4, -4);
    return { step, height: Math.max(least, Math.max(leftHeight, rightHeight) + 2 * pad) };
  });
}

/** Height of the table with these rows, px. */
export const tableHeight = (rows: readonly MeasuredStep[]): number =>
  HEAD_HEIGHT + rows.reduce((sum, row) => sum + row.height, 0);

/** How many of the rows fit in so many px. */
export function rowsThatFit(rows: readonly MeasuredStep[], room: number): number {
  let height = HEAD_HEIGHT;
  let count = 0;
  while (count < rows.length && height + rows[count]!.height <= room) height += rows[count++]!.height;
  return count;
}

/** Draws the rows with a tick box each; `top` px from the page's top. */
export function addTable(page: PageBuilder, rows: readonly MeasuredStep[], columns: TableColumns, top: number): void {
  const { left, width } = columns;
  const { setAt } = widths(columns);
  const head = { id: 'table head' };
  page.text(left + 8, top + 20, 'Cut', styles.label, head);
  page.text(left + DONE_AT, top + 20, 'Done', styles.label, head);
  page.text(left + DO_AT, top + 20, 'Do this', styles.label, head);
  page.text(left + setAt, top + 20, 'Set', styles.label, head);
  page.line(left, top + HEAD_HEIGHT, left + width, top + HEAD_HEIGHT, 1.5);
  let y = top + HEAD_HEIGHT;
  for (const row of rows) {
    addRow(page, row, columns, y);
    y += row.height;
    page.line(left, y, left + width, y, 1);
  }
}

function addRow(page: PageBuilder, { step, height }: MeasuredStep, columns: TableColumns, top: number): void {
  const { left } = columns;
  const { doWidth, setWidth, setAt } = widths(columns);
  const middle = top + height / 2;
  const id = step.n === null ? `step at ${Math.round(top)}` : `step ${step.n}`;
  const tick = page.at(left + DONE_AT + TICK / 2 + 2, middle);
  page.add({ kind: 'mark', layer: 'frame', at: tick, mark: 'tickBox', size: TICK, ink: 'ink' });
  if (step.n !== null) {
    const style = { face: 'label', weight: 'extrabold', size: 28, ink: 'ink' } as const;
    page.text(left + 20, middle, String(step.n), style, { id, anchor: 'middle', middle: true });
  }
  const doBlock = layoutRuns(step.doThis, styles.body, doWidth, SMALLEST);
  page.runs(left + DO_AT, centred(middle, [doBlock]), step.doThis, styles.body, doWidth, { id });
  const setBlocks = step.set.map((runs) => layoutRuns(runs, styles.body, setWidth, SMALLEST));
  let y = centred(middle, setBlocks);
  step.set.forEach((runs, i) => {
    page.runs(left + setAt, y, runs, styles.body, setWidth, { id });
    const next = setBlocks[i + 1];
    y += setBlocks[i]!.drop + setBlocks[i]!.descent + 4 + (next?.ascent ?? 0);
  });
}

interface BlockSize {
  readonly ascent: number;
  readonly drop: number;
  readonly descent: number;
}

/** First baseline of blocks under each other whose middle lies at `middle`, px. */
function centred(middle: number, blocks: readonly BlockSize[]): number {
  const height = blocks.reduce((sum, b) => sum + b.ascent + b.drop + b.descent + 4, -4);
  return middle - height / 2 + (blocks[0]?.ascent ?? 0) + 1;
}

function widths({ width }: TableColumns): {
  readonly doWidth: number;
  readonly setWidth: number;
  readonly setAt: number;
} {
  const setWidth = Math.max(180, (width - DO_AT) * SET_SHARE);
  return { setWidth: setWidth - 6, setAt: width - setWidth, doWidth: width - setWidth - DO_AT - 14 };
}
