import type { NestInstance, NestPlan, NestSlab } from '@/geometry/nest/types';
import { CHECK_TOLERANCE, type NestFinding } from './finding';
import { isLaid, type LaidPart } from './laid-part';
import { distanceBetween, overlapDepth, spanOf } from './polygons';

/** Each part inside its slab, clear of trims, defects and the other parts' kerfs, moved only as it may be. */
export function checkPlaces(
  instance: NestInstance,
  plan: NestPlan,
  laid: readonly (readonly (LaidPart | null)[])[],
): NestFinding[] {
  return plan.slabs.flatMap((slab, i) => {
    const stock = instance.stock.find((s) => s.id === slab.stock);
    const parts = laid[i]!.filter(isLaid);
    if (!stock) return [];
    return [
      ...parts.flatMap((part) => checkMoves(part, i)),
      ...parts.flatMap((part) => checkInside(part, stock, stock.trim ?? instance.trim, i)),
      ...parts.flatMap((part) => checkDefects(part, stock, i)),
      ...parts.flatMap((a, n) => parts.slice(n + 1).flatMap((b) => checkPair(a, b, instance.kerf, i))),
    ];
  });
}

function checkMoves({ part, place }: LaidPart, slab: number): NestFinding[] {
  const found: NestFinding[] = [];
  if (place.turned && part.turn === false)
    found.push({ code: 'turn_forbidden', slab, text: `Part ${part.id} is turned and may not be.` });
  if (place.turnedOver && part.turnOver === false)
    found.push({ code: 'turn_over_forbidden', slab, text: `Part ${part.id} is turned over and may not be.` });
  return found;
}

function checkInside({ part, outline }: LaidPart, stock: NestSlab, trim: number, slab: number): NestFinding[] {
  const { minX, maxX, minY, maxY } = spanOf(outline);
  const e = CHECK_TOLERANCE;
  if (!(minX >= -e && maxX <= stock.length + e && minY >= -e && maxY <= stock.depth + e))
    return [{ code: 'outside_slab', slab, text: `Part ${part.id} lies partly outside slab ${stock.id}.` }];
  if (minX < trim - e || maxX > stock.length - trim + e)
    return [{ code: 'in_trim', slab, text: `Part ${part.id} lies in the ${trim} in trimmed off slab ${stock.id}.` }];
  return [];
}

function checkDefects({ part, outline }: LaidPart, stock: NestSlab, slab: number): NestFinding[] {
  return (stock.defects ?? []).flatMap(({ x, y, w, h }): NestFinding[] => {
    const zone = [
      [x, y],
      [x + w, y],
      [x + w, y + h],
      [x, y + h],
    ] as const;
    const hit = w > 0 && h > 0 && overlapDepth(outline, zone) > CHECK_TOLERANCE;
    return hit
      ? [{ code: 'on_defect', slab, text: `Part ${part.id} lies on the defect at ${x}, ${y} of slab ${stock.id}.` }]
      : [];
  });
}

function checkPair(a: LaidPart, b: LaidPart, kerf: number, slab: number): NestFinding[] {
  if (overlapDepth(a.outline, b.outline) > CHECK_TOLERANCE)
    return [{ code: 'parts_overlap', slab, text: `Parts ${a.part.id} and ${b.part.id} overlap.` }];
  const apart = distanceBetween(a.outline, b.outline);
  if (apart < kerf - CHECK_TOLERANCE)
    return [
      {
        code: 'kerf_missing',
        slab,
        text: `Parts ${a.part.id} and ${b.part.id} lie ${apart.toFixed(4)} in apart, under a kerf.`,
      },
    ];
  return [];
}
