import fc from 'fast-check';

import { DISPLAY_STEPS, formatLength, roundLength, splitLength, spokenLength } from '@/geometry/tape/format-length';
import { parseSignedLength } from '@/geometry/tape/parse-length';

describe('formatLength', () => {
  it.each([
    [96.25, '96 1/4'],
    [8.25, '8 1/4'],
    [0.1875, '3/16'],
    [0, '0'],
    [12, '12'],
    [-0.25, '-1/4'],
    [-3.5, '-3 1/2'],
    [95.99, '96'],
  ])('writes %d in as %s to 1/16', (length, text) => {
    expect(formatLength(length, '1/16')).toBe(text);
  });

  it('reduces every sixteenth', () => {
    const texts = Array.from({ length: 16 }, (_, i) => formatLength(i / 16, '1/16'));
    expect(texts).toEqual([
      '0',
      '1/16',
      '1/8',
      '3/16',
      '1/4',
      '5/16',
      '3/8',
      '7/16',
      '1/2',
      '9/16',
      '5/8',
      '11/16',
      '3/4',
      '13/16',
      '7/8',
      '15/16',
    ]);
  });

  it('rounds half a step away from zero', () => {
    expect(formatLength(1 / 32, '1/16')).toBe('1/16');
    expect(formatLength(-1 / 32, '1/16')).toBe('-1/16');
    expect(formatLength(96 + 1 / 64, '1/32')).toBe('96 1/32');
    expect(formatLength(1 / 32 - 1e-6, '1/16')).toBe('0');
    expect(formatLength(2444.5 / 25.4, '1 mm')).toBe('2445 mm');
    expect(formatLength(0.25 / 25.4, '0.5 mm')).toBe('0.5 mm');
  });

  it('writes no minus before a zero', () => {
    expect(formatLength(-0.001, '1/16')).toBe('0');
    expect(formatLength(-0.001, '1 mm')).toBe('0 mm');
  });

  it('writes millimeters whole and in halves', () => {
    expect(formatLength(96.25, '1 mm')).toBe('2445 mm');
    expect(formatLength(96.25, '0.5 mm')).toBe('2445 mm');
    expect(formatLength(2444.5 / 25.4, '0.5 mm')).toBe('2444.5 mm');
  });

  it('writes feet when asked, and only from one foot on', () => {
    expect(formatLength(100.1875, '1/16', { feet: true })).toBe(`8' 4 3/16"`);
    expect(formatLength(96.25, '1/16', { feet: true })).toBe(`8' 1/4"`);
    expect(formatLength(96, '1/16', { feet: true })).toBe(`8' 0"`);
    expect(formatLength(11.5, '1/16', { feet: true })).toBe('11 1/2');
    expect(formatLength(11.99, '1/16', { feet: true })).toBe(`1' 0"`);
  });

  it('refuses a length that is not finite', () => {
    expect(() => formatLength(Number.NaN, '1/16')).toThrow(RangeError);
  });

  it('reads its own text back to the same text, at every step', () => {
    fc.assert(
      fc.property(
        fc.double({ min: -1199, max: 1199, noNaN: true }),
        fc.constantFrom(...DISPLAY_STEPS),
        fc.boolean(),
        (length, step, feet) => {
          const text = formatLength(length, step, { feet });
          const parsed = parseSignedLength(text);
          expect(parsed.ok && formatLength(parsed.value, step, { feet })).toBe(text);
        },
      ),
      { seed: 3, numRuns: 2000 },
    );
  });

  it('stays within half a step of the length', () => {
    fc.assert(
      fc.property(fc.double({ min: -1199, max: 1199, noNaN: true }), (length) => {
        expect(Math.abs(roundLength(length, '1/16') - length)).toBeLessThanOrEqual(1 / 32 + 1e-9);
        expect(Math.abs(roundLength(length, '0.5 mm') - length)).toBeLessThanOrEqual(0.25 / 25.4 + 1e-9);
      }),
      { seed: 4, numRuns: 1000 },
    );
  });
});

describe('splitLength', () => {
  it('takes 8 ft 4 3/16 in apart for a stacked fraction', () => {
    expect(splitLength(100.1875, '1/16', { feet: true })).toEqual({
      unit: 'in',
      negative: false,
      feet: 8,
      whole: 4,
      numerator: 3,
      denominator: 16,
    });
  });

  it('gives 0 over 1 where there is no fraction, and half a millimeter as 1 over 2', () => {
    expect(splitLength(-5, '1/32')).toEqual({ unit: 'in', negative: true, whole: 5, numerator: 0, denominator: 1 });
    expect(splitLength(2444.5 / 25.4, '0.5 mm')).toEqual({
      unit: 'mm',
      negative: false,
      whole: 2444,
      numerator: 1,
      denominator: 2,
    });
  });
});

describe('spokenLength', () => {
  it.each([
    [96.25, '96 and 1 quarter inches'],
    [96.75, '96 and 3 quarters inches'],
    [1, '1 inch'],
    [0, '0 inches'],
    [0.5, '1 half of an inch'],
    [0.1875, '3 sixteenths of an inch'],
    [-0.25, 'minus 1 quarter of an inch'],
  ])('says %d in as %s', (length, words) => {
    expect(spokenLength(length, '1/16')).toBe(words);
  });

  it('says feet, thirty-seconds and millimeters', () => {
    expect(spokenLength(100.1875, '1/16', { feet: true })).toBe('8 feet 4 and 3 sixteenths inches');
    expect(spokenLength(12 + 1 / 32, '1/32', { feet: true })).toBe('1 foot 1 thirty-second of an inch');
    expect(spokenLength(96.25, '1 mm')).toBe('2445 millimeters');
    expect(spokenLength(1 / 25.4, '1 mm')).toBe('1 millimeter');
  });
});
