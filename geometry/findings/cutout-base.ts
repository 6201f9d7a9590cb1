import type { Base, Cutout } from '../core/layout';
import { baseReach, standsUnder } from '../wood/under';
import { basesUnder, type Facts } from './facts';

/** A cutout over the base that it overlaps most; inches along the wall. */
export interface CutoutOverBase {
  readonly base: Base;
  readonly baseWidth: number;
  /** How far it reaches past the base's nearer side; 0 or less when it lies within. */
  readonly past: number;
}

/** The base a cutout lies over, or null when none is drawn there or it stands on an island. */
export function baseOfCutout(facts: Facts, cutout: Cutout): CutoutOverBase | null {
  const laid = facts.laidById.get(cutout.on);
  const wall = laid && facts.wallById.get(laid.wall);
  if (!laid || !wall) return null;
  const [left, right] = [cutout.centre - cutout.width / 2, cutout.centre + cutout.width / 2];
  let best: { base: Base; from: number; to: number; shared: number } | null = null;
  for (const base of basesUnder(facts, laid)) {
    if (!standsUnder(base)) continue;
    const [from, to] = baseReach(wall, base);
    const shared = Math.min(right, to) - Math.max(left, from);
    if (shared > 0 && (!best || shared > best.shared)) best = { base, from, to, shared };
  }
  return best && { base: best.base, baseWidth: best.to - best.from, past: Math.max(best.from - left, right - best.to) };
}
