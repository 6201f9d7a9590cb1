import type { Step } from '../core/layout';
import { formatLength } from '../tape/format-length';

const withUnit = (text: string): string => (text.endsWith('mm') ? text : `${text} in`);

/** A length in the layout's step; under an inch to the 1/32 (0.5 mm), because what the seasons do is that small. */
export function sizeText(inches: number, step: Step): string {
  const metric = step.endsWith('mm');
  const fine = metric ? '0.5 mm' : '1/32';
  return withUnit(formatLength(inches, Math.abs(inches) < 1 ? fine : step));
}

/**
 * A size and its limit, written finely enough that the two read differently: by the layout's step, by the finest of the
 * tape, and when no fraction tells them apart as a decimal against the limit's own fraction.
 */
export function sizePair(inches: number, limit: number, step: Step): readonly [string, string] {
  const metric = step.endsWith('mm');
  const ways: readonly ((x: number) => string)[] = [
    (x) => sizeText(x, step),
    ...(metric ? [] : [(x: number) => withUnit(formatLength(x, '1/64'))]),
  ];
  const way = ways.find((write) => write(inches) !== write(limit));
  if (way) return [way(inches), way(limit)];
  const digits = [3, 4, 5, 6].find((d) => decimal(inches, d, metric) !== decimal(limit, d, metric)) ?? 6;
  const fraction = !metric && Number.isInteger(limit * 64);
  return [
    decimal(inches, digits, metric),
    fraction ? withUnit(formatLength(limit, '1/64')) : decimal(limit, digits, metric),
  ];
}

const decimal = (inches: number, digits: number, metric: boolean): string =>
  metric ? `${(inches * 25.4).toFixed(digits - 1)} mm` : `${inches.toFixed(digits)} in`;

/** "P", "P and Q", "P, Q and R". */
export function listText(words: readonly string[]): string {
  if (words.length < 2) return words[0] ?? '';
  return `${words.slice(0, -1).join(', ')} and ${words[words.length - 1]}`;
}

export const percent = (moisture: number): string => `${moisture.toFixed(1)} %`;
export const pounds = (weightLb: number): string => `${Math.round(weightLb)} lb`;
export const degrees = (angleDeg: number): string => `${angleDeg.toFixed(1)} degrees`;

/** First letter large, for a sentence that starts with a name. */
export const capital = (text: string): string => `${text.charAt(0).toUpperCase()}${text.slice(1)}`;
