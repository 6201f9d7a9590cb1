import type { Climate } from '../core/layout';

/** Air by temperature and relative humidity (percent), in either unit of temperature. */
export type Air = Climate | { readonly tempC: number; readonly rh: number };

type Quadratic = readonly [constant: number, linear: number, square: number];
type Form = { readonly W: Quadratic; readonly K: Quadratic; readonly K1: Quadratic; readonly K2: Quadratic };

/** Hailwood-Horrobin coefficients, temperature in degrees Fahrenheit. */
const FAHRENHEIT: Form = {
  W: [330, 0.452, 0.00415],
  K: [0.791, 0.000463, -0.000000844],
  K1: [6.34, 0.000775, -0.0000935],
  K2: [1.09, 0.0284, -0.0000904],
};

/** The same in degrees Celsius; the two differ by up to 0.02 % of moisture because both are rounded. */
const CELSIUS: Form = {
  W: [349, 1.29, 0.0135],
  K: [0.805, 0.000736, -0.00000273],
  K1: [6.27, -0.00938, -0.000303],
  K2: [1.91, 0.0407, -0.000293],
};

/** Highest humidity the equation is used at: the curve is fitted to air that is not saturated. */
const WETTEST_RH = 99;

/**
 * Moisture content, percent of ovendry weight, that wood settles to in still air.
 *
 * Humidity is held to 0 to 99 %: a typed 100 % gives the value at 99 %.
 *
 * @param air - `tempF` or `tempC`, and `rh` in percent
 * @returns percent of moisture, 0 at 0 % humidity
 * @see Wood Handbook, equation 4-5 (deg F) and FPL-RN-0268 (deg C)
 */
export function equilibriumMoisture(air: Air): number {
  const form = 'tempC' in air ? CELSIUS : FAHRENHEIT;
  const t = 'tempC' in air ? air.tempC : air.tempF;
  const h = Math.min(Math.max(air.rh, 0), WETTEST_RH) / 100;
  const at = ([c, l, q]: Quadratic) => c + l * t + q * t * t;
  const kh = at(form.K) * h;
  const k1 = at(form.K1);
  const k1k2 = k1 * at(form.K2);
  const dissolved = kh / (1 - kh);
  const bound = (k1 * kh + 2 * k1k2 * kh * kh) / (1 + k1 * kh + k1k2 * kh * kh);
  return (1800 / at(form.W)) * (dissolved + bound);
}
