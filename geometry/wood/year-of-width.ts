import type { Climate, ClimateYear } from '../core/layout';
import { equilibriumMoisture } from './moisture';
import { widthChange } from './movement';

export const MONTHS = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'] as const;

/** One point of the year's chart. */
export interface MonthWidth {
  readonly month: (typeof MONTHS)[number];
  readonly moisture: number;
  /** Inches across the grain, and its difference from the width at making. */
  readonly width: number;
  readonly change: number;
}

/**
 * Width of a top through the year, month by month.
 *
 * Temperature and humidity swing evenly between the winter's and the summer's figures, which stand for the coldest and
 * the warmest month. A finished slab follows some weeks behind and less far; the chart shows where the air pulls it.
 *
 * @param width - across the grain at making, inches
 * @param warmest - 1 to 12: 7 north of the equator, 1 south of it
 */
export function yearOfWidth(
  climate: ClimateYear,
  width: number,
  coefficient: number,
  warmest = 7,
): readonly MonthWidth[] {
  const make = equilibriumMoisture(climate.make);
  return MONTHS.map((month, i) => {
    const share = (1 + Math.cos((2 * Math.PI * (i + 1 - warmest)) / 12)) / 2;
    const moisture = equilibriumMoisture(between(climate.winter, climate.summer, share));
    const change = widthChange(width, coefficient, make, moisture);
    return { month, moisture, width: width + change, change };
  });
}

const between = (a: Climate, b: Climate, share: number): Climate => ({
  tempF: a.tempF + (b.tempF - a.tempF) * share,
  rh: a.rh + (b.rh - a.rh) * share,
});
