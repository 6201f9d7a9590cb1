import type { RoomReadings } from '../core/layout';
import type { Point } from '../core/point';
import type { ProfileStation, RoomFit } from '../room/types';

/** A wall as the fit left it: adjusted length, inches, and its bow. */
export interface SolvedWall {
  readonly id: string;
  readonly length: number;
  readonly profile: readonly ProfileStation[];
}

/** A corner as the fit left it: interior angle and its standard deviation, both degrees. */
export interface SolvedCorner {
  readonly between: readonly [string, string];
  readonly angle: number;
  readonly sd: number;
}

/**
 * All that the tops need of the room. Walls run left to right as a person in the room sees them, so the room lies on the
 * right-hand side of each; a closed room's points run clockwise (n points), an open chain has n + 1.
 */
export interface SolvedRoom {
  readonly points: readonly Point[];
  readonly closed: boolean;
  readonly walls: readonly SolvedWall[];
  readonly corners: readonly SolvedCorner[];
}

/** The room's fit joined with the bows that were read along its walls. */
export function solvedRoom(fit: RoomFit, readings: RoomReadings): SolvedRoom {
  const profiles = new Map(readings.walls.map((wall) => [wall.id, wall.profile]));
  return {
    points: fit.points,
    closed: fit.closed,
    walls: fit.walls.map((wall) => ({
      id: wall.id,
      length: wall.adjusted,
      profile: profiles.get(wall.id) ?? [],
    })),
    corners: fit.corners.map((corner) => ({ between: corner.between, angle: corner.angleDeg, sd: corner.sdDeg })),
  };
}
