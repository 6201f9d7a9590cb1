import type { RowSizes } from './row-sizes';
import type { SectionValues } from './section-values';

/** Cells of the length tables: fine enough that rounding down hardly loosens a bound. */
export const CELLS = 2048;

/**
 * What is still to be had from a row: `most(j, room, odd)` bounds what items j, j+1 … of the order and one section can add
 * in so much room, when the row so far has an even or odd number of steep ends. Sizes are rounded down to cells and room up,
 * so the bound holds.
 */
export interface RowTables {
  readonly order: readonly number[];
  most(j: number, room: number, odd: boolean): number;
}

export function createRowTables(sizes: RowSizes, sections: SectionValues, cell: number, kerf: number) {
  const width = CELLS + Math.ceil(Math.max(0, sizes.ends) / cell) + 4;
  /** By parity of the steep ends that are added: best value by place in the order and cells of room. */
  let tables = [new Float64Array(0), new Float64Array(0)] as const;

  function addItem(at: number, size: number, worth: number, flips: boolean): void {
    const step = Math.floor(size / cell);
    const [even, odd] = tables;
    for (let c = width - 1; c >= step; c--) {
      const from = at + c - step;
      const moreEven = (flips ? odd[from]! : even[from]!) + worth;
      const moreOdd = (flips ? even[from]! : odd[from]!) + worth;
      if (moreEven > even[at + c]!) even[at + c] = moreEven;
      if (moreOdd > odd[at + c]!) odd[at + c] = moreOdd;
    }
  }

  function most(j: number, room: number, isOdd: boolean): number {
    if (room < 0) return 0;
    const same = tables[isOdd ? 1 : 0][j * width + Math.min(width - 1, Math.floor(room / cell))]!;
    const less = room - sizes.oddCost;
    if (less < 0) return same > 0 ? same : 0;
    const other = tables[isOdd ? 0 : 1][j * width + Math.min(width - 1, Math.floor(less / cell))]!;
    return Math.max(same, other, 0);
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
    if (tables[0].length < (n + 1) * width)
      tables = [new Float64Array((n + 1) * width), new Float64Array((n + 1) * width)];
    tables[1].fill(-Infinity, n * width, (n + 1) * width);
    for (let c = 0; c < width; c++) tables[0][n * width + c] = sections.most((c + 1) * cell - kerf);
    for (let j = n - 1; j >= 0; j--) {
      const item = order[j]!;
      for (const table of tables) table.copyWithin(j * width, (j + 1) * width, (j + 2) * width);
      for (
        let k = Math.min(demand[item]!, Math.ceil(width / Math.max(1, Math.floor(sizes.size[item]! / cell))));
        k > 0;
        k--
      )
        addItem(j * width, sizes.size[item]!, value[item]!, sizes.odd[item]!);
    }
    return { order, most };
  };
}
