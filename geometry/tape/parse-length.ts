/** Units in which a bare number may stand. */
export type LengthUnit = 'in' | 'mm' | 'cm' | 'm' | 'ft';

export type ParsedLength =
  { readonly ok: true; readonly value: number } | { readonly ok: false; readonly message: string };

/** Longest length that is believed, inches: no tape in a kitchen is longer than 100 ft. */
export const LONGEST = 1200;

/** What a tape is divided into. */
const DENOMINATORS: readonly number[] = [2, 4, 8, 16, 32, 64];

const MM_PER_INCH = 25.4;

const VULGAR: Readonly<Record<string, string>> = {
  '½': '1/2',
  '¼': '1/4',
  '¾': '3/4',
  '⅛': '1/8',
  '⅜': '3/8',
  '⅝': '5/8',
  '⅞': '7/8',
  '⅓': '1/3',
  '⅔': '2/3',
  '⅕': '1/5',
  '⅖': '2/5',
  '⅗': '3/5',
  '⅘': '4/5',
  '⅙': '1/6',
  '⅚': '5/6',
  '⅐': '1/7',
  '⅑': '1/9',
  '⅒': '1/10',
};

const UNIT_WORDS: Readonly<Record<string, LengthUnit>> = {
  mm: 'mm',
  millimeter: 'mm',
  millimeters: 'mm',
  millimetre: 'mm',
  millimetres: 'mm',
  cm: 'cm',
  centimeter: 'cm',
  centimeters: 'cm',
  centimetre: 'cm',
  centimetres: 'cm',
  m: 'm',
  meter: 'm',
  meters: 'm',
  metre: 'm',
  metres: 'm',
  in: 'in',
  inch: 'in',
  inches: 'in',
  '"': 'in',
  ft: 'ft',
  foot: 'ft',
  feet: 'ft',
  "'": 'ft',
};

type Token =
  | { readonly kind: 'number'; readonly value: number; readonly whole: boolean; readonly text: string }
  | { readonly kind: 'fraction'; readonly numerator: number; readonly denominator: number; readonly text: string }
  | { readonly kind: 'unit'; readonly unit: LengthUnit; readonly text: string }
  | { readonly kind: 'dash' };

/**
 * Reads a length as people write it on a pad: `96 1/4`, `8' 1/4"`, `8 ft 0 1/4 in`, `8'-0 1/4"`, `96.25`, `2445mm`,
 * `244.5 cm`, `2.445 m`, with unicode fractions and primes.
 *
 * @param text - as typed
 * @param units - what a number without a unit is in; inches when left out
 * @returns the length in inches, or a sentence that says what was wrong: nothing typed, a negative length, a
 *   denominator no tape has, feet with 12 or more inches behind them, over 100 ft, anything that is no length
 */
export function parseLength(text: string, units: LengthUnit = 'in'): ParsedLength {
  const plain = normaliseText(text);
  if (plain === '') return refuse('Nothing is typed here. Type a length, for example 96 1/4.');
  if (plain.startsWith('-')) return refuse(`${shown(text)} is negative. A length is never under zero.`);
  const tokens = tokenise(plain);
  if (!tokens.ok) return tokens;
  const value = evaluate(tokens.tokens, units, text);
  return value.ok ? believable(value.value, text) : value;
}

/**
 * Reads a length that may be under zero, such as a bump behind a straight-edge or a gap at an appliance.
 *
 * @param text - as `parseLength`, with a minus sign in front for a negative one
 * @param units - what a number without a unit is in
 * @returns the length in inches, negative with the sign, or a sentence that says what was wrong
 */
export function parseSignedLength(text: string, units: LengthUnit = 'in'): ParsedLength {
  const plain = normaliseText(text);
  if (!plain.startsWith('-')) return parseLength(text, units);
  const size = parseLength(plain.slice(1), units);
  return size.ok ? { ok: true, value: size.value === 0 ? 0 : -size.value } : size;
}

/**
 * A length that came as a number, as in a file.
 *
 * @param value - in `units`, not negative
 * @param units - unit of the number
 * @returns the length in inches, or a sentence: not a number, negative, over 100 ft
 */
export function lengthFromNumber(value: number, units: LengthUnit = 'in'): ParsedLength {
  if (!Number.isFinite(value)) return refuse('A length has to be a plain number.');
  if (value < 0) return refuse(`${value} is negative. A length is never under zero.`);
  return believable(toInches(value, units), `${value} ${units}`);
}

/** `value` of `units` in inches; 1 in is 25.4 mm exactly. */
export function toInches(value: number, units: LengthUnit): number {
  if (units === 'in') return value;
  if (units === 'ft') return value * 12;
  const mm = units === 'mm' ? value : units === 'cm' ? value * 10 : value * 1000;
  return mm / MM_PER_INCH;
}

function refuse(message: string): { readonly ok: false; readonly message: string } {
  return { ok: false, message };
}

const shown = (text: string): string => `"${text.trim()}"`;

function believable(value: number, text: string): ParsedLength {
  if (value > LONGEST) return refuse(`${shown(text)} is over 100 ft, longer than any wall here.`);
  return { ok: true, value };
}

