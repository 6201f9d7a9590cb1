import type { NetworkMark, NetworkQuantity } from './network';
import type { CornerInput, RoomInput, WallMark } from './types';

/** How the walls of a room hang together: which points they join, which corners lie between them. */
export interface RoomFrame {
  readonly closed: boolean;
  readonly wallIds: readonly string[];
  /** n + 1 for an open chain, n for a closed ring. */
  readonly pointCount: number;
  readonly corners: readonly FrameCorner[];
}

export interface FrameCorner {
  /** Left-hand and right-hand wall, by index. */
  readonly left: number;
  readonly right: number;
  readonly between: readonly [string, string];
  readonly point: number;
  /** Index in the input's `corners`; -1 when it is not listed there. */
  readonly listed: number;
}

/** Degrees of a corner that nobody said anything about. */
export const DEFAULT_NOMINAL_DEG = 90;

/** The frame of an input whose ids are in order (see `checkStructure`). */
export function roomFrame(input: RoomInput): RoomFrame {
  const wallIds = input.walls.map((w) => w.id);
  const n = wallIds.length;
  const listed = new Map(input.corners.map((c, i) => [cornerName(c.between), i]));
  const corners: FrameCorner[] = [];
  for (let left = 0; left < (input.closed ? n : n - 1); left++) {
    const right = (left + 1) % n;
    const between = [wallIds[left]!, wallIds[right]!] as const;
    corners.push({ left, right, between, point: right, listed: listed.get(cornerName(between)) ?? -1 });
  }
  return { closed: input.closed, wallIds, pointCount: input.closed ? n : n + 1, corners };
}

export const wallName = (id: string): string => `wall ${id}`;
export const cornerName = (between: readonly [string, string]): string => `corner ${between[0]}-${between[1]}`;
export const tieName = (id: string): string => `tie ${id}`;

/** What the input says of a corner, or undefined when it is not listed. */
export const cornerInput = (input: RoomInput, corner: FrameCorner): CornerInput | undefined =>
  corner.listed < 0 ? undefined : input.corners[corner.listed];

export const wallStart = (wall: number): number => wall;
export const wallEnd = (frame: RoomFrame, wall: number): number => (wall + 1) % frame.pointCount;

/** A tie's mark as a place in the network. */
export function networkMark(frame: RoomFrame, mark: WallMark): NetworkMark {
  const wall = frame.wallIds.indexOf(mark.wall);
  if (mark.at === 'end') return { point: wallEnd(frame, wall) };
  if (mark.at === 0) return { point: wallStart(wall) };
  return { point: wallStart(wall), toward: wallEnd(frame, wall), at: mark.at };
}

export function wallQuantity(frame: RoomFrame, wall: number): NetworkQuantity {
  return { kind: 'distance', from: { point: wallStart(wall) }, to: { point: wallEnd(frame, wall) } };
}

/** Interior angle: with the room on the right-hand side it opens counter-clockwise from the left-hand wall. */
export function angleQuantity(frame: RoomFrame, corner: FrameCorner): NetworkQuantity {
  return { kind: 'angle', at: corner.point, from: wallStart(corner.left), to: wallEnd(frame, corner.right) };
}

/** Distance between the marks `a` and `b` inches from a corner on its left-hand and right-hand wall. */
export function triangleQuantity(frame: RoomFrame, corner: FrameCorner, a: number, b: number): NetworkQuantity {
  return {
    kind: 'distance',
    from: { point: corner.point, toward: wallStart(corner.left), at: a },
    to: { point: corner.point, toward: wallEnd(frame, corner.right), at: b },
  };
}
