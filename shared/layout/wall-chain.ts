import type { Corner, RoomReadings } from '@/geometry/core/layout';
import type { Point } from '@/geometry/core/point';
import type { Draft } from 'immer';

type Room = Draft<RoomReadings>;

/** Corners are drawn to the nearest 45 degrees: what was traced is a sketch, the tape finds the rest. */
const SNAP_DEGREES = 45;

/** A wall id that no other wall has, `wanted` if it is free. */
export function freshWallId(room: { walls: readonly { id: string }[] }, wanted: string): string {
  const taken = new Set(room.walls.map((w) => w.id));
  if (!taken.has(wanted)) return wanted;
  let n = 2;
  while (taken.has(`${wanted}${n}`)) n++;
  return `${wanted}${n}`;
}

/** The neighbouring pairs of walls, left to right; a closed room's last pair joins the last wall to the first. */
export function wallPairs(room: { walls: readonly { id: string }[]; closed: boolean }): [string, string][] {
  const ids = room.walls.map((w) => w.id);
  const pairs: [string, string][] = ids.slice(1).map((id, i) => [ids[i]!, id]);
  if (room.closed && ids.length > 2) pairs.push([ids[ids.length - 1]!, ids[0]!]);
  return pairs;
}

/** One corner a pair of neighbours: the one already there with its readings, else a new one with the angle sketched. */
export function cornersOf(room: Room): Draft<Corner>[] {
  const kept = new Map(room.corners.map((c) => [c.between.join('|'), c]));
  return wallPairs(room).map((between, i) => {
    const found = kept.get(between.join('|'));
    return found ?? { between, nominal: sketchedAngle(room.sketch, i + 1, room.closed) };
  });
}

/** Interior angle (room on the right-hand side) at sketch corner `index`, degrees, to the nearest 45. */
export function sketchedAngle(sketch: readonly Point[], index: number, closed: boolean): number {
  const n = sketch.length;
  const at = sketch[index % n];
  const before = sketch[(index - 1 + n) % n];
  const after = sketch[closed ? (index + 1) % n : index + 1];
  if (!at || !before || !after) return 90;
  const into = Math.atan2(at[1] - before[1], at[0] - before[0]);
  const out = Math.atan2(after[1] - at[1], after[0] - at[0]);
  // Turning right by a quarter makes an inside corner of 90 degrees.
  let interior = 180 + ((out - into) * 180) / Math.PI;
  interior = ((interior % 360) + 360) % 360;
  const snapped = Math.round(interior / SNAP_DEGREES) * SNAP_DEGREES;
  return Math.min(315, Math.max(45, snapped));
}