function normaliseText(text: string): string {
  return [...text]
    .map((c) => (c in VULGAR ? ` ${VULGAR[c]} ` : c))
    .join('')
    .toLowerCase()
    .replace(/[⁄∕]/g, '/')
    .replace(/[‘’ʹ′`´]/g, "'")
    .replace(/[“”ʺ″]|''/g, '"')
    .replace(/[−–—‐‑]/g, '-')
    .replace(/\s*\/\s*/g, '/')
    .trim();
}

type Tokens =
  { readonly ok: true; readonly tokens: readonly Token[] } | { readonly ok: false; readonly message: string };

function tokenise(plain: string): Tokens {
  const pattern = /\s*(?:(\d+)\/(\d+)|(\d+\.?\d*|\.\d+)|([a-z]+)\.?|(["'])|(-)|(\S))/gy;
  const tokens: Token[] = [];
  for (const m of plain.matchAll(pattern)) {
    const [text, numerator, denominator, number, word, mark, dash, other] = m;
    if (numerator !== undefined) {
      const fraction = readFraction(numerator, denominator!, text.trim());
      if (!fraction.ok) return fraction;
      tokens.push(fraction.token);
    } else if (number !== undefined) {
      tokens.push({ kind: 'number', value: Number(number), whole: /^\d+$/.test(number), text: number });
    } else if (word !== undefined || mark !== undefined) {
      const name = word ?? mark!;
      const unit = UNIT_WORDS[name];
      if (!unit) return refuse(`"${name}" is not part of a length. Use ', ", ft, in, mm, cm or m.`);
      tokens.push({ kind: 'unit', unit, text: name });
    } else if (dash !== undefined) tokens.push({ kind: 'dash' });
    else if (other === ',') return refuse('Write decimals with a point, not a comma.');
    else return refuse(`"${other}" is not part of a length. Use ', ", ft, in, mm, cm or m.`);
  }
  return { ok: true, tokens };
}

function readFraction(
  top: string,
  bottom: string,
  text: string,
): { readonly ok: true; readonly token: Token } | { readonly ok: false; readonly message: string } {
  const numerator = Number(top);
  const denominator = Number(bottom);
  if (!DENOMINATORS.includes(denominator)) {
    return refuse(`${text}: no tape is divided into ${bottom}. Use halves, 4ths, 8ths, 16ths, 32nds or 64ths.`);
  }
  if (numerator >= denominator)
    return refuse(`${text} is a whole inch or more. Write the whole inches in front of it.`);
  return { ok: true, token: { kind: 'fraction', numerator, denominator, text } };
}

interface Part {
  readonly value: number;
  readonly unit: LengthUnit | null;
  readonly hasFraction: boolean;
  readonly whole: boolean;
}

/** Groups `number fraction unit` runs, then adds feet to inches. */
function evaluate(tokens: readonly Token[], units: LengthUnit, text: string): ParsedLength {
  const parts: Part[] = [];
  let i = 0;
  while (i < tokens.length) {
    // A dash may tie feet to inches (8'-0) or inches to their fraction (96-1/4), nothing else.
    if (tokens[i]?.kind === 'dash') {
      const last = parts[parts.length - 1];
      if (!last || last.unit !== 'ft' || tokens[i + 1]?.kind === undefined) return notALength(text);
      i++;
    }
    const number = tokens[i]?.kind === 'number' ? (tokens[i++] as Token & { kind: 'number' }) : null;
    if (number && tokens[i]?.kind === 'dash' && tokens[i + 1]?.kind === 'fraction') i++;
    const fraction = tokens[i]?.kind === 'fraction' ? (tokens[i++] as Token & { kind: 'fraction' }) : null;
    if (!number && !fraction) return notALength(text);
    if (number && fraction && !number.whole) return refuse(`${shown(text)} mixes a decimal with a fraction. Use one.`);
    const unit = tokens[i]?.kind === 'unit' ? (tokens[i++] as Token & { kind: 'unit' }) : null;
    const value = (number?.value ?? 0) + (fraction ? fraction.numerator / fraction.denominator : 0);
    const whole = !fraction && number !== null && number.whole;
    parts.push({ value, unit: unit?.unit ?? null, hasFraction: fraction !== null, whole });
  }
  return combine(parts, units, text);
}

function combine(parts: readonly Part[], units: LengthUnit, text: string): ParsedLength {
  const [first, second, third] = parts;
  if (!first || third) return notALength(text);
  if (!second) {
    const unit = first.unit ?? units;
    if (first.hasFraction && unit !== 'in' && unit !== 'ft') {
      return refuse(`${shown(text)}: fractions belong to inches. Write in behind it, or a decimal.`);
    }
    return { ok: true, value: toInches(first.value, unit) };
  }
  if (first.unit !== 'ft' || (second.unit !== null && second.unit !== 'in')) return notALength(text);
  if (!first.whole) return refuse(`${shown(text)}: write whole feet in front of inches.`);
  if (second.value >= 12) {
    return refuse(`${shown(text)} has 12 or more inches behind the feet. Write ${inchesBehind(first, second)}.`);
  }
  return { ok: true, value: first.value * 12 + second.value };
}

const inchesBehind = (feet: Part, inches: Part): string =>
  `${feet.value + Math.floor(inches.value / 12)}' and the inches that are left, or inches alone`;

const notALength = (text: string): ParsedLength =>
  refuse(`${shown(text)} is not a length. Write it like 96 1/4, 8' 1/4" or 2445 mm.`);
