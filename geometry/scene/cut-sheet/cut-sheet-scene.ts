import type { Layout } from '../../core/layout';
import type { Plan } from '../../plan/types';
import type { DisplayStep } from '../../tape/format-length';
import type { Scene, TextRun } from '../display-list';
import { numberPages, type SheetNumbering, type UnnumberedPage } from '../paper/number-pages';
import { PageBuilder, styles } from '../paper/page-builder';
import { addHeading, footTop, HEAD_BOTTOM, MARGIN } from '../paper/sheet-frame';
import { PAPER_SIZE, type Paper, type SheetHead } from '../paper/sheet-head';
import { cutMarks } from '../slab/cut-marks';
import { keptOffcuts } from '../slab/offcut-labels';
import { placeSlab, type PlacedSlab } from '../slab/placed-slab';
import { cutCautions } from './cautions';
import { cutSteps, listed, type CutStep } from './cut-steps';
import { addTable, measureSteps, rowsThatFit, tableHeight, type MeasuredStep } from './cut-table';
import { mapLabels, MOST_ROWS, rowsOf, type MarkLabel } from './mark-labels';
import { addSide, sideHeight, type SideColumn } from './side-column';
import { BESIDE_SLAB, LABEL_ROW, SheetSlab } from './sheet-slab';

/**
 * The cut sheets of all slabs: a landscape page a slab, the table going on behind it where it is long. Marks from the
 * left end on both edges, on every side of a kerf that is a piece's end, each rounded once to the layout's step.
 *
 * @throws RangeError when the plan's nest names stock or pieces that the layout does not have
 */
export function cutSheetPages(
  plan: Plan,
  layout: Layout,
  head: SheetHead,
  paper: Paper,
  numbering?: SheetNumbering,
): Scene[] {
  return paperPages(plan, layout, head, paper, numbering).map(({ scene }) => scene);
}

/** The pages of one slab, numbered as in the whole set; `slabIndex` counts from 0. */
export function cutSheetScene(
  plan: Plan,
  layout: Layout,
  slabIndex: number,
  head: SheetHead,
  paper: Paper,
  numbering?: SheetNumbering,
): Scene[] {
  const pages = paperPages(plan, layout, head, paper, numbering);
  return pages.filter((page) => page.slab === slabIndex).map(({ scene }) => scene);
}

function paperPages(plan: Plan, layout: Layout, head: SheetHead, paper: Paper, numbering?: SheetNumbering) {
  const slabs = (plan.nest?.slabs ?? []).map((_, i) => placeSlab(plan, layout, i));
  const drafts = slabs.flatMap((slab) =>
    new CutSheet(slab, layout, head, paper).pages().map((page) => ({ slab: slab.index, ...page })),
  );
  const scenes = numberPages(drafts, head, numbering);
  return drafts.map(({ slab }, i) => ({ slab, scene: scenes[i]! }));
}

/** Shares of its true depth that the slab is drawn with, tried until table and cautions fit under it. */
const SCALES = [1, 0.92, 0.84, 0.76, 0.68];
/** px: highest drawing of a slab, room under the drawing, room between table and cautions. */
const TALLEST = 235;
const UNDER = 12;
const GUTTER = 22;
const SIDE_SHARE = 0.365;

/** Lays out the pages of one slab. */
class CutSheet {
  private readonly step: DisplayStep;
  private readonly title: string;
  private readonly page: PageBuilder;

  constructor(
    private readonly slab: PlacedSlab,
    private readonly layout: Layout,
    private readonly head: SheetHead,
    private readonly paper: Paper,
  ) {
    this.step = layout.step;
    this.title = `Cut sheet ${slab.index + 1}: ${slab.name}`;
    this.page = new PageBuilder(PAPER_SIZE[paper]);
  }

