import type { Problem } from '../model/problem';
import { bestSection } from '../pricing/best-section';
import { lanePlans, type LanePlans } from '../pricing/lane-plans';
import { createSectionRelaxer, type SectionRelaxer } from '../pricing/section-lanes';
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
  lanesAt: (depth: number) => LaneTools,
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
        const best = bestSection(
          lanesAt(depth).plans,
          lanesAt(depth).relaxer,
          rowsAt,
          rows.shallow,
          length,
          value,
          waiting,
          problem.kerf,
          depth,
        );
        if (!best) continue;
        sections[r] = best.section;
        best.items.forEach((i) => waiting[i]!--);
        if (spend(best.work)) return null;
      }
      if (waiting.every((n) => n <= 0)) return sections;
    }
  return null;
}

/** How sections of a depth come apart into lanes. */
export interface LaneTools {
  readonly plans: LanePlans;
  readonly relaxer: SectionRelaxer;
}

/** Lane tools of each depth, made once. */
export function createLaneTools(problem: Problem, rowsAt: (depth: number) => DepthRows): (depth: number) => LaneTools {
  const made = new Map<number, LaneTools>();
  return (depth) => {
    let tools = made.get(depth);
    if (!tools) {
      const rows = rowsAt(depth);
      const plans = lanePlans(problem, rows);
      tools = { plans, relaxer: createSectionRelaxer(plans, rowsAt, rows.shallow) };
      made.set(depth, tools);
    }
    return tools;
  };
}
