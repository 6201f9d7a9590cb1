import type { Point, Polygon } from '@/geometry/core/point';
import type { NestInstance, NestPart, NestPlacement, NestPlan } from '@/geometry/nest/types';
import { spanOf } from './polygons';

/** A placement with the part it lays and where its outline comes to lie. */
export interface LaidPart {
  readonly part: NestPart;
  readonly place: NestPlacement;
  readonly outline: Polygon;
}

/** Mirror in y if turned over, then half a turn if turned, then smallest x and y to (x, y). */
function laidOutline(part: NestPart, place: NestPlacement): Polygon {
  let points: Point[] = part.outline.map(([x, y]) => [x, y]);
  if (place.turnedOver) points = points.map(([x, y]): Point => [x, -y]).reverse();
  if (place.turned) points = points.map(([x, y]): Point => [-x, -y]);
  const { minX, minY } = spanOf(points);
  const moved = points.map(([x, y]): Point => [x - minX + place.x, y - minY + place.y]);
  return moved.reduce(
    (s, [x, y], i) => s + x * moved[(i + 1) % moved.length]![1] - moved[(i + 1) % moved.length]![0] * y,
    0,
  ) < 0
    ? moved.reverse()
    : moved;
}

/** Every slab's parts at their places; parts the instance does not know are left out. */
export function layParts(instance: NestInstance, plan: NestPlan): (LaidPart | null)[][] {
  const byId = new Map(instance.parts.map((p) => [p.id, p]));
  return plan.slabs.map((slab) =>
    slab.parts.map((place) => {
      const part = byId.get(place.id);
      return part ? { part, place, outline: laidOutline(part, place) } : null;
    }),
  );
}

export const isLaid = (part: LaidPart | null): part is LaidPart => part !== null;
