import type { Point, Polygon } from '../../core/point';
import { area, boundingBox, counterClockwise } from '../../core/polygon';
import { SAME_SIZE } from './tolerance';

/** A part as its row sees it: the trapezoid with the part's full depth and one straight line at each end that holds the outline. */
export interface PartShape {
  /** Outline moved so that its smallest x and y are 0, counter-clockwise. */
  readonly outline: Polygon;
  readonly area: number;
  readonly length: number;
  readonly depth: number;
  /** x at mid-depth where the trapezoid begins, and its length there. */
  readonly start: number;
  readonly mid: number;
  /** Slopes dx/dy of its ends. */
  readonly left: number;
  readonly right: number;
  /** The trapezoid is the outline itself. */
  readonly exact: boolean;
}

/** Reads the trapezoid of a convex outline. @throws RangeError when the outline has no area or is not convex */
export function partShape(given: Polygon): PartShape {
  const box = boundingBox(given);
  const outline = dropStraight(counterClockwise(given).map(([x, y]): Point => [x - box.minX, y - box.minY]));
  const length = box.maxX - box.minX;
  const depth = box.maxY - box.minY;
  if (outline.length < 3 || !(depth > SAME_SIZE) || !(length > SAME_SIZE)) throw new RangeError('outline has no area');
  if (!isConvex(outline)) throw new RangeError('outline is not convex');
  const left = leftLine(outline, depth);
  // A mirrored outline runs clockwise, so it is read backwards.
  const mirrored = outline.map(([x, y]): Point => [-x, y]).reverse();
  const right = leftLine(mirrored, depth);
  const mid = -right.at - left.at;
  const size = area(outline);
  return {
    outline,
    area: size,
    length,
    depth,
    start: left.at,
    mid,
    left: left.slope,
    right: -right.slope,
    exact: Math.abs(mid * depth - size) < SAME_SIZE * (length + depth),
  };
}

/**
 * The line along one of the outline's left edges, or square, that cuts off most while the outline stays to its right:
 * its x at mid-depth and its slope dx/dy.
 */
function leftLine(outline: Polygon, depth: number): { at: number; slope: number } {
  const half = depth / 2;
  const slopes = [0];
  outline.forEach(([x, y], i) => {
    const [nx, ny] = outline[(i + 1) % outline.length]!;
    // Counter-clockwise, the left side runs towards smaller y.
    if (ny < y - SAME_SIZE) slopes.push((nx - x) / (ny - y));
  });
  let best = { at: -Infinity, slope: 0 };
  for (const slope of slopes) {
    const at = Math.min(...outline.map(([x, y]) => x - slope * (y - half)));
    if (at > best.at + SAME_SIZE) best = { at, slope };
  }
  return best;
}

function dropStraight(outline: Polygon): Polygon {
  const distinct = outline.filter((p, i) => {
    const q = outline[(i + 1) % outline.length]!;
    return Math.hypot(p[0] - q[0], p[1] - q[1]) > SAME_SIZE;
  });
  return distinct.filter((p, i) => Math.abs(turnAt(distinct, i)) > SAME_SIZE * reach(distinct, i, p));
}

function turnAt(outline: Polygon, i: number): number {
  const a = outline[(i + outline.length - 1) % outline.length]!;
  const b = outline[i]!;
  const c = outline[(i + 1) % outline.length]!;
  return (b[0] - a[0]) * (c[1] - b[1]) - (b[1] - a[1]) * (c[0] - b[0]);
}

function reach(outline: Polygon, i: number, p: Point): number {
  const a = outline[(i + outline.length - 1) % outline.length]!;
  const c = outline[(i + 1) % outline.length]!;
  return Math.hypot(p[0] - a[0], p[1] - a[1]) + Math.hypot(c[0] - p[0], c[1] - p[1]);
}

/** Every corner turns left, and the whole outline goes round once. */
function isConvex(outline: Polygon): boolean {
  let turned = 0;
  for (let i = 0; i < outline.length; i++) {
    if (turnAt(outline, i) < 0) return false;
    const a = outline[i]!;
    const b = outline[(i + 1) % outline.length]!;
    const c = outline[(i + 2) % outline.length]!;
    turned += Math.atan2(
      turnAt(outline, (i + 1) % outline.length),
      (b[0] - a[0]) * (c[0] - b[0]) + (b[1] - a[1]) * (c[1] - b[1]),
    );
  }
  return turned < 3 * Math.PI;
}
