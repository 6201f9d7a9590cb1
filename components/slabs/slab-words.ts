import type { Layout } from '@/geometry/core/layout';
import type { Plan } from '@/geometry/plan/types';
import type { PlacedSlab } from '@/geometry/scene/slab/placed-slab';
import { formatLength } from '@/geometry/tape/format-length';

/** Whole cents as money: "$379", "$379.50". */
export function money(cents: number, currency = 'USD'): string {
  return new Intl.NumberFormat('en-US', {
    style: 'currency',
    currency,
    minimumFractionDigits: cents % 100 === 0 ? 0 : 2,
  }).format(cents / 100);
}

/** Size and price of a slab: "25 x 96 in, 1 1/2 thick, $379"; a rack piece is free. */
export function slabSize(slab: PlacedSlab, layout: Layout, showPrice: boolean): string {
  const say = (inches: number) => formatLength(inches, layout.step);
  const size = `${say(slab.depth)} × ${say(slab.length)}${layout.step.endsWith('mm') ? '' : ' in'}, ${say(slab.thickness)} thick`;
  if (!showPrice) return size;
  return `${size}, ${slab.rack ? 'on the rack' : money(slab.priceCents)}`;
}

/** Square inches of all slabs of the plan. */
function slabArea(plan: Plan): number {
  const stock = new Map(plan.instance.stock.map((slab) => [slab.id, slab.length * slab.depth]));
  return (plan.nest?.slabs ?? []).reduce((sum, slab) => sum + (stock.get(slab.stock) ?? 0), 0);
}

/** What the plan comes to, for its card. */
export interface PlanTotals {
  readonly slabs: number;
  readonly pieces: number;
  readonly cuts: number;
  /** Share of the slabs that is neither piece nor an offcut worth keeping. */
  readonly waste: number;
  /** Inches of joint and seam that show. */
  readonly visibleSeam: number;
  readonly faceDown: number;
  readonly fromRack: number;
}

export function planTotals(plan: Plan, layout: Layout): PlanTotals {
  const slabs = plan.nest?.slabs ?? [];
  const laid = new Map(plan.instance.parts.map((part) => [part.id, part]));
  const areaOf = new Map(plan.pieces.map((piece) => [piece.letter, piece.area]));
  const used = slabs.flatMap((slab) => slab.parts).reduce((sum, part) => sum + (areaOf.get(part.id) ?? 0), 0);
  const kept = slabs
    .flatMap((slab) => slab.offcuts)
    .filter((offcut) => offcut.keep)
    .reduce((sum, offcut) => sum + offcut.length * offcut.depth, 0);
  const whole = slabArea(plan);
  const rack = new Set(layout.stock.rack.map((piece) => piece.id));
  return {
    slabs: slabs.length,
    pieces: [...laid.values()].reduce((sum, part) => sum + (part.count ?? 1), 0),
    cuts: slabs.reduce((sum, slab) => sum + slab.cuts.length, 0),
    waste: whole === 0 ? 0 : (whole - used - kept) / whole,
    visibleSeam:
      plan.joints.reduce((sum, joint) => sum + joint.length, 0) +
      plan.seams.reduce((sum, seam) => sum + seam.visible, 0),
    faceDown: slabs.flatMap((slab) => slab.parts).filter((part) => part.turnedOver).length,
    fromRack: slabs.filter((slab) => rack.has(slab.stock)).length,
  };
}

/** How good the plan is, in words: proved, or how far it may be from the best. */
export function proofWords(plan: Plan): string {
  if (!plan.nest) return '';
  if (plan.nest.proved)
    return plan.nest.provedScope === 'any'
      ? 'Proved: no plan costs less.'
      : 'Proved best for pieces in a row with at most one ripped section a slab.';
  const { cost, lowerBound, gap } = plan.nest;
  if (lowerBound <= 0) return `Costs ${money(cost)}; not proved best.`;
  return `No plan can cost less than ${money(lowerBound)}; this one may be ${(gap * 100).toFixed(1)} % over the best.`;
}
