import { FIT } from '../model/tolerance';
import type { DepthRows } from '../row/depth-rows';

/** Most nodes spent on filling one lane. */
const LANE_NODES = 2000;

export interface FilledLane {
  readonly items: readonly number[];
  readonly value: number;
  /** No lane is worth more; equal to `value` unless the search was cut short. */
  readonly bound: number;
  readonly work: number;
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
  const { shapes } = rows;
  const order = among.filter((i) => shapes[i] && left[i]! > 0 && value[i]! > 1e-9 && shapes[i]!.mid <= room + FIT);
  const rate = (i: number): number => value[i]! / shapes[i]!.mid;
  order.sort((a, b) => rate(b) - rate(a) || a - b);
  let best: number[] = [];
  let most = 0;
  let work = 0;
  let bound = 0;
  const held: number[] = [];

  function extend(j: number, worth: number, length: number): void {
    if (worth > most) {
      most = worth;
      best = [...held];
    }
    for (let i = j; i < order.length; i++) {
      const item = order[i]!;
      if (worth + (room - length) * rate(item) <= most + 1e-9) return;
      if (work > LANE_NODES) {
        bound = Math.max(bound, worth + (room - length) * rate(item));
        return;
      }
      if (length + shapes[item]!.mid > room + FIT) continue;
      work++;
      const before = held.length;
      for (let n = 1; n <= left[item]!; n++) {
        held.push(item);
        const now = rows.length(held);
        if (now > room + FIT) break;
        extend(i + 1, worth + n * value[item]!, now);
      }
      held.length = before;
    }
  }
  extend(0, 0, 0);
  return { items: best, value: most, bound: Math.max(bound, most), work: work + 1 };
}
