export const DEGREE = Math.PI / 180;
export const toRadians = (degrees: number): number => degrees * DEGREE;
export const toDegrees = (radians: number): number => radians / DEGREE;

/** The same direction within (-pi, pi]. */
export function normalise(radians: number): number {
  const turn = 2 * Math.PI;
  let a = radians % turn;
  if (a <= -Math.PI) a += turn;
  if (a > Math.PI) a -= turn;
  return a;
}
