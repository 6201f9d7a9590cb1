import { MaxRectsPacker, PACKING_LOGIC } from 'maxrects-packer';

import type { NestInstance, NestPart, NestSlab } from '@/geometry/nest/types';

interface Box {
  readonly width: number;
  readonly height: number;
  readonly x: number;
  readonly y: number;
}

const LOGICS = [PACKING_LOGIC.MAX_AREA, PACKING_LOGIC.MAX_EDGE, PACKING_LOGIC.FILL_WIDTH];

/**
 * What the slabs cost, cents, when a general rectangle packer lays each part as the box round it, a kerf wider and deeper,
 * never turned across the grain. Tried with every size of slab alone and with the size that gives the most area for the money
 * chosen anew for each slab, with every logic of the packer; each slab filled is then changed for the cheapest that is long
 * enough. The least of all.
 *
 * @returns Infinity when a part fits no slab
 */
export function rectanglePackerCost(instance: NestInstance): number {
  const boxes = instance.parts.flatMap((part) =>
    Array.from({ length: part.count ?? 1 }, () => boxOf(part, instance.kerf)),
  );
  let best = Infinity;
  for (const logic of LOGICS)
    for (const slab of [null, ...instance.stock.filter((s) => s.count === null)])
      best = Math.min(best, packAll(instance, boxes, slab, logic));
  return best;
}

function boxOf({ outline }: NestPart, kerf: number): Box {
  const x = outline.map((p) => p[0]);
  const y = outline.map((p) => p[1]);
  return { width: Math.max(...x) - Math.min(...x) + kerf, height: Math.max(...y) - Math.min(...y) + kerf, x: 0, y: 0 };
}

/** Slab after slab; rack pieces first, they cost least. */
function packAll(instance: NestInstance, boxes: readonly Box[], only: NestSlab | null, logic: PACKING_LOGIC): number {
  let waiting = [...boxes];
  const rack = instance.stock.filter((s) => s.count === 1 && !s.defects?.length);
  const bought = instance.stock.filter((s) => (s.count ?? null) === null);
  let cost = 0;
  while (waiting.length > 0) {
    const piece = rack.shift();
    const onRack = piece && firstBin(instance, piece, waiting, logic);
    if (piece && !onRack) continue;
    const offers = onRack
      ? [{ cents: piece!.price, filled: onRack }]
      : bought.flatMap((slab) => {
          const filled = firstBin(instance, slab, waiting, logic);
          return filled ? [{ slab, cents: shortestFor(instance, bought, filled, slab), filled }] : [];
        });
    const fixed = offers.filter((o) => 'slab' in o && o.slab === only);
    const choice = (fixed.length > 0 ? fixed : offers).sort(
      (a, b) => a.cents / area(a.filled) - b.cents / area(b.filled),
    )[0];
    if (!choice) return Infinity;
    cost += choice.cents;
    const done = new Set(choice.filled);
    waiting = waiting.filter((box) => !done.has(box));
  }
  return cost;
}

const area = (boxes: readonly Box[]): number => boxes.reduce((sum, b) => sum + b.width * b.height, 0);
const trimOf = (instance: NestInstance, slab: NestSlab): number => 2 * (slab.trim ?? instance.trim);

/** The boxes of the first bin, moved to where they lie; null when none fits. The last kerf on each side may leave the slab. */
function firstBin(instance: NestInstance, slab: NestSlab, boxes: readonly Box[], logic: PACKING_LOGIC): Box[] | null {
  const width = slab.length - trimOf(instance, slab) + instance.kerf;
  const height = slab.depth + instance.kerf;
  const packer = new MaxRectsPacker<Box>(width, height, 0, {
    smart: false,
    pot: false,
    square: false,
    allowRotation: false,
    logic,
  });
  packer.addArray(boxes.filter((b) => b.width <= width && b.height <= height));
  const bin = packer.bins.map((b) => b.rects).sort((a, b) => area(b) - area(a))[0];
  return bin && bin.length > 0 ? bin : null;
}

/** Cents of the cheapest slab that holds what this one was filled with. */
function shortestFor(
  instance: NestInstance,
  bought: readonly NestSlab[],
  filled: readonly Box[],
  slab: NestSlab,
): number {
  const end = Math.max(...filled.map((b) => b.x + b.width)) - instance.kerf;
  const longEnough = bought.filter((s) => s.depth >= slab.depth && s.length - trimOf(instance, s) >= end - 1e-6);
  return Math.min(slab.price, ...longEnough.map((s) => s.price));
}
