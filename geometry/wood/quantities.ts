import type { Piece, TopJoint, TopSeam } from '../top/types';
import { distance } from '../core/vector';

const SQUARE_INCHES_PER_SQUARE_FOOT = 144;
const OUNCES_PER_GALLON = 128;
/** Nothing is bought or mixed to the last drop. */
const SPARE = 1.1;

/** Square inches of one piece that are sealed: both faces net of cutouts, and every edge once. */
export function sealedArea(piece: Pick<Piece, 'netArea' | 'outline' | 'thickness' | 'count'>): number {
  const around = piece.outline.reduce(
    (sum, point, i) => sum + distance(point, piece.outline[(i + 1) % piece.outline.length]!),
    0,
  );
  return (2 * piece.netArea + around * piece.thickness) * piece.count;
}

/** Quarts for all coats, a tenth to spare; square inches in. */
export function finishQuarts(area: number, coats: number, sqFtPerQuart: number): number {
  return (SPARE * coats * area) / SQUARE_INCHES_PER_SQUARE_FOOT / sqFtPerQuart;
}

/** Glue for joints and seams, fluid ounces, a tenth to spare; square inches of glue line in. */
export function glueOunces(area: number, sqFtPerGallon: number): number {
  return (SPARE * OUNCES_PER_GALLON * area) / SQUARE_INCHES_PER_SQUARE_FOOT / sqFtPerGallon;
}

/** Square inches of glue line: length of joints and of what is left of the seams, by the thickness. */
export function glueArea(
  joints: readonly Pick<TopJoint, 'length'>[],
  seams: readonly Pick<TopSeam, 'visible'>[],
  thickness: number,
): number {
  const inches = joints.reduce((sum, j) => sum + j.length, 0) + seams.reduce((sum, s) => sum + s.visible, 0);
  return inches * thickness;
}
