import type { TextRun, TextStyle } from '../display-list';
import type { UnnumberedPage } from './number-pages';
import { PageBuilder, runsHeight, styles } from './page-builder';
import { addHeading, footTop, HEAD_BOTTOM, MARGIN } from './sheet-frame';
import { PAPER_SIZE, type Paper, type SheetHead } from './sheet-head';

/** px between the last thing on a page and its foot. */
const ABOVE_FOOT = 14;
const BETWEEN = 8;

export interface FlowColumn<Row> {
  readonly title: string;
  /** Share of the table's width. */
  readonly share: number;
  readonly cell: (row: Row) => readonly TextRun[];
  /** A box to tick stands before the text. */
  readonly tick?: boolean;
}

export interface FlowOptions {
  readonly title: string;
  /** One line under the title of the first page. */
  readonly about: readonly TextRun[];
  readonly alt: string;
  readonly head: SheetHead;
  readonly paper: Paper;
  readonly notToScale?: string;
}

/** Pages that fill from the top down: what does not fit goes on over the page, never through its foot. */
export class PageFlow {
  readonly pages: UnnumberedPage[] = [];
  page!: PageBuilder;
  /** px from the page's top to the next thing. */
  y = 0;
  readonly left = MARGIN;
  readonly width: number;
  private readonly foot: number;

  constructor(private readonly options: FlowOptions) {
    this.turnPage();
    this.width = this.page.width - 2 * MARGIN;
    this.foot = footTop(this.page) - ABOVE_FOOT;
  }

  /** px left on this page. */
  get room(): number {
    return this.foot - this.y;
  }

  turnPage(): void {
    const { title, about, alt, head, paper, notToScale = '' } = this.options;
    const first = this.pages.length === 0;
    this.page = new PageBuilder(PAPER_SIZE[paper]);
    const name = first ? title : `${title}, continued`;
    addHeading(this.page, name, first ? about : [{ text: 'Goes on from the page before.' }], head, notToScale);
    this.pages.push({ page: this.page, title: name, alt: first ? alt : `${name}.` });
    this.y = HEAD_BOTTOM + 10;
  }

  /** Turns the page where less than `px` is left; true when it did. */
  need(px: number): boolean {
    const turned = this.room < px && this.y > HEAD_BOTTOM + 10;
    if (turned) this.turnPage();
    return turned;
  }

  /** A heading that is not left alone at a page's foot: `with` px of what follows stay with it. */
  heading(text: string, keep = 60): void {
    this.need(30 + keep);
    this.y += 22;
    this.page.text(this.left, this.y, text, styles.heading, { id: `heading ${text}` });
    this.y += 12;
  }

  paragraph(runs: readonly TextRun[], options: { readonly style?: TextStyle; readonly indent?: number } = {}): void {
    const { style = styles.body, indent = 0 } = options;
    const wrap = this.width - indent;
    const { ascent, height } = runsHeight(runs, style, wrap);
    this.need(height);
    const id = `paragraph ${this.pages.length}.${Math.round(this.y)}`;
    this.page.runs(this.left + indent, this.y + ascent, runs, style, wrap, { id });
    this.y += height + BETWEEN;
  }

  /** A framed box with a warning sign: what can hurt somebody or spoil the work. */
  caution(title: string, paragraphs: readonly (readonly TextRun[])[]): void {
    if (paragraphs.length === 0) return;
    const pad = 14;
    const wrap = this.width - 2 * pad;
    const heights = paragraphs.map((runs) => runsHeight(runs, styles.body, wrap));
    const height = 42 + heights.reduce((sum, block) => sum + block.height + 6, 0) + pad;
    this.need(height);
    this.page.box(this.left, this.y, this.width, height, 2.4);
    const at = this.page.at(this.left + pad + 12, this.y + 24);
    this.page.add({ kind: 'mark', layer: 'frame', at, mark: 'warn', size: 24, ink: 'ink' });
    this.page.text(
      this.left + pad + 34,
      this.y + 31,
      title,
      { ...styles.heading, size: 22 },
      { id: `caution ${title}` },
    );
    let y = this.y + 42;
    paragraphs.forEach((runs, i) => {
      this.page.runs(this.left + pad, y + heights[i]!.ascent, runs, styles.body, wrap, { id: `caution ${title} ${i}` });
      y += heights[i]!.height + 6;
    });
    this.y += height + BETWEEN;
  }

  /** A ruled table; its head is repeated on every page it goes on to. */
  table<Row>(
    name: string,
    columns: readonly FlowColumn<Row>[],
    rows: readonly Row[],
    { left, width }: { readonly left: number; readonly width: number } = this,
  ): void {
    if (rows.length === 0) return;
    const starts = columns.map((_, i) => columns.slice(0, i).reduce((sum, column) => sum + column.share, 0) * width);
    const wraps = columns.map((column) => column.share * width - 10 - (column.tick ? TICK + 8 : 0));
    const head = () => {
      columns.forEach((column, i) =>
        this.page.text(left + starts[i]! + 4, this.y + 19, column.title, styles.label, { id: `${name} head` }),
      );
      this.y += 28;
      this.page.line(left, this.y, left + width, this.y, 1.5);
    };
    this.need(28 + 40);
    head();
    rows.forEach((row, n) => {
      const cells = columns.map((column) => column.cell(row));
      const blocks = cells.map((runs, i) => runsHeight(runs, styles.body, wraps[i]!));
      const height = Math.max(32, ...blocks.map((block) => block.height + 12));
      if (this.need(height)) head();
      columns.forEach((column, i) => {
        const x = left + starts[i]! + 4;
        const middle = this.y + height / 2;
        if (column.tick) {
          const at = this.page.at(x + TICK / 2, middle);
          this.page.add({ kind: 'mark', layer: 'frame', at, mark: 'tickBox', size: TICK, ink: 'ink' });
        }
        const { ascent, height: own } = blocks[i]!;
        const text = x + (column.tick ? TICK + 8 : 0);
        if (cells[i]!.length > 0)
          this.page.runs(text, middle - own / 2 + ascent, cells[i]!, styles.body, wraps[i]!, {
            id: `${name} ${n} ${i}`,
          });
      });
      this.y += height;
      this.page.line(left, this.y, left + width, this.y, 1);
    });
    this.y += BETWEEN;
  }

  /** Lines for names at the foot of the last page. */
  signatures(names: readonly string[]): void {
    this.need(56);
    const each = (this.width - 24 * (names.length - 1)) / names.length;
    names.forEach((name, i) => {
      const x = this.left + i * (each + 24);
      this.page.line(x, this.foot - 22, x + each, this.foot - 22, 1);
      this.page.text(x, this.foot - 3, name, { ...styles.body, size: 15 }, { id: `sign ${name}` });
    });
    this.y = this.foot;
  }
}

const TICK = 20;
