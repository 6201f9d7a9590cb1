import { cross, dot, subtract, unit } from '../core/vector';
import type { PlacedCutout } from '../top/types';
import type { Facts } from './facts';

/** Wood beside a cutout, inches; negative where it reaches past the top. */
export interface StripWidths {
  readonly front: number;
  readonly back: number;
  /** To the nearer end of the run or island. */
  readonly end: number;
}

/** Sine under which an edge counts as running along the grain: a long edge, not an end. */
const LONG_EDGE_SINE = 0.1;

/** Wood beside a cutout on every side: front and back as laid, and to the ends of its run or island. */
export function stripWidths(facts: Facts, cutout: PlacedCutout): StripWidths {
  return { front: cutout.frontStrip, back: cutout.backStrip, end: toEnds(facts, cutout) };
}

/** Distance from the cutout to the lines of the top's ends; both outlines run counter-clockwise. */
function toEnds(facts: Facts, cutout: PlacedCutout): number {
  const laid = facts.laidById.get(cutout.on);
  const on = facts.piecesOn.get(cutout.on) ?? [];
  const outlines = laid ? [laid.outline] : on.map((p) => p.outline);
  const grain = on[0]?.grain;
  if (!grain) return Infinity;
  let least = Infinity;
  for (const outline of outlines) {
    outline.forEach((a, i) => {
      const direction = unit(a, outline[(i + 1) % outline.length]!);
      if (!direction || Math.abs(cross(direction, grain)) < LONG_EDGE_SINE) return;
      if (!laid && isSeam(facts, cutout.on, a, direction)) return;
      for (const p of cutout.outline) least = Math.min(least, cross(direction, subtract(p, a)));
    });
  }
  return least;
}

/** A cut between two pieces of one top is no end of it. */
function isSeam(
  facts: Facts,
  on: string,
  corner: readonly [number, number],
  direction: readonly [number, number],
): boolean {
  return (facts.seamsOn.get(on) ?? []).some((seam) => {
    const d = unit(seam.from, seam.to);
    if (!d) return false;
    const off = Math.abs(cross(d, subtract(corner, seam.from)));
    return off < 1e-3 && Math.abs(dot(d, direction)) > 0.999;
  });
}

/** Cutouts that reach an edge or are smaller than a hand are no weakness of their own. */
export const weakens = (cutout: Pick<PlacedCutout, 'kind'>): boolean =>
  cutout.kind !== 'notch' && cutout.kind !== 'tap';
