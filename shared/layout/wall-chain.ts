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
    if (!found) return { between, nominal: sketchedAngle(room.sketch, i + 1, room.closed) };
    const drawn = angleInSketch(room.sketch, i + 1, room.closed);
    // The corner was bent into another shape: 90 became 135. A 120 that was set by hand and is drawn so stays.
    const bent = drawn !== null && Math.abs(drawn - found.nominal) > SNAP_DEGREES / 2;
    return bent ? { ...found, nominal: sketchedAngle(room.sketch, i + 1, room.closed) } : found;
  });
}

/** Interior angle (room on the right-hand side) at sketch corner `index`, degrees, to the nearest 45. */
export function sketchedAngle(sketch: readonly Point[], index: number, closed: boolean): number {
  const interior = angleInSketch(sketch, index, closed);
  if (interior === null) return 90;
  const snapped = Math.round(interior / SNAP_DEGREES) * SNAP_DEGREES;
  return Math.min(315, Math.max(45, snapped));
}

/** Interior angle exactly as sketched, degrees from 0 to 360; null where no two walls meet. */
function angleInSketch(sketch: readonly Point[], index: number, closed: boolean): number | null {
  const n = sketch.length;
  const at = sketch[index % n];
  const before = sketch[(index - 1 + n) % n];
  const after = sketch[closed ? (index + 1) % n : index + 1];
  if (!at || !before || !after) return null;
  const into = Math.atan2(at[1] - before[1], at[0] - before[0]);
  const out = Math.atan2(after[1] - at[1], after[0] - at[0]);
  // Turning right by a quarter makes an inside corner of 90 degrees.
  const interior = 180 + ((out - into) * 180) / Math.PI;
  return ((interior % 360) + 360) % 360;
}
