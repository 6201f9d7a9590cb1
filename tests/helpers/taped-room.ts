import type { CornerInput, RoomInput, TieInput, WallMark } from '@/geometry/room/types';

import type { Random } from './random';
import { trueAngleDeg } from './true-rooms';
import type { TrueRoom } from './true-rooms';

/** What is read in a room, and how well. */
export interface TapePlan {
  /** How each corner is measured. */
  readonly corners: readonly ('triangle' | 'angle' | 'assumed')[];
  /** Ties between room corners, by point. */
  readonly ties: readonly (readonly [number, number])[];
  /** 0 for exact readings, 1 for readings as scattered as their standard deviations say. */
  readonly noise: number;
}

const FIXED = 1 / 32;
const PER_INCH = 1 / 3840;
const PROTRACTOR_DEG = 0.2;

/** Reads a true room with tape and protractor; shares no code with the solver. */
export function tapeRoom(room: TrueRoom, plan: TapePlan, random: Random): RoomInput {
  const count = room.points.length;
  const n = room.closed ? count : count - 1;
  const ids = Array.from({ length: n }, (_, i) => String.fromCharCode(65 + i));
  const point = (i: number) => room.points[i % count]!;
  const taped = (from: readonly [number, number], to: readonly [number, number]): number => {
    const length = Math.hypot(to[0] - from[0], to[1] - from[1]);
    return length + plan.noise * random.normal() * (FIXED + PER_INCH * length);
  };
  const along = (from: readonly [number, number], to: readonly [number, number], inches: number) => {
    const length = Math.hypot(to[0] - from[0], to[1] - from[1]);
    return [from[0] + ((to[0] - from[0]) * inches) / length, from[1] + ((to[1] - from[1]) * inches) / length] as const;
  };
  const walls = ids.map((id, i) => ({ id, lengths: [taped(point(i), point(i + 1))] }));
  const corners = plan.corners.map((how, i): CornerInput => {
    const between = [ids[i]!, ids[(i + 1) % n]!] as const;
    const nominalDeg = room.nominalDeg[i]!;
    if (how === 'assumed') return { between, nominalDeg };
    if (how === 'angle') {
      const angleDeg = trueAngleDeg(room, i) + plan.noise * random.normal() * PROTRACTOR_DEG;
      return { between, nominalDeg, angleDeg, angleSdDeg: PROTRACTOR_DEG };
    }
    const [left, at, right] = [point(i), point(i + 1), point(i + 2)];
    const a = Math.min(36, Math.floor(Math.hypot(at[0] - left[0], at[1] - left[1])));
    const b = Math.min(48, Math.floor(Math.hypot(at[0] - right[0], at[1] - right[1])));
    return { between, nominalDeg, triangle: { a, b, c: taped(along(at, left, a), along(at, right, b)) } };
  });
  const mark = (i: number): WallMark => (i === 0 ? { wall: ids[0]!, at: 0 } : { wall: ids[i - 1]!, at: 'end' });
  const ties = plan.ties.map(([from, to], k): TieInput => ({
    id: `t${k + 1}`,
    from: mark(from),
    to: mark(to),
    length: taped(point(from), point(to)),
  }));
  const tapeSd = { fixed: FIXED, perInch: PER_INCH };
  return { closed: room.closed, walls, corners, ties, tapeSd, trust: [], ignore: [] };
}
