import { arcPoints } from '../core/arc';
import type { Cutout } from '../core/layout';
import type { Point, Polygon } from '../core/point';
import { boundingBox, counterClockwise, type Box } from '../core/polygon';

/** Inches; under any tool, over rounding. */
const SAME_POINT = 1e-9;

/** A cutout's shape in the axes of its deck: x along the grain, y from the front edge. */
export interface CutoutShape {
  readonly outline: Polygon;
  readonly box: Box;
  /** Largest corner radius that fits, inches; half the width for a tap hole. */
  readonly radius: number;
}

/**
 * Outline of a cutout. A maker's template overrides the typed size; an apron-front sink is open to the front edge; a tap
 * hole is round.
 *
 * @param centreX - the cutout's centre, own x of its deck
 */
export function cutoutShape(cutout: Cutout, centreX: number): CutoutShape {
  if (cutout.outline && cutout.outline.length >= 3) return templateShape(cutout, cutout.outline, centreX);
  const apron = cutout.mount === 'apron';
  const [minX, maxX] = [centreX - cutout.width / 2, centreX + cutout.width / 2];
  const [minY, maxY] = [apron ? Math.min(0, cutout.setback) : cutout.setback, cutout.setback + cutout.depth];
  const half = Math.min(maxX - minX, maxY - minY) / 2;
  const radius = Math.max(0, Math.min(cutout.kind === 'tap' ? half : cutout.radius, half));
  const front = apron ? 0 : radius;
  const outline = roundedRectangle({ minX, minY, maxX, maxY }, [front, front, radius, radius]);
  return { outline, box: { minX, minY, maxX, maxY }, radius };
}

function templateShape(cutout: Cutout, template: Polygon, centreX: number): CutoutShape {
  const own = boundingBox(template);
  // The template's own front side is its lowest point, whatever zero its maker drew it from.
  const dx = centreX;
  const dy = cutout.setback - own.minY;
  const outline = counterClockwise(template).map(([x, y]): Point => [x + dx, y + dy]);
  return { outline, box: boundingBox(outline), radius: cutout.radius };
}

/** Counter-clockwise from the front left corner; radii front left, front right, back right, back left. */
function roundedRectangle(
  { minX, minY, maxX, maxY }: Box,
  [frontLeft, frontRight, backRight, backLeft]: readonly [number, number, number, number],
): Polygon {
  const quarter = Math.PI / 2;
  const points = [
    ...arcPoints([minX + frontLeft, minY + frontLeft], frontLeft, 2 * quarter, 3 * quarter),
    ...arcPoints([maxX - frontRight, minY + frontRight], frontRight, 3 * quarter, 4 * quarter),
    ...arcPoints([maxX - backRight, maxY - backRight], backRight, 0, quarter),
    ...arcPoints([minX + backLeft, maxY - backLeft], backLeft, quarter, 2 * quarter),
  ];
  // Where two arcs fill a side between them, the end of one is the start of the next.
  return points.filter((p, i) => {
    const q = points[(i + 1) % points.length]!;
    return Math.abs(p[0] - q[0]) > SAME_POINT || Math.abs(p[1] - q[1]) > SAME_POINT;
  });
}
