import { inches } from '../top/sentence';
import type { LayProblem } from '../top/types';
import { freeStretches, nearestFree, zoneAt } from './free-stretches';
import type { SeamGround } from './seam-plan';
import { within, type Row, type Zone } from './seam-zones';

/** Pins nearer than this are one pin, inches. */
const SAME_PLACE = 1e-6;

/**
 * Pinned seams of a row, own x, rising. A pin stays where it is, also where a rule forbids a seam: that is explained
 * with the nearest place that is allowed. A pin that would cut across an end, or miss the top, cannot stay.
 */
export function readPins(
  ground: SeamGround,
  row: Row,
  zones: readonly Zone[],
  problems: LayProblem[],
): readonly number[] {
  const { deck, step, limits } = ground;
  const along = (x: number) => inches(deck.sign * x, step);
  const kept: number[] = [];
  const wanted = ground.pins.map((at) => deck.sign * at).sort((a, b) => a - b);
  for (const x of wanted) {
    if (kept.some((other) => Math.abs(other - x) < SAME_PLACE)) continue;
    const others = wanted.filter((other) => Math.abs(other - x) >= SAME_PLACE);
    const near = others.map((other): Zone => ({
      from: other - limits.shortestPiece,
      to: other + limits.shortestPiece,
      why: within(limits.shortestPiece, 'another seam'),
    }));
    const all = [...zones, ...near];
    const cuts = x > row.insideFrom + SAME_PLACE && x < row.insideTo - SAME_PLACE;
    if (cuts) kept.push(x);
    const zone = zoneAt(all, x);
    if (cuts && !zone) continue;
    const nearest = nearestFree(freeStretches(all, row.from, row.to), x);
    const where =
      nearest === null ? 'No place on this top is allowed.' : `The nearest allowed place is ${along(nearest)}.`;
    const why = cuts
      ? `is ${zone!.why(step)}`
      : x <= row.from || x >= row.to
        ? 'misses the top'
        : 'would cut across the end of the top';
    problems.push({
      code: cuts ? 'pin-not-allowed' : 'pin-impossible',
      ...(cuts && { severity: 'warn' as const }),
      message: `The seam pinned at ${along(x)} on top ${deck.id} ${why}. ${where}`,
      at: { run: deck.id },
    });
  }
  return kept;
}
