import type { Step } from '../core/layout';
import { formatLength } from '../tape/format-length';

/** A length as a sentence shows it, with its unit: `8 1/4 in`, `210 mm`. */
export function inches(value: number, step: Step): string {
  const text = formatLength(value, step);
  return text.endsWith('mm') ? text : `${text} in`;
}

/** An angle as a sentence shows it, to a tenth of a degree. */
export const degrees = (angleDeg: number): string => `${Math.round(angleDeg * 10) / 10} degrees`;
