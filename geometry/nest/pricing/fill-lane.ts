import { FIT as FIT_SHARED } from '../model/tolerance';
import type { DepthRows } from '../row/depth-rows';

/** Read once: this is the busiest loop of the search. */
const FIT = FIT_SHARED;
/** Most nodes spent on filling one lane. */
const LANE_NODES = 2000;
/** Value under which an item is worthless, and by which a better lane must be better. */
const NOTHING = 1e-9;

export interface FilledLane {
  readonly items: readonly number[];
  readonly value: number;
  /** No lane is worth more; equal to `value` unless the search was cut short. */
  readonly bound: number;
  readonly work: number;
}

/** One search; kept as plain fields because it runs many thousand times in a nest. */
interface LaneSearch {
  readonly rows: DepthRows;
  readonly room: number;
  readonly value: readonly number[];
  readonly left: readonly number[];
  readonly order: readonly number[];
  readonly mids: readonly number[];
  /** By place in the order: value for length. */
  readonly rates: readonly number[];
  readonly held: number[];
  best: number[];
  most: number;
  bound: number;
  work: number;
}

/**
 * The most valuable items that fit in one lane, by depth-first search along falling value for length.
 *
 * @param rows - rows of the lane's depth
 * @param among - items that may be used
 * @param left - copies of each that are left
 */
export function fillLane(
  rows: DepthRows,
  among: readonly number[],
  room: number,
  value: readonly number[],
  left: readonly number[],
): FilledLane {
  const order: number[] = [];
  for (const i of among) {
    const shape = rows.shapes[i];
    if (shape && left[i]! > 0 && value[i]! > NOTHING && shape.mid <= room + FIT) order.push(i);
  }
  order.sort((a, b) => value[b]! * rows.shapes[a]!.mid - value[a]! * rows.shapes[b]!.mid || a - b);
  const mids: number[] = [];
  const rates: number[] = [];
  for (const i of order) {
    const { mid } = rows.shapes[i]!;
    mids.push(mid);
    rates.push(value[i]! / mid);
  }
  const s: LaneSearch = { rows, room, value, left, order, mids, rates, held: [], best: [], most: 0, bound: 0, work: 1 };
  extend(s, 0, 0, 0);
  return { items: s.best, value: s.most, bound: Math.max(s.bound, s.most), work: s.work };
}

function extend(s: LaneSearch, from: number, worth: number, length: number): void {
  const { order, room, held } = s;
  for (let j = from; j < order.length; j++) {
    const ceiling = worth + (room + FIT - length) * s.rates[j]!;
    if (ceiling <= s.most + NOTHING) return;
    if (s.work > LANE_NODES) {
      if (ceiling > s.bound) s.bound = ceiling;
      return;
    }
    if (length + s.mids[j]! > room + FIT) continue;
    s.work++;
    const item = order[j]!;
    const before = held.length;
    let now = worth;
    for (let n = s.left[item]!; n > 0; n--) {
      held.push(item);
      const next = s.rows.length(held);
      if (next > room + FIT) break;
      now += s.value[item]!;
      if (now > s.most) {
        s.most = now;
        s.best = held.slice();
      }
      extend(s, j + 1, now, next);
    }
    held.length = before;
  }
}
