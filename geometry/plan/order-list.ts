import type { Layout, RackPiece, StockSlab } from '../core/layout';
import type { ShopSettings } from '../core/settings';
import { formatLength } from '../tape/format-length';
import { solvedRoom } from '../top/solved-room';
import { wallFrames } from '../top/wall-frame';
import { fastenersOfTops, type Fastener } from '../wood/fasteners';
import { FINISHES } from '../wood/finish';
import { materialsList, type MaterialsList } from '../wood/materials-list';
import { BETWEEN_GRIT, discsFor, sandingGrits } from '../wood/sanding';
import type { Plan } from './types';

export const ORDER_GROUPS = [
  'Slabs to buy',
  'From the rack',
  'Strips',
  'Hardware',
  'Glue and finish',
  'Abrasives',
] as const;

export type OrderGroup = (typeof ORDER_GROUPS)[number];

/** One thing to buy or to take along. */
export interface OrderLine {
  readonly group: OrderGroup;
  readonly item: string;
  readonly size: string;
  /** In `unit`s, not rounded; whole for things that are counted. */
  readonly quantity: number;
  readonly unit: 'pcs' | 'fl oz' | 'qt' | 'discs';
  /** What it is for. */
  readonly note: string;
  /** Whole cents for one; null where the job knows no price. */
  readonly eachCents: number | null;
}

/**
 * All that the job needs, with quantities from its plan. Glue, finish and discs hold a tenth to spare; screws and
 * connectors are as many as the plan shows.
 */
export function orderList(plan: Plan, layout: Layout, settings: ShopSettings): readonly OrderLine[] {
  const fasteners = fastenersOfPlan(plan, layout, settings);
  const needs = materialsList(layout, plan.tops, plan.joints, fasteners, settings);
  return [
    ...slabLines(plan, layout),
    ...stripLines(plan, layout),
    ...hardwareLines(plan, fasteners, needs, settings),
    ...wetLines(layout, needs),
    ...abrasiveLines(plan, layout, needs),
  ];
}

/** What the priced lines come to, whole cents. */
export const orderTotalCents = (lines: readonly OrderLine[]): number =>
  lines.reduce((sum, line) => sum + (line.eachCents ?? 0) * line.quantity, 0);

function fastenersOfPlan(plan: Plan, layout: Layout, settings: ShopSettings): readonly Fastener[] {
  const walls = plan.room && !plan.roomError ? wallFrames(solvedRoom(plan.room, layout.room)) : null;
  const frames = walls ? [...walls.byId.values()] : [];
  return fastenersOfTops(plan.tops, layout.bases, frames, settings.screws, plan.movement.slot);
}

function slabLines(plan: Plan, { stock, material, step }: Layout): OrderLine[] {
  const counts = new Map<string, number>();
  for (const slab of plan.nest?.slabs ?? []) counts.set(slab.stock, (counts.get(slab.stock) ?? 0) + 1);
  const letters = (id: string) =>
    (plan.nest?.slabs ?? []).filter((slab) => slab.stock === id).flatMap((slab) => slab.parts.map((part) => part.id));
  const line = (entry: StockSlab | RackPiece, rack: boolean): OrderLine[] => {
    const quantity = counts.get(entry.id) ?? 0;
    if (quantity === 0) return [];
    const thickness = entry.thickness ?? material.thickness;
    const name = `${entry.species ?? material.species}, ${rack ? 'rack' : 'slab'} ${entry.id}`;
    return [
      {
        group: rack ? 'From the rack' : 'Slabs to buy',
        item: name.charAt(0).toUpperCase() + name.slice(1),
        size: sizeWords([thickness, entry.depth, entry.length], step),
        quantity,
        unit: 'pcs',
        note: `for ${[...new Set(letters(entry.id))].join(', ')}`,
        eachCents: entry.price ?? (rack ? 0 : null),
      },
    ];
  };
  return [...stock.slabs.flatMap((slab) => line(slab, false)), ...stock.rack.flatMap((piece) => line(piece, true))];
}

