import type { Stock } from '../model/problem';
import { movedEnds } from '../row/row-gaps';
import type { DepthRows } from '../row/depth-rows';
import type { Pattern, Section, Slot } from '../plan/pattern';

/** A slab without defects: the items in their best order, with the section at the end that is nearer to square. */
export function makePattern(stock: Stock, rows: DepthRows, items: readonly number[], section: Section | null): Pattern {
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
