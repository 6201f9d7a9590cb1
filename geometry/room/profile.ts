import type { Point } from '../core/point';
import { along, rightNormal, unit } from '../core/vector';
import type { ProfileStation } from './types';

/** The stations in the order along the wall. */
export function inOrder(profile: readonly ProfileStation[]): readonly ProfileStation[] {
  return [...profile].sort((a, b) => a.at - b.at);
}

/**
 * Offset of a wall from its straight line, inches; plus is hollow, minus is a bump. Straight between stations; beyond
 * the first and the last the nearest one holds, because nothing was read there.
 *
 * @param at - inches from the wall's left end
 */
export function offsetAt(profile: readonly ProfileStation[], at: number): number {
  const stations = inOrder(profile);
  const next = stations.findIndex((s) => s.at >= at);
  if (next < 0) return stations[stations.length - 1]?.off ?? 0;
  const right = stations[next]!;
  const left = stations[next - 1];
  if (!left || right.at === at) return right.off;
  const share = (at - left.at) / (right.at - left.at);
  return left.off + share * (right.off - left.off);
}

/**
 * How far the wall sticks out into the room between two places, inches; 0 where it is hollow all along.
 *
 * @param from, to - inches from the wall's left end
 */
export function highestBump(profile: readonly ProfileStation[], from: number, to: number): number {
  return Math.max(0, ...offsetsBetween(profile, from, to).map((off) => -off));
}

/** How deep the wall falls back between two places, inches; 0 where it sticks out all along. */
export function deepestHollow(profile: readonly ProfileStation[], from: number, to: number): number {
  return Math.max(0, ...offsetsBetween(profile, from, to));
}

/**
 * The wall's face as it was read, for drawing.
 *
 * @param from, to - the wall's corners, room on the right-hand side on the way
 * @param exaggeration - factor on the offsets; 1 draws them to scale
 * @returns points from corner to corner, a bump standing into the room
 */
export function measuredFace(
  from: Point,
  to: Point,
  profile: readonly ProfileStation[],
  exaggeration = 1,
): readonly Point[] {
  const direction = unit(from, to);
  if (!direction || profile.length === 0) return [from, to];
  const length = Math.hypot(to[0] - from[0], to[1] - from[1]);
  const inside = inOrder(profile).filter((s) => s.at > 0 && s.at < length);
  const stations = [{ at: 0, off: offsetAt(profile, 0) }, ...inside, { at: length, off: offsetAt(profile, length) }];
  const intoRoom = rightNormal(direction);
  return stations.map(({ at, off }) => along(along(from, direction, at), intoRoom, -off * exaggeration));
}

/** Offsets at both ends and at every station between: a straight piece is nowhere further out than at its ends. */
function offsetsBetween(profile: readonly ProfileStation[], from: number, to: number): readonly number[] {
  if (profile.length === 0) return [];
  const between = profile.filter((s) => s.at > from && s.at < to).map((s) => s.off);
  return [offsetAt(profile, from), ...between, offsetAt(profile, to)];
}
