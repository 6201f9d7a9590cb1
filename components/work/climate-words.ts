import type { Climate } from '@/geometry/core/layout';
import type { TypedValue } from '../ui/TypedField';

export const percent = (value: number): string => `${value.toFixed(1)} %`;

export const toCelsius = (fahrenheit: number): number => ((fahrenheit - 32) * 5) / 9;
export const toFahrenheit = (celsius: number): number => (celsius * 9) / 5 + 32;

const BOUNDS = { tempF: [-40, 130] } as const;

/** A temperature typed with or without its unit; `metric` says which is meant without. Degrees Fahrenheit. */
export function readTemperature(text: string, metric: boolean): TypedValue<number> {
  const parts = /^\s*(-?\d+(?:[.,]\d+)?)\s*(?:°|deg)?\s*([cf])?\s*$/i.exec(text);
  if (!parts)
    return { ok: false, message: `Type degrees, such as ${metric ? '20' : '68'} or ${metric ? '68 F' : '20 C'}.` };
  const value = Number(parts[1]!.replace(',', '.'));
  const celsius = parts[2] ? parts[2].toLowerCase() === 'c' : metric;
  const tempF = celsius ? toFahrenheit(value) : value;
  const [least, most] = BOUNDS.tempF;
  return tempF >= least && tempF <= most
    ? { ok: true, value: tempF }
    : { ok: false, message: 'No house is that cold or that hot: -40 to 130 F, -40 to 54 C.' };
}

export const writeTemperature = (tempF: number, metric: boolean): string =>
  metric ? `${Number(toCelsius(tempF).toFixed(1))} C` : `${Number(tempF.toFixed(1))} F`;

export function readHumidity(text: string): TypedValue<number> {
  const value = Number(text.trim().replace('%', '').replace(',', '.'));
  return text.trim() !== '' && Number.isFinite(value) && value >= 0 && value <= 100
    ? { ok: true, value }
    : { ok: false, message: 'Type a relative humidity from 0 to 100 %.' };
}

export const sameAir = (a: Climate, b: Climate): boolean => a.tempF === b.tempF && a.rh === b.rh;
