import type { Problem } from '../model/problem';
import { bestSection } from '../pricing/best-section';
import { lanePlans, type LanePlans } from '../pricing/lane-plans';
import type { Section } from '../plan/pattern';
import type { DepthRows } from '../row/depth-rows';

/** A slab's room for a section. */
export interface Room {
  readonly depth: number;
  readonly length: number;
}

/** How much more an item counts for each share of its length: long ones are hard to place later. */
const LENGTH_WEIGHTS = [0.15, 0.6, 0];

/**
 * Packs the rest of the items into sections, one in each room at most.
 *
 * @param left - copies still to be cut
 * @returns by room its section or null; null when none of the ways tried holds everything
 */
export function packSections(
  problem: Problem,
  rowsAt: (depth: number) => DepthRows,
  plansAt: (depth: number) => LanePlans,
  rooms: readonly Room[],
  left: readonly number[],
  spend: (units: number) => boolean,
): (Section | null)[] | null {
  if (left.every((n) => n <= 0)) return rooms.map(() => null);
  const bySize = rooms
    .map((_, r) => r)
    .sort((a, b) => rooms[b]!.length * rooms[b]!.depth - rooms[a]!.length * rooms[a]!.depth);
  for (const order of [[...bySize].reverse(), bySize])
    for (const weight of LENGTH_WEIGHTS) {
      const value = problem.items.map((item) => item.area * (1 + weight * (item.box / 100)));
      const waiting = [...left];
      const sections: (Section | null)[] = rooms.map(() => null);
      for (const r of order) {
        const { depth, length } = rooms[r]!;
        if (length <= 0) continue;
        const rows = rowsAt(depth);
        const best = bestSection(plansAt(depth), rowsAt, rows.shallow, length, value, waiting, problem.kerf, depth);
        if (!best) continue;
        sections[r] = best.section;
        best.items.forEach((i) => waiting[i]!--);
        if (spend(best.work)) return null;
      }
      if (waiting.every((n) => n <= 0)) return sections;
    }
  return null;
}

/** Lane plans of each depth, made once. */
export function createLanePlans(problem: Problem, rowsAt: (depth: number) => DepthRows): (depth: number) => LanePlans {
  const made = new Map<number, LanePlans>();
  return (depth) => {
    let plans = made.get(depth);
    if (!plans) made.set(depth, (plans = lanePlans(problem, rowsAt(depth))));
    return plans;
  };
}
