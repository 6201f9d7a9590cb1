import type { Problem, Stock } from '../model/problem';
import { FIT } from '../model/tolerance';
import type { DepthRows } from '../row/depth-rows';
import { rowSizes } from './row-sizes';
import { CELLS, createRowTables } from './row-tables';
import { searchRows, type RowCandidate, type RowQuery } from './search-rows';
import { createSectionValues, type SectionValues } from './section-values';

export interface StockBest {
  /** No pattern of the class on this slab is worth more. */
  readonly bound: number;
  /** The best rows met, best first. */
  readonly rows: readonly RowCandidate[];
}

/** Finds the most valuable patterns on every slab of one depth. */
export interface DepthPricing {
  readonly stock: readonly Stock[];
  readonly rows: DepthRows;
  readonly sections: SectionValues;
  /** The best rows for each slab, `keep` of them, that are worth more than a pattern known already (by stock entry). When the nodes
   * do not suffice, the bound is the table's own, which is higher. */
  best(query: RowQuery, keep: number, known: readonly number[], nodes: number): StockBest[];
  /** Every row worth more than `above` (by slab); null when there are more than `most` or they take too long to list. */
  all(query: RowQuery, above: readonly number[], most: number, nodes: number): RowCandidate[][] | null;
  /** Units of work so far. */
  work(): number;
}

export function createDepthPricing(
  problem: Problem,
  stock: readonly Stock[],
  rowsAt: (depth: number) => DepthRows,
): DepthPricing {
  const rows = rowsAt(stock[0]!.depth);
  const cell = (Math.max(1, ...stock.map((s) => s.usable)) + FIT) / CELLS;
  const sections = createSectionValues(problem, rows, rowsAt, cell, CELLS + 1);
  const sizes = rowSizes(rows, rows.full, problem.kerf);
  const fill = createRowTables(sizes, sections, cell, problem.kerf);
  let work = 0;

  function updateSections({ value, demand }: RowQuery): void {
    sections.update(value, demand);
    work += rows.shallow.length * 32;
  }

  function tablesFor({ value, demand }: RowQuery, withWorthless: boolean) {
    work += rows.full.length * 8;
    return fill(rows.full, value, demand, withWorthless);
  }

  function best(query: RowQuery, keep: number, known: readonly number[], nodeLimit: number): StockBest[] {
    updateSections(query);
    const tables = tablesFor(query, false);
    return stock.map((s) => {
      const limits = { above: known[s.index]!, keep, nodes: nodeLimit };
      const { found, nodes, complete } = searchRows(problem, s, rows, sizes, sections, tables, query, limits);
      work += nodes;
      const met = found[0]?.value ?? known[s.index]!;
      return { rows: found, bound: complete ? met : Math.max(met, tables.most(0, s.usable + FIT + sizes.ends, false)) };
    });
  }

  function all(query: RowQuery, above: readonly number[], most: number, nodeLimit: number): RowCandidate[][] | null {
    updateSections(query);
    const tables = tablesFor(query, true);
    const lists: RowCandidate[][] = [];
    let left = nodeLimit;
    let count = 0;
    for (const s of stock) {
      const limits = { above: above[s.index]!, keep: Infinity, nodes: left };
      const { found, nodes, complete } = searchRows(problem, s, rows, sizes, sections, tables, query, limits);
      work += nodes;
      left -= nodes;
      count += found.length;
      if (!complete || count > most) return null;
      lists.push([...found]);
    }
    return lists;
  }

  return { stock, rows, sections, best, all, work: () => work };
}
