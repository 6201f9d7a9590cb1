import { customerPages } from './customer/customer-pages';
import { cutSheetPages } from './cut-sheet/cut-sheet-scene';
import { jointPages } from './joint-sheet/joint-pages';
import type { Scene } from './display-list';
import { finishPages } from './finish-sheet/finish-pages';
import { fitPages } from './fit-sheet/fit-pages';
import { labelPages } from './labels/label-pages';
import { orderPages } from './order-sheet/order-pages';
import type { SheetPages, SheetRequest } from './paper/sheet-request';
import { templatePages } from './templates/template-pages';

/** A kind of sheet: what it is called, for whom, and how its pages are made. */
export interface SheetKindEntry {
  /** "Cut sheet" */
  readonly name: string;
  /** Who works from it. */
  readonly reader: string;
  /** It says nothing while the pieces are not on slabs. */
  readonly needsSlabs: boolean;
  readonly pages: SheetPages;
}

/** Every kind of sheet, in the order of a whole set. A new one is a file with its pages and a line here. */
export const SHEETS = {
  cut: {
    name: 'Cut sheet',
    reader: 'for the saw',
    needsSlabs: true,
    pages: ({ plan, layout, head, paper, numbering }) => cutSheetPages(plan, layout, head, paper, numbering),
  },
  joint: { name: 'Joint sheet', reader: 'for the bench', needsSlabs: false, pages: jointPages },
  fit: { name: 'Fit sheet', reader: 'for the house', needsSlabs: false, pages: fitPages },
  order: { name: 'Order sheet', reader: 'for the buyer', needsSlabs: false, pages: orderPages },
  finish: { name: 'Finish sheet', reader: 'for the finishing bench', needsSlabs: false, pages: finishPages },
  templates: { name: 'Template', reader: 'for the bench, at full size', needsSlabs: false, pages: templatePages },
  labels: { name: 'Label', reader: 'for pieces and offcuts', needsSlabs: false, pages: labelPages },
  customer: { name: 'Customer page', reader: 'for the customer', needsSlabs: false, pages: customerPages },
} as const satisfies Readonly<Record<string, SheetKindEntry>>;

export type SheetKind = keyof typeof SHEETS;

export const SHEET_KINDS = Object.keys(SHEETS) as SheetKind[];

export const sheetEntry = (kind: SheetKind): SheetKindEntry => SHEETS[kind];

/**
 * Sheets of several kinds as one set, numbered through. Kinds that need slabs are left out while there are none.
 *
 * @throws RangeError when the plan's nest names stock or pieces that the layout does not have
 */
export function sheetSet(kinds: readonly SheetKind[], request: SheetRequest): readonly Scene[] {
  const nested = (request.plan.nest?.slabs.length ?? 0) > 0;
  const entries = kinds.map(sheetEntry).filter((entry) => nested || !entry.needsSlabs);
  const counts = entries.map((entry) => entry.pages(request).length);
  const of = counts.reduce((sum, count) => sum + count, 0);
  let before = 0;
  return entries.flatMap((entry, i) => {
    const pages = entry.pages({ ...request, numbering: { before, of } });
    before += counts[i]!;
    return pages;
  });
}
