import { intersect } from '../../core/line';
import type { Point, Polygon } from '../../core/point';
import { along, distance, scale } from '../../core/vector';
import type { RoomWalls, WallFrame } from '../../top/wall-frame';

/** Thickness a wall is drawn with, inches; nobody measured it. */
export const WALL_THICKNESS = 4.5;

/** A mitred corner of two bodies may reach this many thicknesses away from the wall's corner; sharper ones end square. */
const LONGEST_MITER = 4;

/** What stands behind each wall, joined at the corners; counter-clockwise, room axes. */
export function wallBodies(walls: RoomWalls): { readonly wall: WallFrame; readonly outline: Polygon }[] {
  return walls.byIndex.flatMap((wall) => {
    if (!wall) return [];
    const left = outerCorner(wall, neighbour(walls, wall.previous), wall.start);
    const right = outerCorner(wall, neighbour(walls, wall.next), wall.end);
    return [{ wall, outline: [wall.start, wall.end, right, left] }];
  });
}

/** Unit vector out of the room. */
export const outward = (wall: WallFrame): Point => scale(wall.inward, -1);

const neighbour = (walls: RoomWalls, index: number | null): WallFrame | null =>
  index === null ? null : (walls.byIndex[index] ?? null);

function outerCorner(wall: WallFrame, other: WallFrame | null, corner: Point): Point {
  const square = along(corner, outward(wall), WALL_THICKNESS);
  if (!other) return square;
  const crossing = intersect(outerLine(wall), outerLine(other));
  return crossing && distance(crossing, corner) <= LONGEST_MITER * WALL_THICKNESS ? crossing : square;
}

const outerLine = (wall: WallFrame) => ({
  origin: along(wall.start, outward(wall), WALL_THICKNESS),
  direction: wall.along,
});
