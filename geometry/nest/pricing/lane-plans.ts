import type { Problem } from '../model/problem';
import { FIT, SAME_SIZE } from '../model/tolerance';
import type { DepthRows } from '../row/depth-rows';

/** More ways than this to fill the depth with lanes are not listed; the bound then takes lanes by their share of the depth. */
const MOST_LANE_SETS = 300;

export interface LanePlans {
  /** Lane depths that shallow items ask for, least first. */
  readonly depths: readonly number[];
  /** Fullest numbers of lanes of each depth that fit side by side; null when there are too many to list. */
  readonly sets: readonly (readonly number[])[] | null;
  /** Share of the depth that a lane of each depth takes with its kerf: the shares of lanes side by side sum to 1 at most. */
  readonly share: readonly number[];
}

/** How a section of this depth can be ripped into lanes for its shallow items. */
export function lanePlans(problem: Problem, rows: DepthRows): LanePlans {
  const depths = distinct(rows.shallow.map((i) => problem.items[i]!.depth));
  const { kerf } = problem;
  const sets: number[][] = [];
  let tooMany = false;

  function list(set: number[], from: number, free: number): void {
    if (tooMany) return;
    let grew = false;
    // Deepest first, so that each set is listed once, in falling order of depth.
    for (let d = from; d >= 0; d--) {
      if (depths[d]! > free + FIT) continue;
      grew = true;
      set[d]!++;
      list(set, d, free - depths[d]! - kerf);
      set[d]!--;
    }
    if (!grew && !(depths.length > 0 && depths[0]! <= free + FIT)) {
      sets.push([...set]);
      if (sets.length > MOST_LANE_SETS) tooMany = true;
    }
  }

  if (depths.length > 0)
    list(
      depths.map(() => 0),
      depths.length - 1,
      rows.depth,
    );
  const fullest = sets.filter((a) => !sets.some((b) => b !== a && b.every((n, d) => n >= a[d]!)));
  const share = depths.map((d) => (d + kerf) / (rows.depth + kerf + FIT));
  return { depths, sets: tooMany ? null : fullest, share };
}

function distinct(depths: readonly number[]): number[] {
  const sorted = [...depths].sort((a, b) => a - b);
  return sorted.filter((d, i) => i === 0 || d - sorted[i - 1]! > SAME_SIZE);
}

/** The most that lanes side by side can be worth together, when a lane of each depth is worth so much. */
export function bestLaneSet({ sets, share }: LanePlans, worth: readonly number[]): number {
  let best = 0;
  if (!sets) for (let k = 0; k < worth.length; k++) best = Math.max(best, worth[k]! / share[k]!);
  else
    for (const set of sets) {
      let sum = 0;
      for (let k = 0; k < set.length; k++) sum += set[k]! * worth[k]!;
      if (sum > best) best = sum;
    }
  return best;
}
