import fc from 'fast-check';

import { padKeyOf } from '@/components/measure/pad-keyboard';
import {
  emptyPad,
  litMark,
  padParts,
  padWith,
  pressPad,
  readPad,
  type PadKey,
  type PadState,
  type PadUnit,
} from '@/components/measure/pad-state';
import { parseLength } from '@/geometry/tape/parse-length';

const mark = (sixteenths: number): PadKey => ({ kind: 'mark', sixteenths });
const FT: PadKey = { kind: 'ft' };
const BACK: PadKey = { kind: 'back' };
const HEAVY: PadKey = { kind: 'nudge', to: 'heavy' };
const LIGHT: PadKey = { kind: 'nudge', to: 'light' };

const press = (keys: readonly PadKey[], unit: PadUnit = 'in'): PadState => keys.reduce(pressPad, emptyPad(unit));
const digits = (text: string): PadKey[] => [...text].map((digit) => ({ kind: 'digit', digit }));

/** Types a text on a real keyboard. */
function type(text: string, start: PadState = emptyPad('in')): PadState {
  return [...text].reduce((state, key) => {
    const meaning = padKeyOf(key, state.unit);
    return meaning === null || typeof meaning === 'string' ? state : pressPad(state, meaning);
  }, start);
}

describe('the fraction pad', () => {
  it('reads 8 ft 4 3/16 as 100 3/16 in', () => {
    const pad = press([...digits('8'), FT, ...digits('4'), mark(3)]);
    expect(readPad(pad)).toEqual({ kind: 'length', text: `8' 4 3/16"`, value: 100.1875 });
  });

  it('takes digits without ft as inches', () => {
    expect(readPad(press(digits('118')))).toEqual({ kind: 'length', text: '118', value: 118 });
    expect(readPad(press([...digits('118'), mark(10)]))).toEqual({ kind: 'length', text: '118 5/8', value: 118.625 });
  });

  it('reduces every mark of the inch: 4/16 shows 1/4', () => {
    const shown = Array.from({ length: 15 }, (_, i) => padParts(press([mark(i + 1)])));
    expect(shown.map(({ numerator, denominator }) => `${numerator}/${denominator}`)).toEqual([
      ...['1/16', '1/8', '3/16', '1/4', '5/16', '3/8', '7/16'],
      ...['1/2', '9/16', '5/8', '11/16', '3/4', '13/16', '7/8', '15/16'],
    ]);
  });

  it('clears a fraction when its lit mark is pressed again, and by the mark 0', () => {
    const lit = press([...digits('96'), mark(4)]);
    expect(litMark(lit.inches)).toBe(4);
    expect(readPad(pressPad(lit, mark(4)))).toMatchObject({ value: 96 });
    expect(readPad(pressPad(lit, mark(0)))).toMatchObject({ value: 96 });
    expect(readPad(pressPad(lit, mark(5)))).toMatchObject({ value: 96.3125 });
  });

  it('lets the fraction come before the inches', () => {
    expect(readPad(press([mark(2), ...digits('84')]))).toMatchObject({ text: '84 1/8', value: 84.125 });
  });

  it('adds 1/32 for heavy and takes 1/32 for light, over the whole inch too', () => {
    expect(readPad(press([...digits('4'), mark(3), HEAVY]))).toMatchObject({ text: '4 7/32', value: 4.21875 });
    expect(readPad(press([...digits('4'), mark(3), LIGHT]))).toMatchObject({ text: '4 5/32', value: 4.15625 });
    expect(readPad(press([...digits('8'), FT, LIGHT]))).toMatchObject({ text: `7' 11 31/32"`, value: 95.96875 });
    expect(padParts(press([...digits('8'), FT, LIGHT]))).toEqual({
      feet: '7',
      whole: '11',
      numerator: '31',
      denominator: '32',
      unit: 'in',
    });
  });

  it('goes from none to heavy to light and back to none by the one key', () => {
    const round: PadKey = { kind: 'nudge', to: 'round' };
    const values = [0, 1, 2, 3].map((times) => readPad(press([...digits('4'), ...Array<PadKey>(times).fill(round)])));
    expect(values.map((reading) => reading.kind === 'length' && reading.value)).toEqual([4, 4.03125, 3.96875, 4]);
  });

  it('takes back one thing at a time: nudge, fraction, digits, ft', () => {
    let pad = press([...digits('8'), FT, ...digits('4'), mark(3), HEAVY]);
    const texts: string[] = [];
    for (let i = 0; i < 6; i++) {
      const reading = readPad(pad);
      texts.push(reading.kind === 'length' ? reading.text : reading.kind);
      pad = pressPad(pad, BACK);
    }
    expect(texts).toEqual([`8' 4 7/32"`, `8' 4 3/16"`, `8' 4"`, `8'`, '8', 'empty']);
  });

  it('says what is missing instead of guessing', () => {
    expect(readPad(emptyPad('in'))).toEqual({ kind: 'empty' });
    expect(readPad(type('100 3'))).toMatchObject({ kind: 'unfinished' });
    expect(readPad(type('100 3/'))).toMatchObject({ kind: 'unfinished' });
    expect(readPad(type('100 3/7'))).toMatchObject({
      kind: 'unfinished',
      message: expect.stringContaining('divided into 7'),
    });
    expect(readPad(press([...digits('8'), FT, ...digits('14')]))).toMatchObject({
      kind: 'unfinished',
      message: expect.stringContaining('12 or more inches'),
    });
    expect(readPad(press([LIGHT]))).toMatchObject({ kind: 'unfinished' });
    expect(readPad(press([...digits('0'), LIGHT]))).toMatchObject({ kind: 'unfinished' });
  });

  it('keeps to what a tape can say: no second 0 in front, 4 digits, 5 of millimeters', () => {
    expect(readPad(press(digits('007')))).toMatchObject({ text: '7' });
    expect(press(digits('123456')).inches.whole).toBe('1234');
    expect(press(digits('1234567'), 'mm').mm).toBe('12345');
  });
});

