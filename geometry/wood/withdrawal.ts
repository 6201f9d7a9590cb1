/**
 * What a wood screw in side grain holds against being pulled out.
 *
 * Ultimate loads are means of tests on clear wood: a fixing carries a small share of them.
 */

/** End grain holds about three quarters of what side grain holds (second hand). */
export const END_GRAIN_SHARE = 0.75;

/** Mean ultimate withdrawal load, pounds: 15,700 G^2 D L, gravity at 12 %, shank and thread in inches (Wood Handbook eq. 8-10a). */
export function ultimateWithdrawalLb(gravity12: number, shank: number, thread: number): number {
  return 15_700 * gravity12 ** 2 * shank * thread;
}

/** The same in newtons from millimeters: 108.25 G^2 D L (eq. 8-10b). */
export function ultimateWithdrawalN(gravity12: number, shankMm: number, threadMm: number): number {
  return 108.25 * gravity12 ** 2 * shankMm * threadMm;
}

/** Allowable withdrawal, pounds per inch of thread: 2850 G^2 D, ovendry gravity (NDS). */
export function allowableWithdrawalLbPerInch(ovendryGravity: number, shank: number): number {
  return 2850 * ovendryGravity ** 2 * shank;
}

/** Root of a wood screw is about two thirds of its shank (second hand). */
const ROOT_SHARE = 2 / 3;

/**
 * Pilot hole for the thread, inches: 90 % of the root from gravity 0.60 up, 70 % from 0.50, none below (NDS commentary
 * 11.1.2 and a code copy).
 *
 * @returns null where no pilot hole is needed
 */
export function pilotHole(gravity12: number, shank: number): number | null {
  if (gravity12 >= 0.6) return 0.9 * ROOT_SHARE * shank;
  if (gravity12 >= 0.5) return 0.7 * ROOT_SHARE * shank;
  return null;
}
