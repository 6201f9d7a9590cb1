/** What lengths are rounded to for the eye and the saw. */
export type DisplayStep = '1/8' | '1/16' | '1/32' | '1/64' | '1 mm' | '0.5 mm';

export const DISPLAY_STEPS: readonly DisplayStep[] = ['1/8', '1/16', '1/32', '1/64', '1 mm', '0.5 mm'];

/** A rounded length, taken apart for a stacked fraction. */
export interface SplitLength {
  readonly unit: 'in' | 'mm';
  readonly negative: boolean;
  /** Whole feet, only when feet were asked for and there is at least one. */
  readonly feet?: number;
  /** Whole inches (behind the feet, if any) or whole millimeters. */
  readonly whole: number;
  /** 0 when there is no fraction; half a millimeter is 1 over 2. */
  readonly numerator: number;
  /** Reduced; 1 when there is no fraction. */
  readonly denominator: number;
}

export interface LengthStyle {
  /** Feet and inches instead of inches; metric steps ignore it. */
  readonly feet?: boolean;
}

/** Slack for halves that binary cannot hold, in steps: 2444.5 mm kept as inches comes back a few ulp short of the half. */
const HALF_SLACK = 1e-9;

const STEPS: Readonly<Record<DisplayStep, { readonly unit: 'in' | 'mm'; readonly perUnit: number }>> = {
  '1/8': { unit: 'in', perUnit: 8 },
  '1/16': { unit: 'in', perUnit: 16 },
  '1/32': { unit: 'in', perUnit: 32 },
  '1/64': { unit: 'in', perUnit: 64 },
  '1 mm': { unit: 'mm', perUnit: 1 },
  '0.5 mm': { unit: 'mm', perUnit: 2 },
};

/**
 * Rounds a length once, half away from zero, and takes it apart.
 *
 * @param inches - any finite length, may be negative
 * @param step - what to round to
 * @returns whole part and reduced fraction, in inches or millimeters as the step says
 * @throws RangeError if the length is not finite
 */
export function splitLength(inches: number, step: DisplayStep, style: LengthStyle = {}): SplitLength {
  const { unit, perUnit } = STEPS[step];
  const steps = countSteps(inches, step);
  const size = Math.abs(steps);
  const whole = Math.floor(size / perUnit);
  const rest = size - whole * perUnit;
  const divisor = commonDivisor(rest, perUnit);
  const fraction = { numerator: rest / divisor, denominator: perUnit / divisor };
  const base = { unit, negative: steps < 0, ...fraction };
  if (style.feet && unit === 'in' && whole >= 12) return { ...base, feet: Math.floor(whole / 12), whole: whole % 12 };
  return { ...base, whole };
}

/**
 * Writes a length as it is read off a tape: `8 1/4`, `1/4`, `0`, `-3/16`, `2445 mm`; with feet `8' 4 3/16"`.
 * What it writes, `parseSignedLength` reads back to the same text.
 *
 * @param inches - any finite length
 * @param step - what to round to, half away from zero
 * @throws RangeError if the length is not finite
 */
export function formatLength(inches: number, step: DisplayStep, style: LengthStyle = {}): string {
  const split = splitLength(inches, step, style);
  const sign = split.negative ? '-' : '';
  if (split.unit === 'mm') return `${sign}${split.whole}${split.numerator ? '.5' : ''} mm`;
  const fraction = split.numerator ? `${split.numerator}/${split.denominator}` : '';
  const plain = split.whole || !fraction ? [String(split.whole), fraction].filter(Boolean).join(' ') : fraction;
  return split.feet === undefined ? `${sign}${plain}` : `${sign}${split.feet}' ${plain}"`;
}

/** A length rounded to the step, still in inches; half away from zero. */
export function roundLength(inches: number, step: DisplayStep): number {
  const { unit, perUnit } = STEPS[step];
  const rounded = countSteps(inches, step) / perUnit;
  return unit === 'mm' ? rounded / 25.4 : rounded;
}

/**
 * The length in words for a screen reader: "96 and 1 quarter inches", "3 sixteenths of an inch", "2445 millimeters".
 *
 * @throws RangeError if the length is not finite
 */
export function spokenLength(inches: number, step: DisplayStep, style: LengthStyle = {}): string {
  const { unit, negative, feet, whole, numerator, denominator } = splitLength(inches, step, style);
  const sign = negative ? 'minus ' : '';
  if (unit === 'mm') {
    const one = whole === 1 && !numerator;
    return `${sign}${whole}${numerator ? '.5' : ''} ${one ? 'millimeter' : 'millimeters'}`;
  }
  const front = feet === undefined ? '' : `${feet} ${feet === 1 ? 'foot' : 'feet'} `;
  const fraction = numerator ? `${numerator} ${partName(numerator, denominator)}` : '';
  if (!fraction) return `${sign}${front}${whole} ${whole === 1 ? 'inch' : 'inches'}`;
  if (whole === 0) return `${sign}${front}${fraction} of an inch`;
  return `${sign}${front}${whole} and ${fraction} inches`;
}

function countSteps(inches: number, step: DisplayStep): number {
  if (!Number.isFinite(inches)) throw new RangeError(`a length has to be finite, got ${inches}`);
  const { unit, perUnit } = STEPS[step];
  const exact = (unit === 'mm' ? inches * 25.4 : inches) * perUnit;
  const size = Math.floor(Math.abs(exact) + 0.5 + HALF_SLACK);
  return exact < 0 && size > 0 ? -size : size;
}

function commonDivisor(a: number, b: number): number {
  return a === 0 ? b : commonDivisor(b % a, a);
}

const PART_NAMES: Readonly<Record<number, readonly [string, string]>> = {
  2: ['half', 'halves'],
  4: ['quarter', 'quarters'],
  8: ['eighth', 'eighths'],
  16: ['sixteenth', 'sixteenths'],
  32: ['thirty-second', 'thirty-seconds'],
  64: ['sixty-fourth', 'sixty-fourths'],
};

function partName(numerator: number, denominator: number): string {
  const names = PART_NAMES[denominator];
  if (!names) throw new RangeError(`no tape is divided into ${denominator}`);
  return names[numerator === 1 ? 0 : 1];
}
