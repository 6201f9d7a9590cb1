import type { Problem, Stock } from '../model/problem';
import { movedEnds } from '../row/row-gaps';
import type { DepthRows } from '../row/depth-rows';
import { fitRoundDefects } from '../row/round-defects';
import type { Pattern, Section, Slot } from '../plan/pattern';

/**
 * The items in their best order, with the section at the end that is nearer to square; on a slab with defects, in an order
 * that goes round them, or null when none is found.
 */
export function makePattern(
  problem: Problem,
  stock: Stock,
  rows: DepthRows,
  items: readonly number[],
  section: Section | null,
): Pattern | null {
  if (stock.slab.defects?.length) {
    const fit = fitRoundDefects(problem, stock, rows, items, section);
    return fit.kind === 'fits' ? { stock: stock.index, slots: fit.slots } : null;
  }
  const entries: Slot[] = rows.arrange(items);
  if (!section) return { stock: stock.index, slots: entries };
  const ends = entries.map((slot) => ('item' in slot ? movedEnds(rows.shapes[slot.item]!, slot.move) : [0, 0]));
  const first = Math.abs(ends[0]?.[0] ?? 0);
  const last = Math.abs(ends[ends.length - 1]?.[1] ?? 0);
  return { stock: stock.index, slots: last <= first ? [...entries, section] : [section, ...entries] };
}

/** Longest section that still fits beside these items on a slab without defects; negative when the items alone do not fit. */
export function lengthLeft(stock: Stock, rows: DepthRows, items: readonly number[], kerf: number): number {
  return stock.usable - (items.length > 0 ? rows.length(items) + kerf : 0);
}
