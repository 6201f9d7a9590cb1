import { isWithin, makeColumn, worthOf, type Column, type RealColumn } from './column';
import type { SearchContext } from './context';
import type { Generation } from './generate-columns';
import { greedy } from './greedy';
import { cutTrimmed, trimColumn } from './trim-column';

/** A column made of what is left is taken when it is worth this share of its slab's price. */
const FAIR = 0.9;

/**
 * A plan at once from a relaxation, finished or not: its columns, the most used first, each trimmed to what is left and filled
 * up; then slab after slab for the rest. Far quicker than a dive, and not as good.
 *
 * @param demand - copies of each item to cut
 * @param counts - slabs that may be used, by stock entry
 * @returns null when the slabs run out
 */
export function roundOff(
  context: SearchContext,
  { used, value }: Generation,
  demand: readonly number[],
  counts: readonly number[],
): RealColumn[] | null {
  const { problem, rowsAt } = context;
  const left = [...demand];
  const slabs = [...counts];
  const taken: RealColumn[] = [];
  for (const column of used) {
    if (slabs[column.stock]! <= 0) continue;
    const cut = fitted(context, column, value, left);
    if (!cut || !isWithin(cut, left) || worthOf(cut, value) < FAIR * problem.stock[cut.stock]!.price) continue;
    cut.items.forEach((i, k) => (left[i]! -= cut.counts[k]!));
    slabs[cut.stock]!--;
    taken.push(cut);
  }
  const rest = greedy(problem, rowsAt, left, slabs);
  return rest && [...taken, ...rest.map(makeColumn)];
}

/** What can be sawn of a column from what is left. */
function fitted(
  context: SearchContext,
  { row, pattern, ...counted }: Column,
  value: readonly number[],
  left: readonly number[],
): RealColumn | null {
  const real = row ? context.pricing.real(row, value, left) : pattern && { ...counted, pattern };
  const trimmed = real && trimColumn(real, left);
  return trimmed && cutTrimmed(context, trimmed, value, left);
}
