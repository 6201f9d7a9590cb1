import { dot, subtract, unit } from '../core/vector';
import type { Point } from '../core/point';
import { listNames } from './check-paths';
import { cornerName, wallEnd, wallName } from './room-frame';
import type { RoomFrame } from './room-frame';
import type { RoomError, RoomInput } from './types';

/** Share of the largest movement under which a wall or corner counts as held. */
const HELD = 1e-4;

/**
 * Names what no reading fixes.
 *
 * @param points - of the loose room
 * @param directions - shifts of every point that no reading notices
 */
export function undeterminedError(
  input: RoomInput,
  frame: RoomFrame,
  points: readonly Point[],
  directions: readonly (readonly Point[])[],
): RoomError {
  const stretch = frame.wallIds.map((_, i) => largest(directions, (shift) => stretchOf(frame, points, shift, i)));
  const loose = indicesOver(stretch);
  const unread = loose.filter((i) => isUnread(input, i));
  if (unread.length > 0) return looseWalls(input, frame, unread);
  const swing = frame.corners.map((_, i) => largest(directions, (shift) => swingOf(frame, points, shift, i)));
  const corners = indicesOver(swing);
  return corners.length > 0 ? cornerError(frame, corners) : looseWalls(input, frame, loose.length > 0 ? loose : [0]);
}

/** Whether a wall has no reading that counts. */
export function isUnread(input: RoomInput, wall: number): boolean {
  const { id, lengths } = input.walls[wall]!;
  return lengths.length === 0 || input.ignore.includes(wallName(id));
}

/** The error for walls whose length nothing fixes. */
export function looseWalls(input: RoomInput, frame: RoomFrame, walls: readonly number[]): RoomError {
  const names = listNames(walls.map((i) => wallName(frame.wallIds[i]!)));
  const ignored = walls.some((i) => input.walls[i]!.lengths.length > 0);
  const what = ignored ? 'Its only reading is ignored. ' : '';
  const advice = walls.length > 1 ? 'Tape one of them' : 'Tape it';
  return {
    code: 'undetermined',
    message: `Nothing fixes the length of ${names}. ${what}${advice}, or a tie that reaches it.`,
    path: `walls[${walls[0]!}].length`,
  };
}

function cornerError(frame: RoomFrame, corners: readonly number[]): RoomError {
  const names = listNames(corners.map((i) => cornerName(frame.corners[i]!.between)));
  const { listed } = frame.corners[corners[0]!]!;
  return {
    code: 'undetermined',
    message: `Nothing fixes ${names}. Take a corner triangle or a tie there.`,
    path: listed < 0 ? 'corners' : `corners[${listed}]`,
  };
}

function largest(directions: readonly (readonly Point[])[], of: (shift: readonly Point[]) => number): number {
  return directions.reduce((max, shift) => Math.max(max, Math.abs(of(shift))), 0);
}

function indicesOver(sizes: readonly number[]): readonly number[] {
  const limit = HELD * Math.max(...sizes, 0);
  return sizes.flatMap((size, i) => (size > limit && size > 0 ? [i] : []));
}

/** How much longer the wall gets, per unit of shift. */
function stretchOf(frame: RoomFrame, points: readonly Point[], shift: readonly Point[], wall: number): number {
  const end = wallEnd(frame, wall);
  const along = unit(points[wall]!, points[end]!);
  return along ? dot(along, subtract(shift[end]!, shift[wall]!)) : 0;
}

/** How far the corner's two walls turn against each other, radians per unit of shift. */
function swingOf(frame: RoomFrame, points: readonly Point[], shift: readonly Point[], corner: number): number {
  const { left, point, right } = frame.corners[corner]!;
  return turnOf(points, shift, point, wallEnd(frame, right)) - turnOf(points, shift, point, left);
}

function turnOf(points: readonly Point[], shift: readonly Point[], from: number, to: number): number {
  const [dx, dy] = subtract(points[to]!, points[from]!);
  const [sx, sy] = subtract(shift[to]!, shift[from]!);
  return (dx * sy - dy * sx) / (dx * dx + dy * dy);
}
