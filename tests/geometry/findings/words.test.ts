import fc from 'fast-check';
import { listText, sizePair, sizeText } from '@/geometry/findings/words';

describe('sizeText', () => {
  it('writes an inch and more in the step, less than an inch to the 1/32 or half a millimeter', () => {
    expect(sizeText(35.36, '1/16')).toBe('35 3/8 in');
    expect(sizeText(0.22, '1/16')).toBe('7/32 in');
    expect(sizeText(0.22, '1 mm')).toBe('5.5 mm');
    expect(sizeText(2, '1 mm')).toBe('51 mm');
  });
});

describe('sizePair', () => {
  it('keeps the step while the two read differently', () => {
    expect(sizePair(2.5, 2, '1/16')).toEqual(['2 1/2 in', '2 in']);
  });

  it('goes finer, and at last to decimals, where they would read the same', () => {
    expect(sizePair(2.02, 2, '1/16')).toEqual(['2 1/64 in', '2 in']);
    expect(sizePair(0.503, 0.5, '1/16')).toEqual(['0.503 in', '1/2 in']);
    expect(sizePair(0.50004, 0.5, '1/16')).toEqual(['0.50004 in', '1/2 in']);
    expect(sizePair(0.3, 0.301, '1 mm')).toEqual(['7.62 mm', '7.65 mm']);
  });

  it('never writes two different sizes alike', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 50, noNaN: true }),
        fc.double({ min: 1e-4, max: 1, noNaN: true }),
        fc.constantFrom('1/16' as const, '1/32' as const, '1 mm' as const, '0.5 mm' as const),
        (limit, more, step) => {
          const [is, most] = sizePair(limit + more, limit, step);
          return is !== most;
        },
      ),
      { seed: 501 },
    );
  });
});

describe('listText', () => {
  it('joins names with commas and an and', () => {
    expect([[], ['P'], ['P', 'Q'], ['P', 'Q', 'R']].map(listText)).toEqual(['', 'P', 'P and Q', 'P, Q and R']);
  });
});
