import { wallLabel, type RoomReadings, type Wall } from '../core/layout';
import { distance } from '../core/vector';
import type { RoomInput, WallInput } from '../room/types';

/** A traced wall is a guess of this standard deviation, inches: enough to draw with, nothing to cut from. */
const SKETCH_SD = 12;

/**
 * The measured room as the solver takes it. Walls nobody has taped have no length.
 *
 * @param provisional - fill untaped walls with their sketched length, so that there is something to draw
 */
export function roomInputOf(room: RoomReadings, provisional = false): RoomInput {
  return {
    closed: room.closed,
    walls: room.walls.map((wall, i) => wallInput(wall, provisional ? sketchedLength(room, i) : null)),
    corners: room.corners.map((corner) => ({
      between: corner.between,
      nominalDeg: corner.nominal,
      ...(corner.triangle && {
        triangle: {
          a: corner.triangle.a.value,
          b: corner.triangle.b.value,
          c: corner.triangle.c.value,
          // Beside a protractor reading the corner's own is in degrees.
          ...sdOf(corner.triangle.c.sd ?? (corner.angle === undefined ? corner.sd : undefined)),
        },
      }),
      ...(corner.angle !== undefined && { angleDeg: corner.angle }),
      ...(corner.angle !== undefined && corner.sd !== undefined && { angleSdDeg: corner.sd }),
    })),
    ties: room.ties.map((tie) => ({
      id: tie.id,
      from: tie.from,
      to: tie.to,
      length: tie.length.value,
      ...(tie.length.sd !== undefined && { sd: tie.length.sd }),
    })),
    tapeSd: room.tapeSd,
    labels: Object.fromEntries(room.walls.map((wall, i) => [wall.id, wallLabel(i)])),
    trust: room.trust,
    ignore: room.ignore,
    ...(room.sketch.length > 0 && { sketch: room.sketch }),
  };
}

const sdOf = (sd: number | undefined) => (sd === undefined ? {} : { sd });

/** Walls without a tape reading, by id. */
export function untapedWalls(room: RoomReadings): readonly string[] {
  return room.walls.filter((wall) => wall.length.length === 0).map((wall) => wall.id);
}

function wallInput(wall: Wall, guess: number | null): WallInput {
  const sd = wall.length.find((reading) => reading.sd !== undefined)?.sd;
  if (wall.length.length === 0 && guess !== null)
    return { id: wall.id, lengths: [guess], sd: SKETCH_SD, profile: wall.profile };
  return {
    id: wall.id,
    lengths: wall.length.map((reading) => reading.value),
    ...(sd !== undefined && { sd }),
    profile: wall.profile,
  };
}

function sketchedLength(room: RoomReadings, index: number): number | null {
  const from = room.sketch[index];
  const to = room.sketch[room.closed ? (index + 1) % room.sketch.length : index + 1];
  if (!from || !to) return null;
  const length = distance(from, to);
  return length > 0 ? length : null;
}
