import { fitRoom } from '@/geometry/room/fit-room';
import { DEFAULT_TAPE_SD } from '@/geometry/room/types';
import type { RoomError, RoomFit, RoomInput, WallInput } from '@/geometry/room/types';

/** Walls A, B, C ... with one reading each; `null` for a wall nobody taped. */
export function walls(...lengths: readonly (number | null | readonly number[])[]): WallInput[] {
  return lengths.map((length, i) => ({
    id: String.fromCharCode(65 + i),
    lengths: length === null ? [] : typeof length === 'number' ? [length] : length,
  }));
}

/** An open room of square corners taken for granted, with whatever is said otherwise. */
export function roomInput(overrides: Partial<RoomInput>): RoomInput {
  return {
    closed: false,
    walls: walls(96, 120, 84),
    corners: [],
    ties: [],
    tapeSd: DEFAULT_TAPE_SD,
    trust: [],
    ignore: [],
    ...overrides,
  };
}

/** The fit of a room that has one. */
export function fitted(input: RoomInput, options?: { readonly next?: boolean }): RoomFit {
  const result = fitRoom(input, options);
  if (!result.ok) throw new Error(`${result.error.code}: ${result.error.message}`);
  return result.fit;
}

/** The error of a room that has no fit. */
export function refused(input: RoomInput): RoomError {
  const result = fitRoom(input);
  if (result.ok) throw new Error('the room was fitted');
  return result.error;
}

/** The worked example of the file format: an L with a third wall, a triangle, a protractor and a diagonal. */
export const WORKED_EXAMPLE: RoomInput = {
  closed: false,
  tapeSd: { fixed: 0.03125, perInch: 0.00026 },
  walls: [
    { id: 'A', lengths: [96.25] },
    { id: 'B', lengths: [118.625] },
    { id: 'C', lengths: [84] },
  ],
  corners: [
    { between: ['A', 'B'], nominalDeg: 90, triangle: { a: 36, b: 48, c: 60.5 } },
    { between: ['B', 'C'], nominalDeg: 90, angleDeg: 88.7, angleSdDeg: 0.2 },
  ],
  ties: [{ id: 't1', from: { wall: 'A', at: 0 }, to: { wall: 'C', at: 'end' }, length: 119.0625, sd: 0.0625 }],
  trust: [],
  ignore: [],
  sketch: [
    [0, 0],
    [90, 0],
    [90, -100],
    [10, -100],
  ],
};