/** Pieces that are not on the slab plan: thinner strips come from other stock. */
function stripLines(plan: Plan, { strips, material, step }: Layout): OrderLine[] {
  const nested = new Set(plan.instance.parts.map((part) => part.id));
  return plan.pieces
    .filter((piece) => !nested.has(piece.letter))
    .map((piece) => ({
      group: 'Strips',
      item: `${piece.letter}, ${strips.find((strip) => strip.id === piece.on)?.label || 'piece'} of ${material.species}`,
      size: sizeWords([piece.thickness, piece.depth, piece.front], step),
      quantity: piece.count,
      unit: 'pcs',
      note: 'net; not on the slab plan',
      eachCents: null,
    }));
}

const CONNECTOR_NAMES = { 'loose tenon': 'Loose tenons', dowel: 'Dowels', biscuit: 'Biscuits' } as const;

function hardwareLines(
  plan: Plan,
  fasteners: readonly Fastener[],
  needs: MaterialsList,
  { screws, connectors }: ShopSettings,
): OrderLine[] {
  const counted = (item: string, size: string, quantity: number, note: string): OrderLine[] =>
    quantity > 0 ? [{ group: 'Hardware', item, size, quantity, unit: 'pcs', note, eachCents: null }] : [];
  const long = plan.screws ? `${formatLength(plan.screws.length, '1/16')} in` : 'no stock length fits';
  const slotted = fasteners.filter((fastener) => fastener.row === 'back').length;
  const across = `mortise ${formatLength(connectors.width, '1/16')} in`;
  const site = plan.joints.filter((joint) => joint.assembled === 'site').length;
  return [
    ...counted('Wood screws', long, needs.screws, `from below, shank ${screws.shank} in`),
    ...counted('Washers', 'over the slots', slotted, 'under slotted screws'),
    ...counted(CONNECTOR_NAMES[connectors.kind], across, needs.connectors, 'in the joints'),
    ...counted('Drawbolts', '', needs.drawbolts, `${site} ${site === 1 ? 'joint' : 'joints'} closed on site`),
  ];
}

function wetLines({ finish }: Layout, needs: MaterialsList): OrderLine[] {
  const lines: OrderLine[] = [];
  const add = (line: Pick<OrderLine, 'item' | 'size' | 'quantity' | 'unit' | 'note'>) =>
    lines.push({ group: 'Glue and finish', eachCents: null, ...line });
  if (needs.glueOunces > 0)
    add({ item: 'Wood glue, water resistant', size: '', quantity: needs.glueOunces, unit: 'fl oz', note: 'joints and seams' }); // prettier-ignore
  if (needs.finishQuarts > 0) {
    const coats = `${needs.coats} ${needs.coats === 1 ? 'coat' : 'coats'}; the first on every side`;
    add({ item: FINISHES[finish.kind].name, size: '', quantity: needs.finishQuarts, unit: 'qt', note: coats });
  }
  return lines;
}

function abrasiveLines(plan: Plan, { finish }: Layout, needs: MaterialsList): OrderLine[] {
  if (plan.pieces.length === 0) return [];
  const disc = (grit: number, quantity: number, note: string): OrderLine => ({
    group: 'Abrasives',
    item: `Sanding discs, grit ${grit}`,
    size: '6 in',
    quantity,
    unit: 'discs',
    note,
    eachCents: null,
  });
  const each = discsFor(needs.sealedSqFt);
  const between = Math.max(0, needs.coats - 1);
  return [
    ...sandingGrits(finish).map((grit) => disc(grit, each, 'all faces and edges')),
    ...(between > 0 ? [disc(BETWEEN_GRIT.value, between * each, 'between coats')] : []),
  ];
}

/** Thickness, depth and length: "1 1/2 × 25 × 120 in". */
function sizeWords(inches: readonly number[], step: Layout['step']): string {
  const words = inches.map((inch) => formatLength(inch, step).replace(/ mm$/, ''));
  return `${words.join(' × ')} ${step.endsWith('mm') ? 'mm' : 'in'}`;
}
