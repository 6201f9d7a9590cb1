import type { BaseKind, Step } from '../core/layout';
import type { SeamLimits } from '../core/settings';
import type { Box } from '../core/polygon';
import type { Polygon } from '../core/point';
import type { Deck, DeckEnd } from '../top/deck';
import { crossings } from '../top/deck-span';
import { cutoutName, type LaidCutout } from '../top/lay-cutouts';
import { inches } from '../top/sentence';

/** Why a place is not allowed, in words that follow 'the seam is'; put together only when somebody has to read it. */
export type Why = (step: Step) => string;

/** A stretch of a deck where no seam may be (its two ends may carry one), own x. */
export interface Zone {
  readonly from: number;
  readonly to: number;
  readonly why: Why;
}

/** A cutout on the deck that is searched, in the deck's axes. */
export interface Hole {
  readonly cutout: LaidCutout;
  readonly outline: Polygon;
  readonly box: Box;
}

/** Something that stands along the deck's wall, inches along the wall. */
export interface Support {
  readonly kind: BaseKind;
  readonly from: number;
  readonly to: number;
  readonly name: string;
}

/** One row of a deck that is to be divided: between two rips, or the whole depth. */
export interface Row {
  readonly deck: Deck;
  readonly bottom: number;
  readonly top: number;
  /** Long points, own x. */
  readonly from: number;
  readonly to: number;
  /** Short points: a seam outside them would cross an end. */
  readonly insideFrom: number;
  readonly insideTo: number;
}

/** Places where the rules of the shop allow no seam. */
export function seamZones(
  row: Row,
  holes: readonly Hole[],
  supports: readonly Support[],
  limits: SeamLimits,
): readonly Zone[] {
  const { deck } = row;
  const zones: Zone[] = [endZone(row, deck.left, 'left', limits), endZone(row, deck.right, 'right', limits)];
  for (const hole of holes)
    if (hole.box.minY < row.top && hole.box.maxY > row.bottom) zones.push(...holeZones(hole, limits));
  for (const support of supports) {
    const zone = supportZone(deck, support, limits);
    if (zone) zones.push(zone);
  }
  return zones;
}

function endZone(row: Row, end: DeckEnd, side: 'left' | 'right', limits: SeamLimits): Zone {
  const rule = endRule(end, limits);
  const short = limits.shortestPiece;
  if (side === 'left') {
    const byRule = row.insideFrom + rule.distance;
    const to = Math.max(byRule, row.from + short);
    return { from: -Infinity, to, why: byRule >= row.from + short ? rule.why : shortPiece(short) };
  }
  const byRule = row.insideTo - rule.distance;
  const from = Math.min(byRule, row.to - short);
  return { from, to: Infinity, why: byRule <= row.to - short ? rule.why : shortPiece(short) };
}

const shortPiece =
  (short: number): Why =>
  (step) =>
    `leaving a piece shorter than ${inches(short, step)}`;

/** 'within 6 in of a joint' */
export const within =
  (distance: number, what: string): Why =>
  (step) =>
    `within ${inches(distance, step)} of ${what}`;

function endRule(end: DeckEnd, limits: SeamLimits): { distance: number; why: Why } {
  if (end.kind === 'joint') {
    return { distance: limits.fromJoint, why: within(limits.fromJoint, 'a joint') };
  }
  if (end.kind === 'open' || end.kind === 'waterfall') {
    return { distance: limits.fromOpenEnd, why: within(limits.fromOpenEnd, 'an open end') };
  }
  return { distance: 0, why: () => 'across the end' };
}

function holeZones({ cutout, box }: Hole, limits: SeamLimits): readonly Zone[] {
  const name = cutoutName(cutout.cutout);
  const { kind, radius } = cutout.placed;
  if (kind === 'tap') {
    // A round hole has no corners to break out: it only has to keep wood round it.
    const keep = limits.insideCutout;
    return [{ from: box.minX - keep, to: box.maxX + keep, why: within(keep, name) }];
  }
  const outside = limits.fromCutoutCorner;
  const why = within(outside, `a corner of ${name}`);
  const inside = radius + limits.insideCutout;
  if (kind === 'notch' || box.maxX - box.minX < 2 * inside) {
    return [{ from: box.minX - outside, to: box.maxX + outside, why }];
  }
  const close = within(inside, `a side of ${name}`);
  return [
    { from: box.minX - outside, to: box.minX + inside, why },
    { from: box.minX, to: box.minX + inside, why: close },
    { from: box.maxX - inside, to: box.maxX + outside, why },
    { from: box.maxX - inside, to: box.maxX, why: close },
  ];
}

/** Bases that carry nothing in their middle. */
const HOLLOW: ReadonlySet<BaseKind> = new Set(['dishwasher', 'range', 'opening']);

function supportZone(deck: Deck, { kind, name, ...at }: Support, limits: SeamLimits): Zone | null {
  if (!HOLLOW.has(kind)) return null;
  const [from, to] = [at.from + limits.support, at.to - limits.support];
  if (to <= from) return null;
  const why = (step: Step) => `over the ${name} with no support within ${inches(limits.support, step)}`;
  return deck.sign === 1 ? { from, to, why } : { from: -to, to: -from, why };
}

/** Inches of a seam at x that stay on the finished top, and the cutout it mostly falls in. */
export function visibleAt(
  row: Row,
  holes: readonly Hole[],
  x: number,
): { visible: number; inCutout: LaidCutout | null } {
  let visible = lengthWithin(row.deck.shape === 'strip' ? [row.bottom, row.top] : crossings(row.deck.outline, x), row);
  let most = 0;
  let inCutout: LaidCutout | null = null;
  for (const { cutout, outline, box } of holes) {
    if (x <= box.minX || x >= box.maxX) continue;
    const gone = lengthWithin(crossings(outline, x), row);
    visible -= gone;
    if (gone > most) [most, inCutout] = [gone, cutout];
  }
  return { visible: Math.max(0, visible), inCutout };
}

/** Length of the stretches between pairs of marks that lies inside the row. */
function lengthWithin(marks: readonly number[], { bottom, top }: Row): number {
  let sum = 0;
  for (let i = 0; i + 1 < marks.length; i += 2) {
    sum += Math.max(0, Math.min(top, marks[i + 1]!) - Math.max(bottom, marks[i]!));
  }
  return sum;
}
