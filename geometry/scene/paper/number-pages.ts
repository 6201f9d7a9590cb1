import type { Scene } from '../display-list';
import type { PageBuilder } from './page-builder';
import { addDraft, addFoot } from './sheet-frame';
import type { SheetHead } from './sheet-head';

/** Where these sheets stand in a larger set: sheets before them, and of how many; by themselves when left out. */
export interface SheetNumbering {
  readonly before: number;
  readonly of: number;
}

/** A page before it is known how many there are. */
export interface UnnumberedPage {
  readonly page: PageBuilder;
  readonly title: string;
  readonly alt: string;
}

/** Feet with "sheet x of y" under the pages, and DRAFT across them where the work is unsigned. */
export function numberPages(
  pages: readonly UnnumberedPage[],
  head: SheetHead,
  { before, of }: SheetNumbering = { before: 0, of: pages.length },
): Scene[] {
  return pages.map(({ page, title, alt }, i) => {
    addFoot(page, head, before + i + 1, of);
    if (head.draft) addDraft(page);
    return page.scene(title, alt);
  });
}
