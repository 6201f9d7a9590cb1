import type { ProfileStation } from '../room/types';

/**
 * Offset of a wall from its straight line, inches; plus is hollow, minus is a bump. Straight between stations; past the
 * first and last station the last reading holds, because nothing was measured there.
 */
export function offsetAt(profile: readonly ProfileStation[], at: number): number {
  const first = profile[0];
  if (!first || at <= first.at) return first?.off ?? 0;
  for (let i = 1; i < profile.length; i++) {
    const a = profile[i - 1]!;
    const b = profile[i]!;
    if (at <= b.at) return b.at === a.at ? b.off : a.off + ((b.off - a.off) * (at - a.at)) / (b.at - a.at);
  }
  return profile[profile.length - 1]!.off;
}

/** Stations in the order along the wall. */
export function inOrder(profile: readonly ProfileStation[]): readonly ProfileStation[] {
  return profile.some((s, i) => i > 0 && s.at < profile[i - 1]!.at)
    ? [...profile].sort((a, b) => a.at - b.at)
    : profile;
}

/**
 * How far the wall sticks out towards the top between two places, inches, 0 when it nowhere does.
 *
 * @param side - 'back' for a top on the far side of the wall line, where a hollow is what sticks out
 */
export function highestBump(
  profile: readonly ProfileStation[],
  from: number,
  to: number,
  side: 'front' | 'back' = 'front',
): number {
  if (profile.length === 0) return 0;
  const sign = side === 'back' ? 1 : -1;
  const stations = inOrder(profile);
  let highest = Math.max(0, sign * offsetAt(stations, from), sign * offsetAt(stations, to));
  for (const { at, off } of stations) if (at > from && at < to) highest = Math.max(highest, sign * off);
  return highest;
}
