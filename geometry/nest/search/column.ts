import type { PricedRow } from '../pricing/priced-row';
import { patternItems, type Pattern } from '../plan/pattern';

/** What is cut from one slab, by numbers alone. */
export interface Counted {
  readonly stock: number;
  /** Items cut, each once, and how many of each. */
  readonly items: readonly number[];
  readonly counts: readonly number[];
  readonly key: string;
}

/** A pattern as the linear program sees it. */
export interface Column extends Counted {
  /** Null for a column whose section is relaxed: good for bounds, not for sawing. */
  readonly pattern: Pattern | null;
  /** Of a relaxed column: the row beside its section. */
  readonly row?: PricedRow;
}

export interface RealColumn extends Column {
  readonly pattern: Pattern;
}

export function makeColumn(pattern: Pattern): RealColumn {
  const counts = new Map<number, number>();
  for (const item of patternItems(pattern)) counts.set(item, (counts.get(item) ?? 0) + 1);
  return { ...withCounts(pattern.stock, counts), pattern };
}

/** A row beside fractions of lanes. */
export function relaxedColumn(
  row: PricedRow,
  lanes: readonly { readonly items: readonly number[]; readonly x: number }[],
): Column {
  const counts = new Map<number, number>();
  const add = (item: number, n: number): void => void counts.set(item, (counts.get(item) ?? 0) + n);
  row.items.forEach((i) => add(i, 1));
  lanes.forEach(({ items, x }) => x > 1e-9 && items.forEach((i) => add(i, x)));
  return { ...withCounts(row.stock.index, counts), pattern: null, row };
}

export function withCounts(stock: number, counts: ReadonlyMap<number, number>): Counted {
  const items = [...counts.keys()].sort((a, b) => a - b);
  const numbers = items.map((i) => counts.get(i)!);
  return { stock, items, counts: numbers, key: `${stock}|${items.join()}|${numbers.map((n) => n.toFixed(6)).join()}` };
}

export function worthOf(column: Column, value: readonly number[]): number {
  let sum = 0;
  for (let k = 0; k < column.items.length; k++) sum += value[column.items[k]!]! * column.counts[k]!;
  return sum;
}

/** True when no more copies are cut than are left. */
export const isWithin = (column: Counted, left: readonly number[]): boolean =>
  column.items.every((i, k) => column.counts[k]! <= left[i]!);

/** Columns met so far, each once. */
export interface ColumnPool<C extends Column> {
  readonly list: readonly C[];
  /** True when the column is new. */
  add(column: C): boolean;
}

export function createColumnPool<C extends Column>(): ColumnPool<C> {
  const list: C[] = [];
  const keys = new Set<string>();
  return {
    list,
    add(column) {
      if (keys.has(column.key)) return false;
      keys.add(column.key);
      list.push(column);
      return true;
    },
  };
}