describe('the fraction pad in millimeters', () => {
  it('has 00 and a point, and stores the text in mm', () => {
    const pad = press([...digits('25'), { kind: 'doubleZero' }, { kind: 'point' }, ...digits('5')], 'mm');
    expect(readPad(pad)).toEqual({ kind: 'length', text: '2500.5 mm', value: 2500.5 / 25.4 });
  });

  it('takes plain digits over when the unit is changed, both ways', () => {
    const mm = pressPad(press(digits('2545')), { kind: 'unit', to: 'mm' });
    expect(readPad(mm)).toMatchObject({ text: '2545 mm' });
    expect(readPad(pressPad(mm, { kind: 'unit', to: 'in' })).kind).toBe('unfinished');
    expect(pressPad(mm, { kind: 'unit', to: 'in' }).inches.whole).toBe('2545');
  });

  it('keeps feet and fractions while the other unit is shown', () => {
    const feet = press([...digits('8'), FT, ...digits('4'), mark(3)]);
    const away = pressPad(feet, { kind: 'unit', to: 'mm' });
    expect(readPad(away)).toEqual({ kind: 'empty' });
    expect(readPad(pressPad(away, { kind: 'unit', to: 'in' }))).toMatchObject({ value: 100.1875 });
  });
});

describe('typing on a real keyboard', () => {
  it.each([
    [`8' 4 3/16"`, 100.1875],
    ['100.1875', 100.1875],
    ['100,1875', 100.1875],
    ['2545mm', 2545 / 25.4],
    ['3/16', 0.1875],
    ['96 1/4', 96.25],
    [`8'`, 96],
    ['84 3/64', 84.046875],
    ['4 3/16+', 4.21875],
    ['4 3/16-', 4.15625],
  ])('reads %s', (text, value) => {
    expect(readPad(type(text))).toMatchObject({ kind: 'length', value });
  });

  it('agrees with the parser of the command line for every length it can type', () => {
    const feet = fc.option(fc.integer({ min: 1, max: 40 }), { nil: null });
    const inches = fc.integer({ min: 0, max: 11 });
    const part = fc.option(fc.constantFrom('1/2', '3/4', '5/8', '11/16', '7/32', '63/64'), { nil: null });
    fc.assert(
      fc.property(feet, inches, part, (ft, whole, fraction) => {
        const behind = [String(whole), fraction].filter(Boolean).join(' ');
        const text = ft === null ? behind : `${ft}' ${behind}"`;
        const parsed = parseLength(text);
        expect(readPad(type(text))).toMatchObject({ kind: 'length', value: parsed.ok && parsed.value });
      }),
      { seed: 8416, numRuns: 200 },
    );
  });

  it('never stores a text that the parser reads as another value, whatever keys are pressed', () => {
    const key = fc.oneof(
      fc.constantFrom(...'0123456789').map((digit): PadKey => ({ kind: 'digit', digit })),
      fc.integer({ min: 0, max: 15 }).map(mark),
      fc.constantFrom<PadKey>(FT, BACK, HEAVY, LIGHT, { kind: 'space' }, { kind: 'slash' }, { kind: 'point' }),
      fc.constantFrom<PadKey>({ kind: 'doubleZero' }, { kind: 'unit', to: 'mm' }, { kind: 'unit', to: 'in' }),
    );
    fc.assert(
      fc.property(fc.array(key, { maxLength: 14 }), (keys) => {
        const reading = readPad(press(keys));
        if (reading.kind !== 'length') return;
        expect(parseLength(reading.text)).toEqual({ ok: true, value: reading.value });
      }),
      { seed: 316, numRuns: 1000 },
    );
  });

  it('empties after enough take-backs from any state', () => {
    const key = fc.constantFrom<PadKey>(
      ...digits('0159'),
      mark(3),
      mark(8),
      FT,
      HEAVY,
      { kind: 'space' },
      { kind: 'slash' },
    );
    fc.assert(
      fc.property(fc.array(key, { maxLength: 12 }), (keys) => {
        const back = Array<PadKey>(20).fill(BACK);
        expect(readPad(back.reduce(pressPad, press(keys)))).toEqual({ kind: 'empty' });
      }),
      { seed: 12, numRuns: 300 },
    );
  });
});

describe('padWith', () => {
  it('shows a length already taped', () => {
    const texts = ['118 5/8', `8' 4 3/16"`, `8'`, '3/16', '84', '100.1', '2545 mm', '2545.5 mm', '0'];
    expect(texts.map((text) => readPad(padWith(text)))).toEqual(
      texts.map((text) => ({ kind: 'length', text, value: (parseLength(text) as { value: number }).value })),
    );
    expect(readPad(padWith('nonsense'))).toEqual({ kind: 'empty' });
  });
});
