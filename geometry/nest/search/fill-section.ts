import type { Problem } from '../model/problem';
import { FIT } from '../model/tolerance';
import type { Lane, Section } from '../plan/pattern';
import type { DepthRows } from '../row/depth-rows';

/**
 * Fills a section of at most `length` with shallow items, lane by lane: each lane is as deep as its first item and takes
 * what still fits, in the order given. Takes what it uses from `left`.
 *
 * @param order - items, the ones to place first leading
 * @param left - copies of each item still to be cut; changed
 * @returns null when nothing fits
 */
export function fillSection(
  problem: Problem,
  rowsAt: (depth: number) => DepthRows,
  depth: number,
  length: number,
  order: readonly number[],
  left: number[],
): Section | null {
  const lanes: Lane[] = [];
  let free = depth;
  let longest = 0;
  for (const first of order) {
    const lane = problem.items[first]!.depth;
    while (left[first]! > 0 && lane <= free + FIT) {
      const rows = rowsAt(lane);
      const held: number[] = [];
      for (const item of order) {
        if (!rows.shapes[item]) continue;
        while (left[item]! > 0 && rows.length([...held, item]) <= length + FIT) {
          held.push(item);
          left[item]!--;
        }
      }
      if (held.length === 0) break;
      lanes.push({ depth: lane, entries: rows.arrange(held) });
      longest = Math.max(longest, rows.length(held));
      free -= lane + problem.kerf;
    }
  }
  return lanes.length > 0 ? { length: longest, lanes } : null;
}
