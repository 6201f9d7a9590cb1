import { movePath, roundCorners, type ArcPath } from '../core/arc-path';
import type { Point } from '../core/point';
import { boundingBox, counterClockwise } from '../core/polygon';
import { recoverArcs } from '../core/recover-arcs';
import { leftNormal } from '../core/vector';
import type { Piece, PlacedCutout } from './types';

/** Inches: corners of an end stand this close to the end's line. */
const AT_END = 1e-6;

export type PathPiece = Pick<Piece, 'shape' | 'left' | 'right' | 'finishedEdges' | 'cutouts' | 'origin' | 'grain'>;

/**
 * A piece as it leaves the saw and the router: its shape with the exposed corners of its open ends rounded. The front
 * corner of an open end is exposed, and the back one where the back edge is seen.
 *
 * @returns in the piece's shape axes, counter-clockwise
 */
export function piecePath(piece: PathPiece): ArcPath {
  const shape = counterClockwise(piece.shape);
  const radii = new Map<number, number>();
  for (const { corner, radius } of exposedCorners({ ...piece, shape })) radii.set(corner, radius);
  return roundCorners(shape, radii);
}

/** Corners of a piece that are rounded: place in its shape, radius in inches, and which end and edge they lie at. */
export function exposedCorners(piece: Pick<Piece, 'shape' | 'left' | 'right' | 'finishedEdges'>): readonly {
  readonly corner: number;
  readonly radius: number;
  readonly end: 'left' | 'right';
  readonly edge: 'front' | 'back';
}[] {
  const box = boundingBox(piece.shape);
  return (['left', 'right'] as const).flatMap((end) => {
    const { kind, radius } = piece[end];
    if (kind !== 'open' || radius <= 0) return [];
    const x = end === 'left' ? box.minX : box.maxX;
    const at = piece.shape.flatMap((p, i) => (Math.abs(p[0] - x) < AT_END ? [i] : []));
    if (at.length < 2) return [];
    const byY = at.sort((a, b) => piece.shape[a]![1] - piece.shape[b]![1]);
    const front = { corner: byY[0]!, radius, end, edge: 'front' as const };
    const back = { corner: byY.at(-1)!, radius, end, edge: 'back' as const };
    return piece.finishedEdges.includes('back') ? [front, back] : [front];
  });
}

/** What is cut out of a piece, in its shape axes, corners as true arcs. */
export function cutoutPathsOf(
  piece: PathPiece,
  cutouts: readonly Pick<PlacedCutout, 'id' | 'radius'>[],
): readonly { readonly id: string; readonly path: ArcPath }[] {
  return piece.cutouts.map(({ id, outline }) => {
    const radius = cutouts.find((cutout) => cutout.id === id)?.radius ?? 0;
    return { id, path: recoverArcs(counterClockwise(outline), radius) };
  });
}

/** From a piece's shape axes to the room's. */
export function shapeToRoom({ origin, grain }: Pick<Piece, 'origin' | 'grain'>): (p: Point) => Point {
  const back = leftNormal(grain);
  return ([x, y]) => [origin[0] + grain[0] * x + back[0] * y, origin[1] + grain[1] * x + back[1] * y];
}

/** The piece's path where it lies in the room. */
export const pieceInRoom = (piece: PathPiece): ArcPath => movePath(piecePath(piece), shapeToRoom(piece));
