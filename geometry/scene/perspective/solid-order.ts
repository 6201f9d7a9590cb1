import type { Point, Polygon } from '../../core/point';
import { centroid } from '../../core/polygon';
import { cross, distance, subtract } from '../../core/vector';

/** Inches that two outlines may lie in each other and still count as side by side. */
const TOUCH = 0.25;

/**
 * Upright things in the order of painting, the farthest first: of two, the one on the eye's side of a line between them
 * is painted later.
 *
 * @param footprintOf - outline on the floor, counter-clockwise
 */
export function inOrderOfPainting<T>(things: readonly T[], footprintOf: (thing: T) => Polygon, eye: Point): T[] {
  const left = things.map((thing) => {
    const outline = footprintOf(thing);
    return { thing, outline, away: distance(centroid(outline), eye) };
  });
  left.sort((a, b) => b.away - a.away);
  const sorted: T[] = [];
  while (left.length > 0) {
    // Where three lie round each other in a ring, the farthest begins.
    const next = left.findIndex((a) => left.every((b) => a === b || !covers(a.outline, b.outline, eye)));
    sorted.push(left.splice(Math.max(0, next), 1)[0]!.thing);
  }
  return sorted;
}

/** Whether a stands before b, as seen from the eye. */
function covers(a: Polygon, b: Polygon, eye: Point): boolean {
  const parted = partedBy(a, b);
  if (parted) return sideOf(parted, eye) >= 0;
  const other = partedBy(b, a);
  return other ? sideOf(other, eye) < 0 : false;
}

type Edge = readonly [Point, Point];

/** An edge of a whose line has all of b on its outer side. */
function partedBy(a: Polygon, b: Polygon): Edge | null {
  for (let i = 0; i < a.length; i++) {
    const edge: Edge = [a[i]!, a[(i + 1) % a.length]!];
    if (
      distance(...edge) > TOUCH &&
      b.every((p) => sideOf(edge, p) <= TOUCH) &&
      a.every((p) => sideOf(edge, p) >= -TOUCH)
    )
      return edge;
  }
  return null;
}

/** Inches to the left of an edge. */
const sideOf = ([from, to]: Edge, p: Point): number =>
  cross(subtract(to, from), subtract(p, from)) / distance(from, to);
