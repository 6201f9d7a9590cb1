import type { Point, Polygon } from '../../core/point';
import { boundingBox, contains } from '../../core/polygon';
import { widestGap } from '../slab/widest-gap';

/** Places tried along and across a piece. */
const ALONG = 25;
const ACROSS = 9;
/** The middle of the widest stretch is kept while it has this share of the most room there is. */
const ENOUGH = 0.7;

/**
 * Where a letter stands on a piece: half way across, in the middle of the widest stretch that no cutout takes; where that
 * is cramped, the roomiest place.
 *
 * @param shape - the piece, y from its front edge; any lengths
 * @param holes - its cutouts, same axes
 */
export function letterPlace(shape: Polygon, holes: readonly Polygon[], depth: number): Point {
  const middle = depth / 2;
  const gap = widestGap(shape, holes, [middle * 0.7, middle, middle * 1.3]);
  const whole = widestGap(shape, [], [middle]);
  const { from, to } = gap.to > gap.from ? gap : whole;
  const usual: Point = [(from + to) / 2, middle];
  // Four corners and nothing cut out: nowhere is roomier than half way across.
  if (holes.length === 0 && shape.length <= 4) return usual;
  const best = roomiest(shape, holes);
  return roomAt(usual, shape, holes) >= ENOUGH * roomAt(best, shape, holes) ? usual : best;
}

function roomiest(shape: Polygon, holes: readonly Polygon[]): Point {
  const box = boundingBox(shape);
  let best: Point = [(box.minX + box.maxX) / 2, (box.minY + box.maxY) / 2];
  let most = 0;
  for (let i = 1; i < ALONG; i++) {
    for (let j = 1; j < ACROSS; j++) {
      const place: Point = [
        box.minX + ((box.maxX - box.minX) * i) / ALONG,
        box.minY + ((box.maxY - box.minY) * j) / ACROSS,
      ];
      const room = roomAt(place, shape, holes);
      if (room > most) [best, most] = [place, room];
    }
  }
  return best;
}

/** From a place to the nearest edge of an outline or a hole, 0 outside the one or inside the other. */
export function roomAt(place: Point, outline: Polygon, holes: readonly Polygon[]): number {
  if (!contains(outline, place) || holes.some((hole) => contains(hole, place))) return 0;
  return Math.min(...[outline, ...holes].map((polygon) => toEdges(place, polygon)));
}

function toEdges([px, py]: Point, polygon: Polygon): number {
  let least = Infinity;
  polygon.forEach(([ax, ay], i) => {
    const [bx, by] = polygon[(i + 1) % polygon.length]!;
    const [dx, dy] = [bx - ax, by - ay];
    const square = dx * dx + dy * dy;
    const t = square === 0 ? 0 : Math.min(1, Math.max(0, ((px - ax) * dx + (py - ay) * dy) / square));
    least = Math.min(least, Math.hypot(px - ax - t * dx, py - ay - t * dy));
  });
  return least;
}
