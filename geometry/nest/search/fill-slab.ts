import type { Problem, Stock } from '../model/problem';
import { FIT } from '../model/tolerance';
import { stretchOf } from '../plan/cut-tree';
import type { Pattern, Slot } from '../plan/pattern';
import type { DepthRows } from '../row/depth-rows';
import { rowPositions } from '../row/row-positions';
import { usefulMoves } from '../row/row-gaps';
import { fillSection } from './fill-section';
import { lengthLeft, makePattern } from './make-pattern';

/** Fills one slab with what fits first in the order given: full-depth items in a row, then a section of shallow ones. */
export function fillSlab(
  problem: Problem,
  rowsAt: (depth: number) => DepthRows,
  stock: Stock,
  order: readonly number[],
  left: readonly number[],
): Pattern | null {
  const rows = rowsAt(stock.depth);
  if (stock.slab.defects?.length) return fillRoundDefects(problem, rowsAt, stock, order, left);
  const held: number[] = [];
  for (const item of order) {
    if (!rows.full.includes(item)) continue;
    for (let n = left[item]!; n > 0 && rows.length([...held, item]) <= stock.usable + FIT; n--) held.push(item);
  }
  const room = lengthLeft(stock, rows, held, problem.kerf);
  const shallow = order.filter((i) => rows.shallow.includes(i));
  const section = fillSection(problem, rowsAt, stock.depth, room, shallow, [...left]);
  return held.length > 0 || section ? makePattern(problem, stock, rows, held, section) : null;
}

function fillRoundDefects(
  problem: Problem,
  rowsAt: (depth: number) => DepthRows,
  stock: Stock,
  order: readonly number[],
  left: readonly number[],
): Pattern | null {
  const rows = rowsAt(stock.depth);
  const band = { from: stock.trim, to: stock.trim + stock.usable, depth: stock.depth };
  const fits = (slots: readonly Slot[]): boolean => {
    const stretches = slots.map((slot) => stretchOf(problem, slot, stock.depth));
    return rowPositions(stretches, band, problem.kerf, stock.slab.defects) !== null;
  };
  let slots: Slot[] = [];
  for (const item of order) {
    if (!rows.full.includes(item)) continue;
    for (let n = left[item]!; n > 0; n--) {
      const tries = usefulMoves(rows.shapes[item]!).map((move): Slot[] => [...slots, { item, move }]);
      const found = tries.find(fits);
      if (!found) break;
      slots = found;
    }
  }
  const shallow = order.filter((i) => rows.shallow.includes(i));
  for (const room of clearLengths(stock)) {
    const section = fillSection(problem, rowsAt, stock.depth, room, shallow, [...left]);
    if (!section || !fits([...slots, section])) continue;
    slots = [...slots, section];
    break;
  }
  return slots.length > 0 ? { stock: stock.index, slots } : null;
}

/** Lengths between defects, longest first: a section lies clear of them all. */
function clearLengths(stock: Stock): number[] {
  const zones = [...(stock.slab.defects ?? [])].sort((a, b) => a.x - b.x);
  let from = stock.trim;
  const lengths: number[] = [];
  for (const zone of zones) {
    lengths.push(zone.x - from);
    from = Math.max(from, zone.x + zone.w);
  }
  lengths.push(stock.trim + stock.usable - from);
  return lengths.filter((l) => l > 0).sort((a, b) => b - a);
}
