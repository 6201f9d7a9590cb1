import type { LaidRun } from '../top/types';
import type { WallFrame } from '../top/wall-frame';
import { highestBump, inOrder, offsetAt } from '../room/profile';

/** Gap behind a run, inches, and where it is widest, inches along the wall. */
export interface BackGaps {
  readonly least: number;
  readonly most: number;
  readonly mostAt: number;
}

/**
 * Gap between wall and back edge along a run. The back line clears the highest bump by the back gap, so the gap is
 * narrowest at that bump and widest in the deepest hollow.
 */
export function backGaps(run: LaidRun, backGap: number, wall: WallFrame): BackGaps {
  const [from, to] = [Math.max(0, run.backFrom), Math.min(wall.length, run.backTo)];
  const stations = inOrder(wall.profile);
  const standoff = backGap + highestBump(stations, from, to);
  const places = [from, to, ...stations.map((s) => s.at).filter((at) => at > from && at < to)];
  let [least, most, mostAt] = [Infinity, -Infinity, from];
  for (const at of places) {
    const gap = standoff + offsetAt(stations, at);
    if (gap < least) least = gap;
    if (gap > most) [most, mostAt] = [gap, at];
  }
  return { least, most, mostAt };
}
