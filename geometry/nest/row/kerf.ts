/**
 * Width along x that a saw of `kerf` takes, cutting at slope `s` = dx/dy: the kerf is measured square to the cut.
 * The one owner of this rule.
 */
export const kerfAlong = (kerf: number, slope: number): number => kerf * Math.sqrt(1 + slope * slope);

/**
 * Least distance at mid-depth between a part that ends at slope `right` and the next one that begins at slope `left`:
 * one saw cut, at any slope between the two, must fit between them.
 *
 * @param halfDepth - half the depth of the row, inches
 * @returns |left - right| x halfDepth + the narrowest kerf among the slopes between the two, inches
 */
export function endGap(right: number, left: number, halfDepth: number, kerf: number): number {
  return Math.abs(left - right) * halfDepth + kerfAlong(kerf, flattestBetween(right, left));
}

/** The slope nearest to square between two slopes. */
export function flattestBetween(a: number, b: number): number {
  if (a >= 0 && b >= 0) return Math.min(a, b);
  if (a <= 0 && b <= 0) return Math.max(a, b);
  return 0;
}

/**
 * The same distance when the cut between the two shall also make one of the ends: two cuts then free both parts, where a
 * square cut between ends that lean to different sides needs two more.
 */
export function roomyGap(right: number, left: number, halfDepth: number, kerf: number): number {
  const flatter = Math.min(Math.abs(right), Math.abs(left));
  return Math.abs(left - right) * halfDepth + kerfAlong(kerf, flatter);
}