  pages(): UnnumberedPage[] {
    const { page, slab } = this;
    const { table, side } = this.columns();
    const cautions = cutCautions(slab, this.layout, this.head);
    const foot = footTop(page) - UNDER;
    const plans = SCALES.map((share) => this.drawing(share));
    const labelled = plans[0]!.labelled;
    const steps = cutSteps(slab, this.step, this.offcutLabels(), !labelled);
    const sideNeeds = sideHeight(side, cautions, slab);
    const fitting = (needs: number) => plans.find((plan) => plan.bottom + UNDER + needs <= foot);
    const both = (rows: readonly MeasuredStep[]) => fitting(Math.max(tableHeight(rows), sideNeeds));
    const [roomy, tight] = [measureSteps(steps, table, 'roomy'), measureSteps(steps, table, 'tight')];
    const rows = both(roomy) ? roomy : tight;
    const plan = both(rows) ?? fitting(sideNeeds) ?? plans.at(-1)!;
    const top = plan.bottom + UNDER;

    addHeading(page, this.title, this.about(), this.head, 'Slab not to scale.');
    new SheetSlab(page, slab, plan.frame, this.step).draw(plan.top, plan.low);
    const room = foot - top;
    const whole = tableHeight(rows) <= room;
    const count = whole ? rows.length : rowsThatFit(rows, room - 24);
    addTable(page, rows.slice(0, count), table, top);
    if (!whole) page.text(table.left, foot - 4, 'The cuts go on over the page.', styles.strong, { id: 'more' });
    addSide(page, side, cautions, slab, top, foot);
    const first = { page, title: this.title, alt: this.alt() };
    return [first, ...this.continued(rows.slice(count).map((row) => row.step))];
  }

  private columns(): { readonly table: SideColumn; readonly side: SideColumn } {
    const width = this.page.width - 2 * MARGIN;
    const side = Math.round(width * SIDE_SHARE);
    return {
      table: { left: MARGIN, width: width - side - GUTTER },
      side: { left: this.page.width - MARGIN - side, width: side },
    };
  }

  /** The slab with a share of its depth, its labels placed. */
  private drawing(share: number) {
    const { slab, page } = this;
    const width = page.width - 2 * MARGIN - 28;
    const scale = Math.min(width / slab.length, TALLEST / slab.depth);
    const left = MARGIN + 14;
    const limits = [MARGIN, page.width - MARGIN] as const;
    const marks = cutMarks(slab);
    const place = (edge: 'top' | 'bottom') =>
      mapLabels(marks.filter((m) => m.edge === edge), this.step, (m) => left + m.at * scale, limits); // prettier-ignore
    const [top, low] = [place('top'), place('bottom')];
    const labelled = Math.max(rowsOf(top), rowsOf(low)) <= MOST_ROWS;
    const shown = (labels: MarkLabel[]) => (labelled ? labels : []);
    const above = BESIDE_SLAB + rowsOf(shown(top)) * LABEL_ROW;
    const below = BESIDE_SLAB + rowsOf(shown(low)) * LABEL_ROW;
    const scaleAcross = share * scale;
    const frame = { left, top: HEAD_BOTTOM + above, scale, scaleAcross };
    return { labelled, frame, top: shown(top), low: shown(low), bottom: frame.top + slab.depth * scaleAcross + below };
  }

  /** Pages with the rest of the table, as wide as the page. */
  private continued(steps: readonly CutStep[]): UnnumberedPage[] {
    if (steps.length === 0) return [];
    const page = new PageBuilder(PAPER_SIZE[this.paper]);
    const title = `${this.title}, continued`;
    addHeading(page, title, [{ text: 'Do these after the cuts of the page before. Never turn the slab.' }], this.head, ''); // prettier-ignore
    const columns = { left: MARGIN, width: page.width - 2 * MARGIN };
    const rows = measureSteps(steps, columns, 'roomy');
    const room = footTop(page) - UNDER - HEAD_BOTTOM - 16;
    const count = Math.max(1, rowsThatFit(rows, room));
    addTable(page, rows.slice(0, count), columns, HEAD_BOTTOM + 16);
    return [{ page, title, alt: `${title}: the rest of the table.` }, ...this.continued(steps.slice(count))];
  }

  private about(): TextRun[] {
    const { slab, step } = this;
    const species = slab.species.charAt(0).toUpperCase() + slab.species.slice(1);
    const number = { step, style: { ...styles.body, size: 17 } };
    return [
      { text: `${species}, ` },
      { inches: slab.depth, ...number },
      { text: ' × ' },
      { inches: slab.length, ...number, unit: true },
      { text: ', ' },
      { inches: slab.thickness, ...number },
      { text: ` thick, ${slab.bothFaces ? 'both faces good' : 'one good face'}. All marks from the left end.` },
    ];
  }

  private offcutLabels(): string[] {
    return keptOffcuts(this.slab, this.head.jobNumber).map(({ label }) => label);
  }

  private alt(): string {
    const { slab } = this;
    const faces = slab.pieces.map((piece) => `${piece.letter} face ${piece.faceDown ? 'down' : 'up'}`);
    return `${this.title} drawn with ${slab.cuts.length} cuts: from the left ${listed(faces)}.`;
  }
}
