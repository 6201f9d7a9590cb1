import { lengthFromNumber, parseLength, parseSignedLength, toInches } from '@/geometry/tape/parse-length';
import type { LengthUnit } from '@/geometry/tape/parse-length';

function inches(text: string, units?: LengthUnit): number {
  const parsed = parseLength(text, units);
  if (!parsed.ok) throw new Error(`${text}: ${parsed.message}`);
  return parsed.value;
}

function refusal(text: string, units?: LengthUnit): string {
  const parsed = parseLength(text, units);
  if (parsed.ok) throw new Error(`${text} was read as ${parsed.value}`);
  return parsed.message;
}

describe('parseLength', () => {
  it.each([
    ['96 1/4', 96.25],
    [`8' 1/4"`, 96.25],
    ['8 ft 0 1/4 in', 96.25],
    [`8'-0 1/4"`, 96.25],
    ['96.25', 96.25],
    ['8 ft', 96],
    [`8' 4 3/16`, 100.1875],
    [`8'4 3/16"`, 100.1875],
    ['8ft 4.5in', 100.5],
    ['96-1/4', 96.25],
    ['96 in.', 96],
    ['96 inches', 96],
    ['1 foot', 12],
    ['8.5 feet', 102],
    ['1/64', 1 / 64],
    ['0', 0],
    ['.5', 0.5],
    ['  96   1 / 4  ', 96.25],
    [`8' 11 31/32"`, 107.96875],
    ['100 ft', 1200],
  ])('reads %s as %d in', (text, value) => {
    expect(inches(text)).toBe(value);
  });

  it.each([
    ['2445mm', 2445],
    ['2445 MM', 2445],
    ['244.5 cm', 2445],
    ['2.445 m', 2445],
    ['2.445 metres', 2445],
    ['2445 millimeters', 2445],
  ])('reads %s as %d mm', (text, mm) => {
    expect(inches(text)).toBeCloseTo(mm / 25.4, 12);
  });

  it.each([
    ['96¼', 96.25],
    ['96 ⅝', 96.625],
    ['8′ ¼″', 96.25],
    ['8’ 0 1⁄4”', 96.25],
    [`8' 3''`, 99],
    ['8′–3″', 99],
    ['96\u00a01/4', 96.25],
  ])('reads the unicode of %s as %d in', (text, value) => {
    expect(inches(text)).toBe(value);
  });

  it('takes a bare number in the units it is given', () => {
    expect(inches('2540', 'mm')).toBeCloseTo(100, 12);
    expect(inches('2.54', 'm')).toBeCloseTo(100, 12);
    expect(inches('8 1/2', 'ft')).toBe(102);
    expect(inches('96 1/4 in', 'mm')).toBe(96.25);
  });

  it.each([
    ['', /nothing is typed/i],
    ['   ', /nothing is typed/i],
    ['-3', /negative/],
    ['−3 1/2', /negative/],
    ['96 1/3', /no tape is divided into 3/],
    ['96 1/128', /no tape is divided into 128/],
    ['96 ⅓', /no tape is divided into 3/],
    ['96 1/0', /no tape is divided into 0/],
    ['96 5/4', /whole inch or more/],
    ['4/4', /whole inch or more/],
    [`8' 12"`, /12 or more inches/],
    [`8' 14 1/2"`, /12 or more inches/],
    ['1200 1/16', /over 100 ft/],
    ['101 ft', /over 100 ft/],
    ['31 m', /over 100 ft/],
    ['abc', /"abc" is not part of a length/],
    ['96 1/4 yd', /"yd" is not part of a length/],
    ['96,5', /point, not a comma/],
    ['96.5 1/4', /mixes a decimal with a fraction/],
    [`8.5' 3"`, /whole feet/],
    ['8 4', /is not a length/],
    [`8" 4'`, /is not a length/],
    ['8 ft 4 mm', /is not a length/],
    ['2 m 40 cm', /is not a length/],
    [`8'-`, /is not a length/],
    ['8--4', /is not a length/],
    ['1e3', /"e" is not part of a length/],
    ['96 1/', /is not part of a length/],
    ['1/4 1/4', /is not a length/],
    ['96 in 3', /is not a length/],
  ])('refuses %s with a sentence', (text, sentence) => {
    const message = refusal(text);
    expect(message).toMatch(sentence);
    expect(message).toMatch(/\.$/);
  });

  it('refuses a fraction without a unit where bare numbers are metric', () => {
    expect(refusal('96 1/4', 'mm')).toMatch(/fractions belong to inches/);
    expect(refusal('244 1/2 cm')).toMatch(/fractions belong to inches/);
  });
});

describe('parseSignedLength', () => {
  it('reads bumps and gaps under zero', () => {
    expect(parseSignedLength('-1/4')).toEqual({ ok: true, value: -0.25 });
    expect(parseSignedLength('−6.35 mm')).toEqual({ ok: true, value: -0.25 });
    expect(parseSignedLength('3/8')).toEqual({ ok: true, value: 0.375 });
  });

  it('gives plain zero for minus zero', () => {
    expect(parseSignedLength('-0')).toEqual({ ok: true, value: 0 });
  });

  it('refuses two signs and a sign alone', () => {
    expect(parseSignedLength('--3').ok).toBe(false);
    expect(parseSignedLength('-').ok).toBe(false);
  });
});

describe('lengthFromNumber', () => {
  it('converts exactly: 1 in is 25.4 mm', () => {
    expect(lengthFromNumber(254, 'mm')).toEqual({ ok: true, value: 10 });
    expect(lengthFromNumber(25.4, 'cm')).toEqual({ ok: true, value: 10 });
    expect(toInches(0.254, 'm')).toBeCloseTo(10, 12);
    expect(toInches(8, 'ft')).toBe(96);
  });

  it('refuses what is no length', () => {
    expect(lengthFromNumber(Number.NaN).ok).toBe(false);
    expect(lengthFromNumber(Number.POSITIVE_INFINITY).ok).toBe(false);
    expect(lengthFromNumber(-1).ok).toBe(false);
    expect(lengthFromNumber(1201).ok).toBe(false);
  });
});
