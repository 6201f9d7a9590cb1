import type PDFDocument from 'pdfkit';

import { fontOf, textWidth } from '@/geometry/scene/text-width';
import type { TextPrimitive } from '@/geometry/scene/primitives/primitive';

type Doc = typeof PDFDocument.prototype;

export type TextSpot = Pick<TextPrimitive, 'x' | 'y' | 'turn' | 'face' | 'weight' | 'size'>;

/** The parts of pdfkit (pinned in package.json) that write glyphs; its types leave them out. */
interface PdfFont {
  readonly id: string;
  encode(text: string, features?: readonly string[]): [glyphs: string[], positions: GlyphPosition[]];
  ref(): unknown;
}

interface GlyphPosition {
  readonly xAdvance: number;
  readonly advanceWidth: number;
}

interface PdfInside {
  readonly _font: PdfFont;
  readonly page: { readonly fonts: Record<string, unknown> };
  addContent(operators: string): unknown;
}

/**
 * Writes single lines of text. pdfkit's own `text` turns the page over and back around every line, and a reader then
 * loses where a marked fraction stands; here text is written in the page's own axes, in fewer operators.
 */
export class PdfWriter {
  private readonly inside: PdfInside;
  private readonly encoded = new Map<string, string>();

  constructor(private readonly doc: Doc) {
    this.inside = doc as unknown as PdfInside;
  }

  /** @param spot - left end of the baseline, points, y down, and the font */
  write(text: string, spot: TextSpot, hollow: boolean): void {
    const { doc, inside } = this;
    const name = fontOf(spot);
    doc.font(name);
    const font = inside._font;
    inside.page.fonts[font.id] ??= font.ref();
    const glyphs = this.glyphs(name, text, font, spot.face === 'body');
    const [c, s] = [Math.cos(spot.turn), Math.sin(spot.turn)];
    const matrix = [c, -s, -s, -c, spot.x, spot.y].map(number).join(' ');
    inside.addContent(`BT /${font.id} ${number(spot.size)} Tf ${hollow ? '1' : '0'} Tr ${matrix} Tm [${glyphs}] TJ ET`);
  }

  /** Points. */
  width(text: string, spot: TextSpot): number {
    return textWidth(text, spot);
  }

  /** Glyphs in hex with the kerning between them; figures of the reading face in their tabular form. */
  private glyphs(name: string, text: string, font: PdfFont, tabular: boolean): string {
    const key = `${name} ${text}`;
    const known = this.encoded.get(key);
    if (known !== undefined) return known;
    const [glyphs, positions] = font.encode(text, tabular ? ['tnum'] : undefined);
    let operands = '';
    let open = '';
    glyphs.forEach((glyph, i) => {
      open += glyph;
      const kern = positions[i]!.advanceWidth - positions[i]!.xAdvance;
      if (kern === 0) return;
      operands += `<${open}> ${number(kern)} `;
      open = '';
    });
    if (open) operands += `<${open}>`;
    this.encoded.set(key, operands);
    return operands;
  }
}

/** A number as PDF wants it: no exponent, no more digits than a printer can show. */
function number(value: number): string {
  return String(Math.round(value * 1e4) / 1e4);
}
