import type { Point } from './point';

/** Largest distance between an arc and the chords it is flattened to, inches. */
export const CHORD_ERROR = 1 / 128;

/**
 * Points on a circle from one angle to another, both ends included, so close that no chord strays further than
 * `chordError` from the arc. Counter-clockwise when `to` is larger.
 *
 * @param centre - inches
 * @param radius - inches, 0 gives the centre alone
 * @param from, to - radians
 */
export function arcPoints(centre: Point, radius: number, from: number, to: number, chordError = CHORD_ERROR): Point[] {
  if (radius <= 0) return [centre];
  // A chord over the angle a stands r (1 - cos(a / 2)) off its arc.
  const widest = radius <= chordError ? Math.PI / 2 : 2 * Math.acos(1 - chordError / radius);
  const steps = Math.max(1, Math.ceil(Math.abs(to - from) / widest - 1e-9));
  return Array.from({ length: steps + 1 }, (_, i) => {
    const angle = from + ((to - from) * i) / steps;
    return [centre[0] + radius * Math.cos(angle), centre[1] + radius * Math.sin(angle)] as const;
  });
}
