import path from 'node:path';
import PDFDocument from 'pdfkit';

import { CHARACTERS, FONT_WIDTHS } from '@/geometry/scene/font-widths';
import { fontOf, textWidth } from '@/geometry/scene/text-width';

/** The fonts themselves, read by the font engine under pdfkit: nothing of this comes from the tables. */
const FILES = {
  labelSemibold: 'BarlowCondensed-SemiBold',
  labelBold: 'BarlowCondensed-Bold',
  labelExtrabold: 'BarlowCondensed-ExtraBold',
  bodyRegular: 'AtkinsonHyperlegibleNext-Regular',
  bodyBold: 'AtkinsonHyperlegibleNext-Bold',
} as const;

const doc = new PDFDocument({ autoFirstPage: false });

function engineWidth(name: keyof typeof FILES, text: string, size: number): number {
  doc.font(path.join(__dirname, '../../../assets/fonts', `${FILES[name]}.ttf`)).fontSize(size);
  return doc.widthOfString(text, name.startsWith('body') ? { features: ['tnum'] } : {});
}

describe('textWidth', () => {
  it('knows every character of the five fonts to the unit', () => {
    for (const name of Object.keys(FILES) as (keyof typeof FILES)[]) {
      const off = [...CHARACTERS].filter((c, i) => Math.abs(FONT_WIDTHS[name][i]! - engineWidth(name, c, 1000)) > 0.5);
      expect(off).toEqual([]);
    }
  });

  it('is never narrower than the font engine, and wider by kerning alone, under 4 %', () => {
    const style = { face: 'body', weight: 'regular', size: 16 } as const;
    for (const text of ['Miter, top 59 to bottom 34. Kerf falls on the T side.', 'Letter S on top. Turn T over.']) {
      const ratio = textWidth(text, style) / engineWidth('bodyRegular', text, 16);
      expect(ratio).toBeGreaterThanOrEqual(1);
      expect(ratio).toBeLessThan(1.04);
    }
  });

  it('gives all figures of the reading face the same width', () => {
    const widths = [...'0123456789'].map((c) => textWidth(c, { face: 'body', weight: 'bold', size: 10 }));
    expect(new Set(widths).size).toBe(1);
  });

  it('takes the nearest weight that the face has', () => {
    expect(fontOf({ face: 'body', weight: 'extrabold' })).toBe('bodyBold');
    expect(fontOf({ face: 'label', weight: 'regular' })).toBe('labelSemibold');
  });
});
