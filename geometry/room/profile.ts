import type { ProfileStation } from './types';

/** The stations in the order along the wall. */
export function inOrder(profile: readonly ProfileStation[]): readonly ProfileStation[] {
  // Most profiles are written down in order, and this runs while a finger drags.
  const ordered = profile.every((station, i) => i === 0 || station.at >= profile[i - 1]!.at);
  return ordered ? profile : [...profile].sort((a, b) => a.at - b.at);
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
 * How far the wall sticks out towards the top between two places, inches; 0 where it nowhere does. A straight piece is
 * nowhere further out than at its ends, so ends and stations are enough.
 *
 * @param from, to - inches from the wall's left end
 * @param side - 'back' for a top on the far side of the wall line, where a hollow is what sticks out
 */
export function highestBump(
  profile: readonly ProfileStation[],
  from: number,
  to: number,
  side: 'front' | 'back' = 'front',
): number {
  if (profile.length === 0) return 0;
  const between = profile.filter((s) => s.at > from && s.at < to).map((s) => s.off);
  const offsets = [offsetAt(profile, from), ...between, offsetAt(profile, to)];
  return Math.max(0, ...offsets.map((off) => (side === 'back' ? off : -off)));
}
