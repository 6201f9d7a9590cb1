/** How two runs meet along one line from their back corner to their front corner. Angles radians, lengths inches. */
export interface Miter {
  /** Angle between the left-hand run's back line and the joint. */
  readonly left: number;
  /** Angle between the right-hand run's back line and the joint; left + right = corner. */
  readonly right: number;
  /** Length of the joint. */
  readonly length: number;
  /** How much shorter the front edge is than the back edge at this joint; negative when it is longer. */
  readonly setBackLeft: number;
  readonly setBackRight: number;
}

/**
 * Miter of two runs of any depths at any corner: f = atan2(w1 sin t, w2 + w1 cos t), plus pi when negative;
 * joint length w1 / sin f. Equal depths halve the corner.
 *
 * @param corner - interior angle between the back lines, radians, within (0, 2 pi) and not pi
 * @param leftDepth, rightDepth - back edge to front edge, inches, over 0
 * @see the two right triangles over the common joint: w1 = J sin f, w2 = J sin(t - f)
 */
export function miter(corner: number, leftDepth: number, rightDepth: number): Miter {
  const polar = Math.atan2(leftDepth * Math.sin(corner), rightDepth + leftDepth * Math.cos(corner));
  const left = polar < 0 ? polar + Math.PI : polar;
  const right = corner - left;
  return {
    left,
    right,
    // sqrt(w1^2 + w2^2 + 2 w1 w2 cos t) / |sin t| is the same length, but 0 / 0 at a straight wall.
    length: leftDepth / Math.sin(left),
    setBackLeft: leftDepth / Math.tan(left),
    setBackRight: rightDepth / Math.tan(right),
  };
}
