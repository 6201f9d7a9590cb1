import { orderList, orderTotalCents, ORDER_GROUPS, type OrderGroup, type OrderLine } from '../../plan/order-list';
import type { TextStyle } from '../display-list';
import { numberPages, type UnnumberedPage } from '../paper/number-pages';
import { fitText, PageBuilder, styles } from '../paper/page-builder';
import { addHeading, footTop, HEAD_BOTTOM, MARGIN } from '../paper/sheet-frame';
import { PAPER_SIZE, type Paper, type SheetHead } from '../paper/sheet-head';
import type { SheetPages } from '../paper/sheet-request';
import { moneyWords, quantityWords } from './order-words';

/** px */
const ROW = 24;
const GROUP_ROW = 31;
const HEADER_ROW = 26;
const NOTES = 66;
const TICK = 17;

/** Shares of the table's width where the columns begin. */
const COLUMNS = { tick: 0, quantity: 0.035, item: 0.12, size: 0.38, note: 0.55, each: 0.9, sum: 1 } as const;

type Row =
  | { readonly kind: 'group'; readonly group: OrderGroup }
  | { readonly kind: 'line'; readonly line: OrderLine }
  | { readonly kind: 'total'; readonly cents: number };

/** All that has to be bought or taken along, a box to tick before each; money only for those who may see it. */
export const orderPages: SheetPages = ({ plan, layout, settings, head, paper, prices = false, numbering }) => {
  if (plan.pieces.length === 0) return [];
  const lines = orderList(plan, layout, settings);
  const rows = rowsOf(lines, prices);
  const pages = chunks(rows, paper).map((part, index) => drawPage(part, { index, head, paper, prices, nested: plan.nest !== null })); // prettier-ignore
  return numberPages(pages, head, numbering);
};

function rowsOf(lines: readonly OrderLine[], prices: boolean): Row[] {
  const rows = ORDER_GROUPS.flatMap((group): Row[] => {
    const own = lines.filter((line) => line.group === group);
    return own.length > 0 ? [{ kind: 'group', group }, ...own.map((line): Row => ({ kind: 'line', line }))] : [];
  });
  return prices ? [...rows, { kind: 'total', cents: orderTotalCents(lines) }] : rows;
}

const heightOf = (row: Row): number => (row.kind === 'line' ? ROW : GROUP_ROW);

/** Rows page by page; no group's name is left alone at a page's foot. */
function chunks(rows: readonly Row[], paper: Paper): Row[][] {
  const page = new PageBuilder(PAPER_SIZE[paper]);
  const room = footTop(page) - NOTES - HEAD_BOTTOM - HEADER_ROW - 12;
  const pages: Row[][] = [[]];
  let used = 0;
  rows.forEach((row, i) => {
    const next = row.kind === 'group' ? heightOf(rows[i + 1] ?? row) : 0;
    if (used + heightOf(row) + next > room) {
      pages.push([]);
      used = 0;
    }
    pages.at(-1)!.push(row);
    used += heightOf(row);
  });
  return pages;
}

interface PageFacts {
  readonly index: number;
  readonly head: SheetHead;
  readonly paper: Paper;
  readonly prices: boolean;
  readonly nested: boolean;
}

function drawPage(rows: readonly Row[], { index, head, paper, prices, nested }: PageFacts): UnnumberedPage {
  const page = new PageBuilder(PAPER_SIZE[paper]);
  const title = index === 0 ? 'Order sheet' : 'Order sheet, continued';
  const about = nested
    ? 'Quantities from the plan of this revision. Tick what is here.'
    : 'No slab plan yet: slabs are not in this list. Tick what is here.';
  addHeading(page, title, [{ text: about }], head, '');
  const table = new OrderTable(page, prices);
  let y = table.header(HEAD_BOTTOM + 8);
  for (const row of rows) {
    table.row(row, y);
    y += heightOf(row);
  }
  addNotes(page);
  const items = rows.flatMap((row) => (row.kind === 'line' ? [`${quantityWords(row.line)} ${row.line.item}`] : []));
  return { page, title, alt: `${title}: ${items.join('; ')}.` };
}

