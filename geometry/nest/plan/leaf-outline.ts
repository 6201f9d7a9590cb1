import type { Point, Polygon } from '../../core/point';
import { boundingBox } from '../../core/polygon';
import type { NestPlacement } from '../types';
import type { Leaf } from './cut-tree';

/**
 * A part's outline where it lies on the slab, counter-clockwise: mirrored in y if `turnedOver`, then turned by 180 degrees
 * if `turned`, then moved so that its smallest x and y are (x, y).
 */
export function placedOutline(outline: Polygon, place: Omit<NestPlacement, 'id'>): Polygon {
  const sx = place.turned ? -1 : 1;
  const sy = place.turned !== place.turnedOver ? -1 : 1;
  const moved = outline.map(([x, y]): Point => [x * sx, y * sy]);
  const box = boundingBox(moved);
  const placed = moved.map(([x, y]): Point => [x - box.minX + place.x, y - box.minY + place.y]);
  // One mirror runs the outline the other way round; a half turn does not.
  return sx * sy < 0 ? placed.reverse() : placed;
}

export const leafOutline = ({ member, x, y, turned, over }: Leaf): Polygon =>
  placedOutline(member.shape.outline, { x, y, turned, turnedOver: over });
