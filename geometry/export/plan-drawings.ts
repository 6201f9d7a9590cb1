import { movePath, straightPath } from '../core/arc-path';
import type { Layout } from '../core/layout';
import type { Point } from '../core/point';
import { boundingBox, centroid } from '../core/polygon';
import { recoverArcs } from '../core/recover-arcs';
import type { Plan } from '../plan/types';
import { cutoutPathsOf, pieceInRoom, piecePath } from '../top/piece-path';
import { label, line, type FileDrawing, type FileEntity } from './drawing';

/** Inches: letters, and clear space between pieces laid out one above the other. */
const LETTER = 3;
const APART = 8;

/** The tops as they lie in the room: pieces, cutouts, joints, seams and walls, in the room's own axes. */
export function topsDrawing(plan: Plan, name: string): FileDrawing {
  const { room, pieces, cutouts, joints, seams } = plan;
  const walls: FileEntity[] = room
    ? [{ kind: 'path', layer: 'WALLS', path: straightPath(room.points, room.closed) }]
    : [];
  return {
    title: `${name}: tops in the room`,
    entities: [
      ...walls,
      ...pieces.map((piece): FileEntity => ({ kind: 'path', layer: 'PIECES', path: pieceInRoom(piece) })),
      ...cutouts.map((cutout): FileEntity => ({
        kind: 'path',
        layer: 'CUTOUTS',
        path: recoverArcs(cutout.outline, cutout.radius),
      })),
      ...joints.map((joint) => line('JOINTS', joint.from, joint.to)),
      ...seams.map((seam) => line('SEAMS', seam.from, seam.to)),
      ...pieces.map((piece) => label(centroid(piece.outline), LETTER, piece.letter)),
    ],
  };
}

/** Every piece by itself as it is laid out on a slab, good face up, grain along x, one above the other. */
export function piecesDrawing(plan: Plan, layout: Layout, name: string): FileDrawing {
  let y = 0;
  const entities = plan.pieces.flatMap((piece): FileEntity[] => {
    const box = boundingBox(piece.shape);
    y -= box.maxY - box.minY + APART;
    const move = (p: Point): Point => [p[0] - box.minX, p[1] - box.minY + y];
    const middle = (box.maxY - box.minY) / 2 + y;
    const right = box.maxX - box.minX;
    const count = piece.count > 1 ? `, ${piece.count} alike` : '';
    return [
      { kind: 'path', layer: 'PIECES', path: movePath(piecePath(piece), move) },
      ...cutoutPathsOf(piece, plan.cutouts).map(({ path }): FileEntity => ({
        kind: 'path',
        layer: 'CUTOUTS',
        path: movePath(path, move),
      })),
      line('GRAIN', [right * 0.3, middle], [right * 0.7, middle]),
      label([right / 2, y - APART / 2], LETTER, `${piece.letter}, ${layout.material.species}${count}`),
    ];
  });
  return { title: `${name}: pieces, good face up, grain along x`, entities };
}