function addNotes(page: PageBuilder): void {
  const words =
    'Glue, finish and discs hold a tenth to spare; screws and connectors are exact, so buy a box more. Look slabs over for twist and checks before they are unloaded. Rags with oil or hard wax heat up by themselves: order a lidded metal can.';
  page.runs(MARGIN, footTop(page) - NOTES + 22, [{ text: words }], styles.body, page.width - 2 * MARGIN, {
    id: 'notes',
  });
}

class OrderTable {
  private readonly width: number;

  constructor(
    private readonly page: PageBuilder,
    private readonly prices: boolean,
  ) {
    this.width = page.width - 2 * MARGIN;
  }

  /** @returns px below the header */
  header(top: number): number {
    const y = top + 18;
    this.cell('Quantity', 'quantity', 'item', y, styles.label, 'header');
    this.cell('What', 'item', 'size', y, styles.label, 'header');
    this.cell('Size', 'size', 'note', y, styles.label, 'header');
    this.cell('For', 'note', this.prices ? 'each' : 'sum', y, styles.label, 'header');
    if (this.prices) {
      this.amount('Each', 'each', y, styles.label, 'header');
      this.amount('Sum', 'sum', y, styles.label, 'header');
    }
    this.page.line(MARGIN, top + HEADER_ROW, MARGIN + this.width, top + HEADER_ROW, 2);
    return top + HEADER_ROW;
  }

  row(row: Row, top: number): void {
    const { page } = this;
    if (row.kind === 'group') {
      page.text(MARGIN, top + 23, row.group, styles.heading, { id: `group ${row.group}` });
      page.line(MARGIN, top + GROUP_ROW - 2, MARGIN + this.width, top + GROUP_ROW - 2, 1);
      return;
    }
    if (row.kind === 'total') {
      page.line(MARGIN + this.width * 0.62, top + 6, MARGIN + this.width, top + 6, 2);
      page.text(MARGIN + this.width * COLUMNS.note, top + 27, 'All with a price', styles.strong, { id: 'total' });
      this.amount(moneyWords(row.cents), 'sum', top + 27, styles.strong, 'total');
      return;
    }
    this.line(row.line, top);
  }

  private line(line: OrderLine, top: number): void {
    const { page } = this;
    const y = top + 17;
    const id = `line ${line.group} ${line.item}`;
    const tick = page.at(MARGIN + TICK / 2 + 2, top + ROW / 2);
    page.add({ kind: 'mark', layer: 'frame', at: tick, mark: 'tickBox', size: TICK, ink: 'ink' });
    this.cell(quantityWords(line), 'quantity', 'item', y, styles.strong, id);
    this.cell(line.item, 'item', 'size', y, styles.body, id);
    this.cell(line.size, 'size', 'note', y, styles.body, id);
    this.cell(line.note, 'note', this.prices ? 'each' : 'sum', y, styles.body, id, this.prices ? 78 : 0);
    if (this.prices && line.eachCents !== null) {
      this.amount(moneyWords(line.eachCents), 'each', y, styles.body, id);
      this.amount(moneyWords(line.eachCents * line.quantity), 'sum', y, styles.body, id);
    }
    page.line(MARGIN, top + ROW, MARGIN + this.width, top + ROW, 0.5);
  }

  /** Text from one column to the next, smaller or shortened where it has to be; `less` px are kept free at its end. */
  private cell(text: string, from: Column, to: Column, y: number, style: TextStyle, id: string, less = 0): void {
    const left = MARGIN + COLUMNS[from] * this.width;
    const fitted = fitText(text, style, (COLUMNS[to] - COLUMNS[from]) * this.width - 12 - less);
    this.page.text(left, y, fitted.text, fitted.style, { id });
  }

  private amount(text: string, column: Column, y: number, style: TextStyle, id: string): void {
    this.page.text(MARGIN + COLUMNS[column] * this.width, y, text, style, { id, anchor: 'end' });
  }
}

type Column = keyof typeof COLUMNS;
