import fc from 'fast-check';

import type { TextRun, TextStyle } from '@/geometry/scene/display-list';
import { layoutLength } from '@/geometry/scene/length-layout';
import { layoutRuns, type TextLine } from '@/geometry/scene/run-layout';
import { textWidth } from '@/geometry/scene/text-width';
import { formatLength } from '@/geometry/tape/format-length';

const BODY: TextStyle = { face: 'body', weight: 'regular', size: 16, ink: 'ink' };

describe('layoutLength', () => {
  it('stacks 59 11/16: whole, 11 over 16, a bar between them', () => {
    const laid = layoutLength(59.6875, '1/16', { ...BODY, size: 30 }, false, 11);
    expect(laid.pieces.map((p) => p.text)).toEqual(['59', '11', '16']);
    expect(laid.text).toBe('59 11/16');
    const [whole, top, bottom] = laid.pieces;
    expect(top!.style.size).toBeCloseTo(0.66 * 30, 6);
    expect(whole!.y).toBe(0);
    expect(top!.y).toBeLessThan(laid.bar!.y);
    expect(bottom!.y - 0.668 * bottom!.style.size).toBeGreaterThan(laid.bar!.y);
  });

  it('never makes a figure of the fraction smaller than asked', () => {
    const laid = layoutLength(0.5, '1/16', { ...BODY, size: 12 }, true, 11);
    expect(Math.min(...laid.pieces.map((p) => p.style.size))).toBe(11);
  });

  it('writes a bare fraction without a zero, and a whole length without a bar', () => {
    expect(layoutLength(0.5, '1/16', BODY, false, 11).pieces.map((p) => p.text)).toEqual(['1', '2']);
    expect(layoutLength(30, '1/16', BODY, false, 11).bar).toBeNull();
    expect(layoutLength(0, '1/16', BODY, false, 11).text).toBe('0');
  });

  it('keeps half millimeters in one line', () => {
    const laid = layoutLength(100, '0.5 mm', BODY, true, 11);
    expect(laid.pieces.map((p) => p.text)).toEqual(['2540', 'mm']);
    expect(layoutLength(0.5 / 25.4, '0.5 mm', BODY, false, 11).text).toBe('0.5');
  });

  it('reads as the tape formatter writes it, for any length and step', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 400, noNaN: true }),
        fc.constantFrom('1/16', '1/32', '1/64', '1 mm'),
        (inches, step) =>
          layoutLength(inches, step, BODY, false, 11).text === formatLength(inches, step).replace(' mm', ''),
      ),
      { seed: 20311, numRuns: 300 },
    );
  });
});

/** The line as an eye reads it: a gap between two parts is a space. */
function readLine({ parts }: TextLine): string {
  let end = 0;
  return parts
    .map((part) => {
      const gap = part.x - end > 1 ? ' ' : '';
      const text = part.kind === 'text' ? part.text : part.length.text;
      end = part.x + (part.kind === 'text' ? textWidth(part.text, part.style) : part.length.width);
      return gap + text;
    })
    .join('');
}

describe('layoutRuns', () => {
  const sentence: TextRun[] = [
    { text: 'Miter, top ' },
    { inches: 59.6875, step: '1/16' },
    { text: ' to bottom ' },
    { inches: 34.125, step: '1/16' },
    { text: '. Kerf falls on the T side. One pass makes both ends.' },
  ];

  it('breaks only at spaces and keeps every line within the wrap', () => {
    const block = layoutRuns(sentence, BODY, 200, 14);
    expect(block.lines.length).toBeGreaterThan(2);
    for (const line of block.lines) expect(line.width).toBeLessThanOrEqual(200);
  });

  it('keeps the full stop with the fraction before it', () => {
    fc.assert(
      fc.property(fc.integer({ min: 120, max: 600 }), (wrap) => {
        const { lines } = layoutRuns(sentence, BODY, wrap, 14);
        return lines.every((line) => line.parts[0]?.kind !== 'text' || !line.parts[0].text.startsWith('.'));
      }),
      { seed: 7, numRuns: 100 },
    );
  });

  it('leaves out nothing that was written', () => {
    const { lines } = layoutRuns(sentence, BODY, 180, 14);
    expect(lines.map(readLine).join(' ')).toBe(
      'Miter, top 59 11/16 to bottom 34 1/8. Kerf falls on the T side. One pass makes both ends.',
    );
  });

  it('moves lines apart where fractions would touch', () => {
    const plain = layoutRuns([{ text: 'one two' }], BODY, 40, 14);
    const lengths = layoutRuns([{ inches: 1.5, step: '1/16' }, { text: ' ' }, { inches: 2.5, step: '1/16' }], BODY, 30, 14); // prettier-ignore
    expect(plain.lines).toHaveLength(2);
    expect(lengths.lines).toHaveLength(2);
    expect(lengths.drop).toBeGreaterThan(plain.drop);
  });
});
