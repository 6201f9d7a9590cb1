import type { Along } from '../core/layout';
import { wallLabel } from '../core/layout';
import type { Point } from '../core/point';
import { cross, distance, dot, rightNormal, unit } from '../core/vector';
import type { ProfileStation } from '../room/types';
import type { SolvedRoom } from './solved-room';

/** A wall of the solved room with its own directions. Room axes, inches. */
export interface WallFrame {
  readonly id: string;
  readonly index: number;
  /** Letter a person reads for it. */
  readonly label: string;
  readonly start: Point;
  readonly end: Point;
  /** Unit vector from the left end to the right end. */
  readonly along: Point;
  /** Unit vector into the room. */
  readonly inward: Point;
  readonly length: number;
  readonly profile: readonly ProfileStation[];
  /** Indices of the walls at its left and its right end; null at the ends of an open chain. */
  readonly previous: number | null;
  readonly next: number | null;
}

/** The room's walls, to be looked up. */
export interface RoomWalls {
  readonly byId: ReadonlyMap<string, WallFrame>;
  /** By place in the room; undefined where a wall's two ends coincide. */
  readonly byIndex: readonly (WallFrame | undefined)[];
}

/** Walls of the room in order. */
export function wallFrames(room: SolvedRoom): RoomWalls {
  const byIndex = room.walls.map((_, index) => wallFrame(room, index));
  return { byIndex, byId: new Map(byIndex.flatMap((wall) => (wall ? [[wall.id, wall] as const] : []))) };
}

function wallFrame(room: SolvedRoom, index: number): WallFrame | undefined {
  const { id, profile } = room.walls[index]!;
  const count = room.walls.length;
  const start = room.points[index];
  const end = room.closed ? room.points[(index + 1) % room.points.length] : room.points[index + 1];
  const along = start && end ? unit(start, end) : null;
  if (!start || !end || !along) return undefined;
  return {
    id,
    index,
    label: wallLabel(index),
    start,
    end,
    along,
    inward: rightNormal(along),
    length: distance(start, end),
    profile,
    previous: index > 0 ? index - 1 : room.closed ? count - 1 : null,
    next: index < count - 1 ? index + 1 : room.closed ? 0 : null,
  };
}

/** Interior (room side) angle between a wall and the next one, radians within (0, 2 pi): 90 degrees at an inside corner. */
export function interiorAngle(left: WallFrame, right: WallFrame): number {
  const turn = Math.atan2(cross(left.along, right.along), dot(left.along, right.along));
  return Math.PI + turn;
}

/** Inches from the wall's left end for a typed place. */
export const alongWall = (wall: WallFrame, at: Along): number => (at === 'end' ? wall.length : at);

/** Inches from the wall's left end to the foot of a point, negative before it. */
export function footOn(wall: WallFrame, point: Point): number {
  return (point[0] - wall.start[0]) * wall.along[0] + (point[1] - wall.start[1]) * wall.along[1];
}
