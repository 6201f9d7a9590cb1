import type { Option, Problem } from '../model/problem';
import type { DepthRows } from '../row/depth-rows';
import { makePattern } from '../search/make-pattern';
import { makeColumn, relaxedColumn, type Column, type RealColumn } from '../search/column';
import { bestSection } from './best-section';
import { createDepthPricing, type DepthPricing } from './depth-pricing';
import type { PricedRow } from './priced-row';

export type { PricedRow } from './priced-row';

/** Rows kept for each slab when new columns are wanted: those with a section beside them take long to work out. */
const KEEP = 3;
const KEEP_BARE = 20;

export interface Priced {
  /** By stock entry: no pattern of the class is worth more. */
  readonly worth: readonly number[];
  readonly rows: readonly PricedRow[];
  /** Penalties of shallow items that prove the worth: see `SectionValues`. */
  readonly penalties: readonly (readonly number[])[];
}

export interface Pricing {
  /** The best rows on every slab for these values of items, where they are worth more than a pattern known already
   * (by stock entry). `nodes` limits the search on each slab; with fewer the rows may not be the best and the worth is too high. */
  price(value: readonly number[], demand: readonly number[], known: readonly number[], nodes: number): Priced;
  /** Every row worth more than `above`, by stock entry; null when there are too many. */
  all(
    value: readonly number[],
    demand: readonly number[],
    above: readonly number[],
    most: number,
    nodes: number,
  ): Pick<Priced, 'rows' | 'penalties'> | null;
  /** The row, of the last pricing, beside its relaxed section: lanes may be used in fractions. */
  relaxed(row: PricedRow, value: readonly number[], demand: readonly number[]): Column | null;
  /** The row beside a section that exists. */
  real(row: PricedRow, value: readonly number[], demand: readonly number[]): RealColumn | null;
  work(): number;
}

/** Prices patterns on all slabs, depth by depth. */
export function createPricing(problem: Problem, rowsAt: (depth: number) => DepthRows): Pricing {
  const depths = [...new Set(problem.stock.map((s) => s.depth))];
  const groups = depths.map((depth) =>
    createDepthPricing(
      problem,
      problem.stock.filter((s) => s.depth === depth),
      rowsAt,
    ),
  );
  const groupAt = new Map(groups.map((g) => [g.rows.depth, g]));
  const conflict = conflicts(problem);
  let work = 0;

  function price(value: readonly number[], demand: readonly number[], known: readonly number[], nodes: number): Priced {
    const worth = problem.stock.map(() => 0);
    const found: PricedRow[] = [];
    const penalties: (readonly number[])[] = [];
    for (const group of groups) {
      const best = group.best(
        { value, demand, conflict },
        group.rows.shallow.length > 0 ? KEEP : KEEP_BARE,
        known,
        nodes,
      );
      group.stock.forEach((stock, i) => {
        worth[stock.index] = best[i]!.bound;
        best[i]!.rows.forEach((row) => found.push({ ...row, stock }));
      });
      penalties.push(...group.sections.penalties());
    }
    return { worth, rows: found, penalties };
  }

  function all(
    value: readonly number[],
    demand: readonly number[],
    above: readonly number[],
    most: number,
    nodes: number,
  ): Pick<Priced, 'rows' | 'penalties'> | null {
    const found: PricedRow[] = [];
    const penalties: (readonly number[])[] = [];
    for (const group of groups) {
      const lists = group.all({ value, demand, conflict }, above, most - found.length, nodes);
      if (!lists) return null;
      group.stock.forEach((stock, i) => lists[i]!.forEach((row) => found.push({ ...row, stock })));
      penalties.push(...group.sections.penalties());
    }
    return { rows: found, penalties };
  }

  /** Copies of shallow items that may lie beside a row. */
  function beside(group: DepthPricing, row: PricedRow, demand: readonly number[]): number[] {
    return demand.map((n, i) => (row.items.some((held) => conflict(held, i)) ? 0 : n));
  }

  const hasSection = (group: DepthPricing, row: PricedRow): boolean => group.rows.shallow.length > 0 && row.room > 0;

  function relaxed(row: PricedRow, value: readonly number[], demand: readonly number[]): Column | null {
    const group = groupAt.get(row.stock.depth)!;
    if (!hasSection(group, row)) return real(row, value, demand);
    const section = group.sections.relaxedAt(row.room);
    work += section.work;
    return relaxedColumn(row, section.lanes);
  }

  function real(row: PricedRow, value: readonly number[], demand: readonly number[]): RealColumn | null {
    const group = groupAt.get(row.stock.depth)!;
    const { rows, sections } = group;
    const filled = hasSection(group, row)
      ? bestSection(
          sections.plans,
          sections.relaxer,
          rowsAt,
          rows.shallow,
          row.room,
          value,
          beside(group, row, demand),
          problem.kerf,
          rows.depth,
        )
      : null;
    work += filled?.work ?? 0;
    if (row.items.length === 0 && !filled) return null;
    const pattern = makePattern(problem, row.stock, rows, row.items, filled?.section ?? null);
    return pattern && makeColumn(pattern);
  }

  return { price, all, relaxed, real, work: () => work + groups.reduce((sum, g) => sum + g.work(), 0) };
}

/** Two items conflict when each is cut only through options of one choice and no option has both. */
function conflicts(problem: Problem): (a: number, b: number) => boolean {
  const n = problem.items.length;
  const table = new Uint8Array(n * n);
  const elsewhere = (options: readonly Option[], i: number): boolean =>
    problem.fixed.need[i]! > 0 ||
    problem.choices.some((c) => c.options !== options && c.options.some((o) => o.need[i]! > 0));
  for (const { options } of problem.choices)
    for (let a = 0; a < n; a++)
      for (let b = 0; b < n; b++) {
        if (elsewhere(options, a) || elsewhere(options, b)) continue;
        const withA = options.filter((o) => o.need[a]! > 0);
        const withB = options.filter((o) => o.need[b]! > 0);
        if (withA.length > 0 && withB.length > 0 && !withA.some((o) => withB.includes(o))) table[a * n + b] = 1;
      }
  return (a, b) => table[a * n + b] === 1;
}
