import { formatLength, splitLength } from '@/geometry/tape/format-length';
import { parseLength } from '@/geometry/tape/parse-length';

/**
 * What stands on the fraction pad, as a pure state machine: a key gives the next state, `readPad` says what it amounts to.
 * Digits without ft are inches. What the pad reads is always what `parseLength` reads in the same text.
 */
export interface PadState {
  readonly unit: PadUnit;
  readonly inches: InchEntry;
  /** Digits, perhaps with a point. Kept while the pad shows inches, and the other way round. */
  readonly mm: string;
}

export type PadUnit = 'in' | 'mm';

export interface InchEntry {
  /** Digits in front of ft; null until ft is pressed. */
  readonly feet: string | null;
  /** Digits behind ft, or all of them; a typed decimal has a point. */
  readonly whole: string;
  readonly numerator: string | null;
  readonly denominator: string | null;
  /** One thirty-second heavy (1) or light (-1). */
  readonly nudge: -1 | 0 | 1;
  /** What was touched last, so where the next digit goes and what back takes away. */
  readonly slot: 'whole' | 'numerator' | 'denominator' | 'ruler';
}

export type PadKey =
  | { readonly kind: 'digit'; readonly digit: string }
  | { readonly kind: 'doubleZero' }
  | { readonly kind: 'point' }
  | { readonly kind: 'ft' }
  /** A mark of the inch on the ruler, 0 to 15. Pressing the lit one clears it. */
  | { readonly kind: 'mark'; readonly sixteenths: number }
  | { readonly kind: 'space' }
  | { readonly kind: 'slash' }
  | { readonly kind: 'back' }
  /** heavy, light, or from none to heavy to light and round again. */
  | { readonly kind: 'nudge'; readonly to: 'heavy' | 'light' | 'round' }
  | { readonly kind: 'unit'; readonly to: PadUnit };

/** What the pad says: nothing yet, a length, or why it is none yet. */
export type PadReading =
  | { readonly kind: 'empty' }
  /** `text` as typed on a tape, for the stored reading; `value` in inches. */
  | { readonly kind: 'length'; readonly text: string; readonly value: number }
  | { readonly kind: 'unfinished'; readonly message: string };

const EMPTY: InchEntry = { feet: null, whole: '', numerator: null, denominator: null, nudge: 0, slot: 'whole' };

/** Most digits that make sense: 1200 in is the longest tape believed, 30480 mm the same. */
const MOST = { feet: 3, whole: 4, decimals: 4, fraction: 2, mm: 5, mmDecimals: 2 } as const;

/** A pad with nothing on it. */
export const emptyPad = (unit: PadUnit): PadState => ({ unit, inches: EMPTY, mm: '' });

/**
 * A pad that shows a length already taped, to correct it, in the unit it was typed in.
 *
 * @param text - as stored: `8' 4 3/16"`, `100.1875`, `2545 mm`; what is no length leaves the pad empty
 */
