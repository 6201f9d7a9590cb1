import { formatLength } from '../tape/format-length';
import { checkPaths } from './check-paths';
import type { RoomError, RoomErrorCode, RoomInput } from './types';

/**
 * Readings that no room can have, each by its name: a wall of nothing, a triangle that does not meet, a wall longer than
 * the rest of its ring together, a tie longer than the way round. Null when none is found.
 */
export function checkReadings(input: RoomInput): RoomError | null {
  return checkLengths(input) ?? checkCornerReadings(input) ?? checkRing(input) ?? checkPaths(input);
}

const error = (code: RoomErrorCode, message: string, path: string): RoomError => ({ code, message, path });

const inches = (length: number): string => `${formatLength(length, '1/32')} in`;

function checkLengths({ walls, ties }: RoomInput): RoomError | null {
  for (const [i, wall] of walls.entries()) {
    for (const length of wall.lengths) {
      const path = `walls[${i}].length`;
      if (!Number.isFinite(length)) return error('bad_length', `Wall ${wall.id}: its length is not a number.`, path);
      if (length === 0) return error('zero_wall', `Wall ${wall.id} reads 0. A wall has a length.`, path);
      if (length < 0) return error('zero_wall', `Wall ${wall.id} reads ${length}. A length is never under 0.`, path);
    }
    if (wall.sd !== undefined && !(wall.sd > 0)) return badSd(`Wall ${wall.id}`, `walls[${i}].sd`);
  }
  for (const [i, tie] of ties.entries()) {
    if (!(tie.length > 0) || !Number.isFinite(tie.length)) {
      return error('bad_length', `Tie ${tie.id} has to be longer than 0.`, `ties[${i}].length`);
    }
    if (tie.sd !== undefined && !(tie.sd > 0)) return badSd(`Tie ${tie.id}`, `ties[${i}].sd`);
    for (const side of ['from', 'to'] as const) {
      const { at } = tie[side];
      if (at === 'end' || (at >= 0 && Number.isFinite(at))) continue;
      return error(
        'bad_length',
        `Tie ${tie.id}: its mark on wall ${tie[side].wall} lies off the wall.`,
        `ties[${i}].${side}.at`,
      );
    }
  }
  return null;
}

const badSd = (name: string, path: string): RoomError =>
  error('bad_length', `${name}: its standard deviation has to be over 0.`, path);

function checkCornerReadings({ corners }: RoomInput): RoomError | null {
  for (const [i, corner] of corners.entries()) {
    const name = `Corner ${corner.between.join('-')}`;
    const path = `corners[${i}]`;
    for (const [key, degrees] of [
      ['nominal', corner.nominalDeg],
      ['angle', corner.angleDeg],
    ] as const) {
      if (degrees === undefined || (degrees > 0 && degrees < 360)) continue;
      return error('bad_room', `${name} reads ${degrees} degrees. A corner lies between 0 and 360.`, `${path}.${key}`);
    }
    if (corner.angleSdDeg !== undefined && !(corner.angleSdDeg > 0)) return badSd(name, `${path}.sd`);
    if (!corner.triangle) continue;
    const { a, b, c, sd } = corner.triangle;
    if (sd !== undefined && !(sd > 0)) return badSd(name, `${path}.triangle.sd`);
    for (const [key, side] of Object.entries({ a, b, c })) {
      if (side > 0 && Number.isFinite(side)) continue;
      return error(
        'bad_length',
        `${name}: side ${key} of its triangle has to be longer than 0.`,
        `${path}.triangle.${key}`,
      );
    }
    if (c >= a + b || c <= Math.abs(a - b)) {
      const limit = c >= a + b ? `under ${inches(a + b)}` : `over ${inches(Math.abs(a - b))}`;
      const message = `${name}: marks at ${inches(a)} and ${inches(b)} cannot be ${inches(c)} apart. It has to be ${limit}.`;
      return error('triangle_impossible', message, `${path}.triangle.c`);
    }
  }
  return null;
}

function checkRing({ walls, closed, ignore }: RoomInput): RoomError | null {
  if (!closed) return null;
  if (walls.some((w) => w.lengths.length === 0 || ignore.includes(`wall ${w.id}`))) return null;
  for (const [i, wall] of walls.entries()) {
    // Of several readings the kindest counts: the adjustment, not this check, finds the wrong one.
    const length = Math.min(...wall.lengths);
    const rest = walls.reduce((sum, w, k) => (k === i ? sum : sum + Math.max(...w.lengths)), 0);
    if (length < rest) continue;
    const message = `Wall ${wall.id} at ${inches(length)} is longer than the rest together (${inches(rest)}), so the room cannot close.`;
    return error('wall_too_long', message, `walls[${i}].length`);
  }
  return null;
}
