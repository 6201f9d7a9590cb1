import { writeFileSync } from 'node:fs';
import path from 'node:path';
import PDFDocument from 'pdfkit';

/**
 * Writes geometry/scene/font-widths.ts: how wide every character of the program's fonts is, so that a drawing can be laid
 * out without a font engine. Run after a font in assets/fonts has changed: `node --import tsx scripts/font-widths.ts`.
 */
const ROOT = path.join(__dirname, '..');

const FONTS = {
  labelSemibold: ['BarlowCondensed-SemiBold', []],
  labelBold: ['BarlowCondensed-Bold', []],
  labelExtrabold: ['BarlowCondensed-ExtraBold', []],
  bodyRegular: ['AtkinsonHyperlegibleNext-Regular', ['tnum']],
  bodyBold: ['AtkinsonHyperlegibleNext-Bold', ['tnum']],
} as const;

const ascii = Array.from({ length: 95 }, (_, i) => String.fromCharCode(32 + i));
const latin = Array.from({ length: 96 }, (_, i) => String.fromCharCode(160 + i)).filter((c) => c !== '\u00ad');
const CHARACTERS = [...ascii, ...latin, ...'–—‘’“”…−≤≥'];

const doc = new PDFDocument({ autoFirstPage: false });
const rows = Object.entries(FONTS).map(([name, [file, features]]) => {
  doc.font(path.join(ROOT, 'assets/fonts', `${file}.ttf`)).fontSize(1000);
  const widths = CHARACTERS.map((c) => Math.round(doc.widthOfString(c, { features: [...features] })));
  return `  ${name}: [${widths.join(', ')}],`;
});

const text = `// Written by scripts/font-widths.ts from assets/fonts; body digits are tabular.

/** Characters of the tables below, in their order. */
export const CHARACTERS = ${JSON.stringify(CHARACTERS.join(''))};

/** Advance widths in thousandths of the text size. */
export const FONT_WIDTHS = {
${rows.join('\n')}
} as const;
`;
writeFileSync(path.join(ROOT, 'geometry/scene/font-widths.ts'), text);
