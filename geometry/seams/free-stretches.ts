import type { Zone } from './seam-zones';

/** A stretch where seams are allowed, both ends included, own x. */
export type Stretch = readonly [number, number];

/** What the zones leave between two places; zones are open, so where two only touch one place is left. */
export function freeStretches(zones: readonly Zone[], from: number, to: number): readonly Stretch[] {
  const free: Stretch[] = [];
  let start = from;
  for (const zone of [...zones].sort((a, b) => a.from - b.from)) {
    if (zone.to <= start) continue;
    if (zone.from >= to) break;
    if (zone.from >= start) free.push([start, zone.from]);
    start = zone.to;
  }
  if (start <= to) free.push([start, to]);
  return free;
}

/** Why there may be no seam at x: the narrowest zone round it, or null when it is allowed. */
export function zoneAt(zones: readonly Zone[], x: number): Zone | null {
  let found: Zone | null = null;
  for (const zone of zones) {
    if (x <= zone.from + ON_EDGE || x >= zone.to - ON_EDGE) continue;
    if (!found || zone.to - zone.from < found.to - found.from) found = zone;
  }
  return found;
}

/** Inches; a seam typed on the edge of a zone is outside it whatever float64 makes of the sum. */
const ON_EDGE = 1e-6;

/** Allowed place nearest to x, or null when there is none. */
export function nearestFree(free: readonly Stretch[], x: number): number | null {
  let best: number | null = null;
  for (const [from, to] of free) {
    const at = Math.min(Math.max(x, from), to);
    if (best === null || Math.abs(at - x) < Math.abs(best - x)) best = at;
  }
  return best;
}
