import type { RowSizes } from './row-sizes';
import type { SectionValues } from './section-values';

/** Cells of the length tables: fine enough that rounding down hardly loosens a bound. */
export const CELLS = 2048;

/**
 * What is still to be had from a row: `most(j, room)` bounds what items j, j+1 … of the order and one section can add in
 * so much room. Sizes are rounded down to cells and room up, so the bound holds.
 */
export interface RowTables {
  readonly order: readonly number[];
  most(j: number, room: number): number;
}

export function createRowTables(sizes: RowSizes, sections: SectionValues, cell: number, kerf: number) {
  const width = CELLS + Math.ceil(Math.max(0, sizes.ends) / cell) + 4;
  let table = new Float64Array(0);

  function addItem(at: number, size: number, worth: number, copies: number): void {
    const step = Math.floor(size / cell);
    table.copyWithin(at, at + width, at + 2 * width);
    for (let k = Math.min(copies, Math.ceil(width / Math.max(1, step))); k > 0; k--)
      for (let c = width - 1; c >= step; c--) {
        const more = table[at + c - step]! + worth;
        if (more > table[at + c]!) table[at + c] = more;
      }
  }

  /** Items worth nothing can be left out when only the best rows are wanted, never when all rows are. */
  return function fill(
    items: readonly number[],
    value: readonly number[],
    demand: readonly number[],
    withWorthless: boolean,
  ): RowTables {
    const order = items
      .filter((i) => (withWorthless || value[i]! > 0) && demand[i]! > 0)
      .sort((a, b) => value[b]! / sizes.size[b]! - value[a]! / sizes.size[a]! || a - b);
    const n = order.length;
    if (table.length < (n + 1) * width) table = new Float64Array((n + 1) * width);
    for (let c = 0; c < width; c++) table[n * width + c] = sections.most((c + 1) * cell - kerf);
    for (let j = n - 1; j >= 0; j--) addItem(j * width, sizes.size[order[j]!]!, value[order[j]!]!, demand[order[j]!]!);
    return {
      order,
      most: (j, room) => (room < 0 ? 0 : table[j * width + Math.min(width - 1, Math.floor(room / cell))]!),
    };
  };
}
