import type { Problem } from '../model/problem';
import { FIT } from '../model/tolerance';
import { isSection, type Lane, type Pattern, type Section, type Slot } from '../plan/pattern';
import { bestSection } from '../pricing/best-section';
import type { DepthRows } from '../row/depth-rows';
import { isWithin, makeColumn, withCounts, type Counted, type RealColumn } from './column';
import type { SearchContext } from './context';
import { lengthLeft, makePattern } from './make-pattern';

/** A column of which no more is counted than is left to cut. */
export interface TrimmedColumn extends Counted {
  readonly whole: RealColumn;
}

/** What is left of a column when no copy is cut that nobody asks for; null when that is nothing. */
export function trimColumn(whole: RealColumn, left: readonly number[]): TrimmedColumn | null {
  if (isWithin(whole, left)) return { ...whole, whole };
  const counts = new Map<number, number>();
  whole.items.forEach((i, k) => {
    const n = Math.min(left[i]!, whole.counts[k]!);
    if (n > 0) counts.set(i, n);
  });
  return counts.size > 0 ? { ...withCounts(whole.stock, counts), whole } : null;
}

/**
 * The pattern behind a trimmed column: without the copies that nobody asks for, and with what else fits in their place.
 *
 * @param value - of the items, says what to fill with first
 * @param left - copies still to be cut
 */
export function cutTrimmed(
  context: SearchContext,
  { whole }: TrimmedColumn,
  value: readonly number[],
  left: readonly number[],
): RealColumn | null {
  if (isWithin(whole, left)) return whole;
  const stock = context.problem.stock[whole.stock]!;
  const kept = without(whole.pattern, left);
  const plain = kept.slots.length > 0 ? makeColumn(kept) : null;
  if (stock.slab.defects?.length) return plain;
  const filled = refill(context, kept, value, left);
  return filled && (!plain || worth(filled, value) > worth(plain, value)) ? filled : plain;
}

const worth = (column: RealColumn, value: readonly number[]): number =>
  column.items.reduce((sum, i, k) => sum + value[i]! * column.counts[k]!, 0);

/** The pattern less what is not left; the rest keeps its order, so that it still lies clear of defects. */
function without(pattern: Pattern, left: readonly number[]): Pattern {
  const open = [...left];
  const take = ({ item }: { readonly item: number }): boolean => open[item]!-- > 0;
  const slots = pattern.slots.flatMap((slot): Slot[] => {
    if (!isSection(slot)) return take(slot) ? [slot] : [];
    const lanes = slot.lanes
      .map((lane): Lane => ({ ...lane, entries: lane.entries.filter(take) }))
      .filter((lane) => lane.entries.length > 0);
    return lanes.length > 0 ? [{ ...slot, lanes }] : [];
  });
  return { ...pattern, slots };
}

/** The row made longer by the most valuable items that still fit, and the best section beside it. */
function refill(
  context: SearchContext,
  kept: Pattern,
  value: readonly number[],
  left: readonly number[],
): RealColumn | null {
  const { problem, rowsAt, lanesAt, spend } = context;
  const stock = problem.stock[kept.stock]!;
  const rows = rowsAt(stock.depth);
  const open = [...left];
  const held = kept.slots.flatMap((slot) => (isSection(slot) ? [] : [slot.item]));
  held.forEach((i) => open[i]!--);
  const old = kept.slots.find(isSection) ?? null;
  addToRow(problem, rows, held, stock.usable - (old ? old.length + problem.kerf : 0), value, open);
  const room = lengthLeft(stock, rows, held, problem.kerf);
  const { plans, relaxer } = lanesAt(stock.depth);
  const best =
    rows.shallow.length > 0 && room > 0
      ? bestSection(plans, relaxer, rowsAt, rows.shallow, room, value, open, problem.kerf, rows.depth)
      : null;
  spend(best?.work ?? 1);
  const section: Section | null = best?.section ?? null;
  if (held.length === 0 && !section) return null;
  const pattern = makePattern(problem, stock, rows, held, section);
  return pattern && makeColumn(pattern);
}

function addToRow(
  problem: Problem,
  rows: DepthRows,
  held: number[],
  usable: number,
  value: readonly number[],
  open: number[],
): void {
  const rate = (i: number): number => value[i]! / problem.items[i]!.mid;
  const order = rows.full.filter((i) => open[i]! > 0 && value[i]! > 0).sort((a, b) => rate(b) - rate(a) || a - b);
  for (const item of order)
    while (open[item]! > 0 && rows.length([...held, item]) <= usable + FIT) {
      held.push(item);
      open[item]!--;
    }
}