export function padWith(text: string): PadState {
  const mm = /^\s*(\d+(?:\.\d+)?)\s*mm\s*$/.exec(text)?.[1];
  if (mm !== undefined) return { ...emptyPad('mm'), mm };
  const parsed = parseLength(text);
  if (!parsed.ok) return emptyPad('in');
  const split = splitLength(parsed.value, '1/64', { feet: /['f]/.test(text) });
  // What lies between two 64ths was typed as a decimal.
  if ((parsed.value * 64) % 1 !== 0) return { ...emptyPad('in'), inches: { ...EMPTY, whole: String(parsed.value) } };
  const fraction = split.numerator
    ? { numerator: String(split.numerator), denominator: String(split.denominator), slot: 'ruler' as const }
    : {};
  const whole = split.whole === 0 && (split.numerator || split.feet) ? '' : String(split.whole);
  const feet = split.feet === undefined ? null : String(split.feet);
  return { ...emptyPad('in'), inches: { ...EMPTY, feet, whole, ...fraction } };
}

/** The pad after one key. A key that makes no sense where it is changes nothing. */
export function pressPad(state: PadState, key: PadKey): PadState {
  if (key.kind === 'unit') return key.to === state.unit ? state : changeUnit(state);
  if (state.unit === 'mm') return { ...state, mm: pressMm(state.mm, key) };
  return { ...state, inches: pressInches(state.inches, key) };
}

function pressMm(mm: string, key: PadKey): string {
  if (key.kind === 'back') return mm.slice(0, -1);
  if (key.kind === 'point') return mm.includes('.') ? mm : `${mm || '0'}.`;
  if (key.kind === 'doubleZero')
    return mm === '' || mm === '0'
      ? mm
      : addDigit(addDigit(mm, '0', MOST.mm, MOST.mmDecimals), '0', MOST.mm, MOST.mmDecimals);
  return key.kind === 'digit' ? addDigit(mm, key.digit, MOST.mm, MOST.mmDecimals) : mm;
}

function pressInches(entry: InchEntry, key: PadKey): InchEntry {
  switch (key.kind) {
    case 'digit':
      return typeDigit(entry, key.digit);
    case 'doubleZero':
      return typeDigit(typeDigit(entry, '0'), '0');
    case 'point':
      return entry.slot === 'whole' && !entry.whole.includes('.')
        ? { ...entry, whole: `${entry.whole || '0'}.` }
        : entry;
    case 'ft':
      return takeFeet(entry);
    case 'mark':
      return takeMark(entry, key.sixteenths);
    case 'space':
      return entry.slot === 'whole' && entry.whole !== '' && entry.numerator === null
        ? { ...entry, numerator: '', slot: 'numerator' }
        : entry;
    case 'slash':
      return takeSlash(entry);
    case 'nudge':
      return { ...entry, nudge: nextNudge(entry.nudge, key.to) };
    case 'back':
      return takeBack(entry);
    case 'unit':
      return entry;
  }
}

function typeDigit(entry: InchEntry, digit: string): InchEntry {
  if (entry.slot === 'numerator') {
    return { ...entry, numerator: addDigit(entry.numerator ?? '', digit, MOST.fraction, 0) };
  }
  if (entry.slot === 'denominator') {
    return { ...entry, denominator: addDigit(entry.denominator ?? '', digit, MOST.fraction, 0) };
  }
  return { ...entry, slot: 'whole', whole: addDigit(entry.whole, digit, MOST.whole, MOST.decimals) };
}

function addDigit(digits: string, digit: string, most: number, decimals: number): string {
  const point = digits.indexOf('.');
  if (point >= 0) return digits.length - point > decimals ? digits : digits + digit;
  if (digits === '0') return digit;
  return digits.length >= most ? digits : digits + digit;
}

function takeFeet(entry: InchEntry): InchEntry {
  const fits = /^\d+$/.test(entry.whole) && entry.whole.length <= MOST.feet;
  return entry.feet === null && fits && entry.numerator === null
    ? { ...entry, feet: entry.whole, whole: '', slot: 'whole' }
    : entry;
}

function takeMark(entry: InchEntry, sixteenths: number): InchEntry {
  const cleared: InchEntry = { ...entry, numerator: null, denominator: null, nudge: 0, slot: 'whole' };
  if (sixteenths === 0 || litMark(entry) === sixteenths) return cleared;
  const { numerator, denominator } = splitLength(sixteenths / 16, '1/16');
  return { ...cleared, numerator: String(numerator), denominator: String(denominator), slot: 'ruler' };
}

/** `3/16` without a whole number: the digits before the slash were the numerator all along. */
function takeSlash(entry: InchEntry): InchEntry {
  if (entry.slot === 'numerator' && entry.numerator) return { ...entry, denominator: '', slot: 'denominator' };
  if (entry.slot === 'whole' && entry.numerator === null && /^\d{1,2}$/.test(entry.whole)) {
    return { ...entry, whole: '', numerator: entry.whole, denominator: '', slot: 'denominator' };
  }
  return entry;
}

function nextNudge(now: InchEntry['nudge'], to: 'heavy' | 'light' | 'round'): InchEntry['nudge'] {
  if (to === 'round') return now === 0 ? 1 : now === 1 ? -1 : 0;
  const asked = to === 'heavy' ? 1 : -1;
  return now === asked ? 0 : asked;
}

function takeBack(entry: InchEntry): InchEntry {
  if (entry.nudge !== 0) return { ...entry, nudge: 0 };
  const noFraction: InchEntry = { ...entry, numerator: null, denominator: null, slot: 'whole' };
  if (entry.slot === 'ruler') return noFraction;
  if (entry.slot === 'denominator') {
    if (entry.denominator) return { ...entry, denominator: entry.denominator.slice(0, -1) };
    if (entry.whole === '') return { ...noFraction, whole: entry.numerator ?? '' };
    return { ...entry, denominator: null, slot: 'numerator' };
  }
  if (entry.slot === 'numerator')
    return entry.numerator ? { ...entry, numerator: entry.numerator.slice(0, -1) } : noFraction;
  if (entry.whole !== '') return { ...entry, whole: entry.whole.slice(0, -1) };
  if (entry.numerator !== null) return noFraction;
  return entry.feet === null ? entry : { ...entry, feet: null, whole: entry.feet };
}

/** Plain digits go over with the unit: somebody typed 2545 and only then saw that the pad was on inches. */
function changeUnit(state: PadState): PadState {
  const { inches, mm } = state;
  if (state.unit === 'in') {
    const plain = inches.feet === null && inches.numerator === null && inches.nudge === 0 && mm === '';
    return plain ? { unit: 'mm', inches: EMPTY, mm: inches.whole } : { ...state, unit: 'mm' };
  }
  const free = readInches(inches).kind === 'empty' && /^\d{0,4}$/.test(mm);
  return free ? { unit: 'in', inches: { ...EMPTY, whole: mm }, mm: '' } : { ...state, unit: 'in' };
}

/** The mark of the ruler that is lit, 1 to 15, or null. */
export function litMark(entry: InchEntry): number | null {
  if (!entry.numerator || !entry.denominator) return null;
  const sixteenths = (Number(entry.numerator) / Number(entry.denominator)) * 16;
  return Number.isInteger(sixteenths) && sixteenths > 0 && sixteenths < 16 ? sixteenths : null;
}

/** What the pad amounts to, read by `parseLength` like any typed text. */
export function readPad(state: PadState): PadReading {
  if (state.unit === 'in') return readInches(state.inches);
  return state.mm === '' ? { kind: 'empty' } : readText(`${state.mm.replace(/\.$/, '')} mm`);
}

function readInches(entry: InchEntry): PadReading {
  const text = inchText(entry);
  if (text === '')
    return entry.nudge === 0
      ? { kind: 'empty' }
      : { kind: 'unfinished', message: 'Type the length first, then heavy or light.' };
  if (entry.numerator !== null && !(entry.numerator && entry.denominator)) {
    return { kind: 'unfinished', message: 'The fraction is not finished. Type it like 3/16.' };
  }
  const plain = readText(text);
  return plain.kind === 'length' && entry.nudge !== 0 ? nudged(plain.value, entry) : plain;
}

function inchText({ feet, whole, numerator, denominator }: InchEntry): string {
  const fraction = numerator === null ? '' : `${numerator}/${denominator ?? ''}`;
  const inches = [whole.replace(/\.$/, ''), fraction].filter(Boolean).join(' ');
  if (feet === null) return inches;
  return inches === '' ? `${feet}'` : `${feet}' ${inches}"`;
}

function nudged(base: number, entry: InchEntry): PadReading {
  const value = base + entry.nudge / 32;
  if (value < 0) return { kind: 'unfinished', message: 'Light of nothing is under zero. Type the length first.' };
  const text = formatLength(value, '1/64', { feet: entry.feet !== null });
  const read = readText(text);
  // A decimal need not lie on a 64th; then the decimal itself is the text.
  return read.kind === 'length' && read.value === value ? read : readText(String(value));
}

function readText(text: string): PadReading {
  const parsed = parseLength(text);
  return parsed.ok ? { kind: 'length', text, value: parsed.value } : { kind: 'unfinished', message: parsed.message };
}

/** What the live blade draws. */
export interface PadParts {
  readonly feet?: string;
  readonly whole?: string;
  readonly numerator?: string;
  readonly denominator?: string;
  readonly unit: PadUnit;
}

/** What stands on the blade, unfinished or not; heavy and light are already in the fraction. */
export function padParts(state: PadState): PadParts {
  if (state.unit === 'mm') return { whole: state.mm, unit: 'mm' };
  const { feet, whole, numerator, denominator, nudge } = state.inches;
  const reading = readInches(state.inches);
  if (nudge !== 0 && reading.kind === 'length') {
    const split = splitLength(reading.value, '1/64', { feet: feet !== null });
    return {
      feet: split.feet === undefined ? undefined : String(split.feet),
      whole: split.whole || !split.numerator ? String(split.whole) : undefined,
      numerator: split.numerator ? String(split.numerator) : undefined,
      denominator: split.numerator ? String(split.denominator) : undefined,
      unit: 'in',
    };
  }
  return {
    feet: feet ?? undefined,
    whole: whole || undefined,
    numerator: numerator ?? undefined,
    denominator: numerator === null ? undefined : (denominator ?? ''),
    unit: 'in',
  };
}
