import { intersect } from '@/geometry/core/line';
import type { Point } from '@/geometry/core/point';
import { along, distance, subtract } from '@/geometry/core/vector';

/** A fixed corner that a wall leads from to the corner being moved, and the bearing of the wall before it, if any. */
export interface SnapAnchor {
  readonly at: Point;
  /** Bearing of the neighbouring wall, radians; the drawing's own axes when null. */
  readonly bearing: number | null;
}

export interface Snapped {
  readonly at: Point;
  /** How many of the anchors are now square or at 45 to their neighbour. */
  readonly snapped: number;
}

const EIGHTH = Math.PI / 4;

/** How far off square or 45 a drawn wall may be and still be meant so, radians. */
const CATCH = (7 * Math.PI) / 180;

/** Sketched lengths are rough; whole inches keep them tidy. */
const TIDY = 1;

/**
 * A corner drawn freehand, put where its walls stand square or at 45 degrees to their neighbours, if they nearly do. The
 * tape overrules the sketch, so this only has to be what was meant.
 *
 * @param to - where the finger is, inches
 * @param anchors - the fixed ends of the one or two walls that meet in the corner
 */
export function snapCorner(to: Point, anchors: readonly SnapAnchor[]): Snapped {
  const lines = anchors.map((anchor) => ({ anchor, bearing: caught(anchor, to) }));
  const held = lines.filter((line): line is { anchor: SnapAnchor; bearing: number } => line.bearing !== null);
  if (held.length === 2) {
    const [a, b] = held.map(({ anchor, bearing }) => ({ origin: anchor.at, direction: direction(bearing) }));
    const crossing = intersect(a!, b!);
    // Two nearly parallel walls cross far away, where nobody drew.
    if (crossing && distance(crossing, to) < distance(to, anchors[0]!.at)) return { at: clean(crossing), snapped: 2 };
  }
  const [first] = held;
  if (!first) return { at: [tidy(to[0]), tidy(to[1])], snapped: 0 };
  const reach = Math.max(TIDY, tidy(distance(first.anchor.at, to)));
  return { at: clean(along(first.anchor.at, direction(first.bearing), reach)), snapped: 1 };
}

/** The bearing nearest to the drawn one that is square or at 45, or null when none is near. */
function caught({ at, bearing }: SnapAnchor, to: Point): number | null {
  if (distance(at, to) < TIDY) return null;
  const [dx, dy] = subtract(to, at);
  const drawn = Math.atan2(dy, dx);
  const base = bearing ?? 0;
  const snapped = base + Math.round((drawn - base) / EIGHTH) * EIGHTH;
  return Math.abs(drawn - snapped) <= CATCH ? snapped : null;
}

const direction = (bearing: number): Point => [Math.cos(bearing), Math.sin(bearing)];

/** Takes the dust of sines and cosines off: a square wall then lies exactly square. */
const clean = ([x, y]: Point): Point => [Math.round(x * 1e6) / 1e6, Math.round(y * 1e6) / 1e6];

const tidy = (inches: number): number => Math.round(inches / TIDY) * TIDY;
