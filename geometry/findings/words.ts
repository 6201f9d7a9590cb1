import type { Step } from '../core/layout';
import { formatLength } from '../tape/format-length';

/** Thousandths of an inch, for two sizes that no fraction of the tape tells apart. */
const decimal = (inches: number): string => `${inches.toFixed(3)} in`;

const withUnit = (text: string): string => (text.endsWith('mm') ? text : `${text} in`);

/** A length in the layout's step; under an inch to the 1/32 (0.5 mm), because what the seasons do is that small. */
export function sizeText(inches: number, step: Step): string {
  const metric = step.endsWith('mm');
  const fine = metric ? '0.5 mm' : '1/32';
  return withUnit(formatLength(inches, Math.abs(inches) < 1 ? fine : step));
}

/** A size and its limit, written finely enough that the two read differently. */
export function sizePair(inches: number, limit: number, step: Step): readonly [string, string] {
  const metric = step.endsWith('mm');
  const ways: readonly ((x: number) => string)[] = [
    (x) => sizeText(x, step),
    ...(metric ? [] : [(x: number) => withUnit(formatLength(x, '1/64'))]),
    decimal,
  ];
  const way = ways.find((write) => write(inches) !== write(limit)) ?? decimal;
  return [way(inches), way(limit)];
}

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
