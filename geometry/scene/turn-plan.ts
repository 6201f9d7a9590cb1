import type { RoomReadings } from '../core/layout';
import type { Line } from '../core/line';
import type { Point, Polygon } from '../core/point';
import { rotate } from '../core/vector';
import type { Plan } from '../plan/types';
import type { Piece, Tops } from '../top/types';

/**
 * How far the drawing is turned from the room's own axes (wall 1 along +x) so that it lies as it was traced, radians
 * counter-clockwise.
 */
export function viewTurn(room: Pick<RoomReadings, 'sketch'>): number {
  const [from, to] = room.sketch;
  if (!from || !to || (from[0] === to[0] && from[1] === to[1])) return 0;
  return Math.atan2(to[1] - from[1], to[0] - from[0]);
}

/** The same plan with everything that lies in the room turned about its origin, for drawing. Lengths stay as they are. */
export function turnPlan(plan: Plan, angle: number): Plan {
  if (angle === 0) return plan;
  const tops = turnTops(plan.tops, angle);
  return {
    ...plan,
    room: plan.room && {
      ...plan.room,
      points: turnAll(plan.room.points, angle),
      walls: plan.room.walls.map((wall) => ({ ...wall, bearing: wall.bearing + angle })),
    },
    tops,
    pieces: plan.pieces.map((piece) => ({ ...turnPiece(piece, angle), weight: piece.weight })),
    joints: plan.joints.map((joint) => ({
      ...joint,
      from: rotate(joint.from, angle),
      to: rotate(joint.to, angle),
    })),
    seams: tops.seams,
    cutouts: tops.cutouts,
  };
}

const turnAll = (points: readonly Point[], angle: number): Polygon => points.map((point) => rotate(point, angle));

function turnPiece<P extends Piece>(piece: P, angle: number): P {
  return {
    ...piece,
    outline: turnAll(piece.outline, angle),
    origin: rotate(piece.origin, angle),
    grain: rotate(piece.grain, angle),
  };
}

function turnLine(line: Line, angle: number): Line {
  return { origin: rotate(line.origin, angle), direction: rotate(line.direction, angle) };
}

function turnTops(tops: Tops, angle: number): Tops {
  const turnEnds = <T extends { readonly from: Point; readonly to: Point }>(item: T): T => ({
    ...item,
    from: rotate(item.from, angle),
    to: rotate(item.to, angle),
  });
  return {
    ...tops,
    runs: tops.runs.map((run) => ({
      ...run,
      back: turnLine(run.back, angle),
      front: turnLine(run.front, angle),
      outline: turnAll(run.outline, angle),
    })),
    pieces: tops.pieces.map((piece) => turnPiece(piece, angle)),
    joints: tops.joints.map(turnEnds),
    seams: tops.seams.map(turnEnds),
    cutouts: tops.cutouts.map((cutout) => ({ ...cutout, outline: turnAll(cutout.outline, angle) })),
  };
}
