import fc from 'fast-check';
import { equilibriumMoisture } from '@/geometry/wood/moisture';

/**
 * Wood Handbook (GTR-190, GTR-282) Table 4-2, % moisture, and equation 4-5 evaluated in both units of temperature by
 * hand when these rows were typed. Columns: F, % humidity, table, equation in F, equation in C.
 */
const TABLE_4_2 = [
  [70, 20, 4.5, 4.493, 4.492],
  [70, 30, 6.2, 6.172, 6.17],
  [70, 40, 7.7, 7.702, 7.699],
  [70, 50, 9.2, 9.246, 9.242],
  [70, 60, 11.0, 10.97, 10.965],
  [70, 65, 12.0, 11.964, 11.958],
  [70, 70, 13.1, 13.094, 13.088],
  [70, 80, 16.0, 15.997, 15.989],
  [70, 90, 20.5, 20.489, 20.479],
  [30, 30, 6.3, 6.312, 6.309],
  [50, 50, 9.5, 9.47, 9.466],
  [80, 65, 11.7, 11.752, 11.747],
  [100, 80, 15.1, 15.101, 15.093],
  [140, 50, 7.7, 7.668, 7.664],
  [180, 65, 8.6, 8.601, 8.595],
] as const;

/** Equation 4-5 only, not read in the table. */
const EQUATION_ONLY = [
  [30, 50, 9.52],
  [30, 65, 12.38],
  [30, 80, 16.54],
  [50, 30, 6.31],
  [50, 65, 12.27],
  [50, 80, 16.39],
] as const;

const celsius = (tempF: number) => ((tempF - 32) * 5) / 9;

describe('equilibriumMoisture', () => {
  it.each(TABLE_4_2)('settles at %d F and %d %% to the %d %% of Table 4-2 within 0.06', (tempF, rh, table) => {
    expect(Math.abs(equilibriumMoisture({ tempF, rh }) - table)).toBeLessThan(0.06);
    expect(Math.abs(equilibriumMoisture({ tempC: celsius(tempF), rh }) - table)).toBeLessThan(0.06);
  });

  it.each(TABLE_4_2)('gives equation 4-5 at %d F and %d %% to 0.001 in both units', (tempF, rh, _, f, c) => {
    // The rows were rounded to the third decimal.
    expect(Math.abs(equilibriumMoisture({ tempF, rh }) - f)).toBeLessThan(0.001);
    expect(Math.abs(equilibriumMoisture({ tempC: celsius(tempF), rh }) - c)).toBeLessThan(0.001);
  });

  it.each(EQUATION_ONLY)('gives equation 4-5 at %d F and %d %%: %d', (tempF, rh, moisture) => {
    expect(equilibriumMoisture({ tempF, rh })).toBeCloseTo(moisture, 2);
  });

  it('leaves bone-dry air with dry wood, and holds 100 % humidity to 99', () => {
    expect(equilibriumMoisture({ tempF: 70, rh: 0 })).toBe(0);
    expect(equilibriumMoisture({ tempF: 70, rh: 100 })).toBe(equilibriumMoisture({ tempF: 70, rh: 99 }));
    expect(equilibriumMoisture({ tempF: 70, rh: -5 })).toBe(0);
  });

  it('rises with humidity at any indoor temperature', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 20, max: 110, noNaN: true }),
        fc.double({ min: 1, max: 97, noNaN: true }),
        fc.double({ min: 0.1, max: 2, noNaN: true }),
        (tempF, rh, more) => equilibriumMoisture({ tempF, rh: rh + more }) > equilibriumMoisture({ tempF, rh }),
      ),
      { seed: 401 },
    );
  });

  it('falls with warmth between 50 and 110 F at the same humidity', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 50, max: 105, noNaN: true }),
        fc.double({ min: 20, max: 90, noNaN: true }),
        (tempF, rh) => equilibriumMoisture({ tempF: tempF + 5, rh }) < equilibriumMoisture({ tempF, rh }),
      ),
      { seed: 402 },
    );
  });
});
