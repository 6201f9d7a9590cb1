import type { MarkShape, TextRun } from '../display-list';
import { runsHeight, styles, type PageBuilder } from '../paper/page-builder';
import type { PlacedSlab } from '../slab/placed-slab';
import { isSquare } from '../slab/cut-marks';
import { textWidth } from '../text-width';

/** The column beside the table: cautions in a box, what the signs mean, who cut and who checked. */
export interface SideColumn {
  readonly left: number;
  readonly width: number;
}

const PAD = 16;
const TITLE = 34;
const BETWEEN = 7;
const LEGEND_ROW = 25;
const SIGN_HEIGHT = 50;

/** Height of the whole column, px. */
export const sideHeight = (column: SideColumn, cautions: readonly TextRun[][], slab: PlacedSlab): number =>
  boxHeight(column, cautions) + 12 + legendRows(column, slab).length * LEGEND_ROW + SIGN_HEIGHT;

function boxHeight({ width }: SideColumn, cautions: readonly TextRun[][]): number {
  const text = cautions.map((runs) => runsHeight(runs, styles.body, width - 2 * PAD).height + BETWEEN);
  return PAD + TITLE + text.reduce((a, b) => a + b, 0) + PAD / 2;
}

/** `top` and `bottom` px from the page's top; the signatures stand at the bottom. */
export function addSide(
  page: PageBuilder,
  column: SideColumn,
  cautions: readonly TextRun[][],
  slab: PlacedSlab,
  top: number,
  bottom: number,
): void {
  const { left, width } = column;
  const height = boxHeight(column, cautions);
  page.box(left, top, width, height, 2.4);
  page.add({
    kind: 'mark',
    layer: 'frame',
    at: page.at(left + PAD + 13, top + 26),
    mark: 'warn',
    size: 26,
    ink: 'ink',
  });
  page.text(left + PAD + 36, top + 33, 'Before you cut', { ...styles.heading, size: 22 }, { id: 'cautions' });
  let y = top + PAD + TITLE;
  cautions.forEach((runs, i) => {
    const { ascent, height: own } = runsHeight(runs, styles.body, width - 2 * PAD);
    page.runs(left + PAD, y + ascent, runs, styles.body, width - 2 * PAD, { id: `caution ${i + 1}` });
    y += own + BETWEEN;
  });
  addLegend(page, column, slab, top + height + 12);
  addSignatures(page, column, bottom);
}

interface LegendEntry {
  readonly words: string;
  readonly mark?: MarkShape;
  readonly pattern?: 'dots' | 'waste';
  readonly dashed?: true;
}

function legend(slab: PlacedSlab): LegendEntry[] {
  const angled = slab.cuts.some((cut) => cut.kind === 'crosscut' && !isSquare(cut));
  // Strips are too narrow for the words.
  const ripped = slab.cuts.some((cut) => cut.kind === 'rip');
  return [
    ...(angled
      ? ([
          { words: 'long point', mark: 'longPoint' },
          { words: 'short point', mark: 'shortPoint' },
        ] as const)
      : []),
    ...(ripped ? ([{ words: 'face up', mark: 'disc' }] as const) : []),
    ...(ripped && slab.pieces.some((p) => p.faceDown) ? ([{ words: 'face down', mark: 'square' }] as const) : []),
    ...(slab.pieces.some((p) => p.faceDown) ? ([{ words: 'show face under', pattern: 'dots' }] as const) : []),
    { words: 'waste', pattern: 'waste' },
    ...(slab.pieces.some((p) => p.cutouts.length > 0) ? ([{ words: 'cutout', dashed: true }] as const) : []),
  ];
}

const SWATCH = 30;
const STEP = 14;

const entryWidth = (entry: LegendEntry): number =>
  (entry.mark ? 22 : SWATCH) + 6 + textWidth(entry.words, styles.body) + STEP;

function legendRows(column: SideColumn, slab: PlacedSlab): LegendEntry[][] {
  const rows: LegendEntry[][] = [];
  let width = Infinity;
  for (const entry of legend(slab)) {
    const own = entryWidth(entry);
    if (width + own > column.width + STEP) {
      rows.push([]);
      width = 0;
    }
    rows.at(-1)!.push(entry);
    width += own;
  }
  return rows;
}

function addLegend(page: PageBuilder, column: SideColumn, slab: PlacedSlab, top: number): void {
  legendRows(column, slab).forEach((row, i) => {
    const y = top + i * LEGEND_ROW + 12;
    let x = column.left;
    for (const entry of row) {
      const sign = entry.mark ? 22 : SWATCH;
      addSign(page, entry, x, y);
      page.text(x + sign + 6, y + 5, entry.words, styles.body, { id: `legend ${entry.words}` });
      x += entryWidth(entry);
    }
  });
}

function addSign(page: PageBuilder, entry: LegendEntry, x: number, y: number): void {
  if (entry.mark) {
    page.add({ kind: 'mark', layer: 'frame', at: page.at(x + 10, y), mark: entry.mark, size: 18, ink: 'ink' });
    return;
  }
  const corners = [page.at(x, y + 8), page.at(x + SWATCH, y + 8), page.at(x + SWATCH, y - 8), page.at(x, y - 8)];
  if (entry.pattern) {
    page.add({ kind: 'hatch', layer: 'frame', outline: corners, pattern: entry.pattern, ink: 'ink' });
  }
  const dash = entry.dashed ? { dash: [5, 3] } : {};
  page.add({ kind: 'polygon', layer: 'frame', outline: corners, stroke: { ink: 'ink', width: 1.6, ...dash } });
}

function addSignatures(page: PageBuilder, { left, width }: SideColumn, bottom: number): void {
  const half = (width - 16) / 2;
  ['Cut by', 'Checked by'].forEach((words, i) => {
    const x = left + i * (half + 16);
    page.line(x, bottom - 24, x + half, bottom - 24, 1.2);
    page.text(x, bottom - 6, words, styles.body, { id: words });
  });
}
