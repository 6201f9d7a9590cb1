import type PDFDocument from 'pdfkit';

import type { Ink } from '@/geometry/scene/display-list';
import type {
  ClipPrimitive,
  Line,
  Paint,
  Path,
  PathPrimitive,
  Primitive,
  SpanPrimitive,
  TextPrimitive,
} from '@/geometry/scene/primitives/primitive';

import { PdfWriter } from './pdf-writer';

type Doc = typeof PDFDocument.prototype;

/** Inks that stay white on paper; all others are black, so that a bad copier loses nothing. */
const WHITE: ReadonlySet<Ink> = new Set(['paper', 'card', 'onchalk', 'chalkT', 'redT', 'tape', 'wall']);

/** Points; outline of hollow letters, dashed so that what they lie over can still be read. */
const HOLLOW = { width: 0.9, dash: [1.5, 3] };

/** Paints primitives, in points, on the current page of a document, black on white. */
export class PdfPen {
  /** What the page's graphics state was last told, so that nothing is said twice. */
  private state: { fill?: string; stroke?: string; width?: number; dash?: string; round?: boolean } = {};

  private readonly writer: PdfWriter;

  constructor(private readonly doc: Doc) {
    this.writer = new PdfWriter(doc);
  }

  paint(primitives: readonly Primitive[]): void {
    for (const primitive of primitives) this.one(primitive);
  }

  private one(primitive: Primitive): void {
    switch (primitive.kind) {
      case 'path':
        return this.path(primitive);
      case 'text':
        return this.text(primitive);
      case 'clip':
        return this.clip(primitive);
      case 'span':
        return this.span(primitive);
    }
  }

  private path({ path, fill, line, evenOdd }: PathPrimitive): void {
    if (path.length === 0) return;
    const rule = evenOdd ? 'even-odd' : 'non-zero';
    if (fill) this.fillWith(fill);
    if (line) this.strokeWith(line);
    this.trace(path);
    if (fill && line) this.doc.fillAndStroke(undefined, undefined, rule);
    else if (fill) this.doc.fill(rule);
    else this.doc.stroke();
  }

  private text(text: TextPrimitive): void {
    this.fillWith(text.paint);
    if (text.hollow) this.strokeWith({ paint: text.paint, ...HOLLOW });
    const back = { start: 0, middle: text.width / 2, end: text.width }[text.anchor];
    const x = text.x - back * Math.cos(text.turn);
    const y = text.y + back * Math.sin(text.turn);
    this.writer.write(text.text, { ...text, x, y }, text.hollow ?? false);
  }

  private clip({ path, evenOdd, children }: ClipPrimitive): void {
    this.doc.save();
    this.trace(path);
    this.doc.clip(evenOdd ? 'even-odd' : 'non-zero');
    this.paint(children);
    this.restore();
  }

  /**
   * A stacked fraction is read as "59 11/16", not as three numbers in a heap. Readers take the line that it stands on
   * from its first and its last glyph, so a space goes before and behind, on the baseline.
   */
  private span(span: SpanPrimitive): void {
    const { doc, writer } = this;
    doc.markContent('Span', { actual: span.text });
    writer.write(' ', span, false);
    this.paint(span.children);
    const end = span.width - writer.width(' ', span);
    writer.write(' ', { ...span, x: span.x + end * Math.cos(span.turn), y: span.y - end * Math.sin(span.turn) }, false);
    doc.endMarkedContent();
  }

  private trace(path: Path): void {
    const { doc } = this;
    for (const segment of path) {
      if (segment[0] === 'M') doc.moveTo(segment[1], segment[2]);
      else if (segment[0] === 'L') doc.lineTo(segment[1], segment[2]);
      else if (segment[0] === 'Z') doc.closePath();
      else doc.bezierCurveTo(segment[1], segment[2], segment[3], segment[4], segment[5], segment[6]);
    }
  }

  private fillWith(paint: Paint): void {
    const colour = toColour(paint);
    if (this.state.fill === colour) return;
    this.doc.fillColor(colour);
    this.state.fill = colour;
  }

  private strokeWith({ paint, width, dash, round = false }: Line): void {
    const { doc, state } = this;
    const colour = toColour(paint);
    if (state.stroke !== colour) doc.strokeColor(colour);
    if (state.width !== width) doc.lineWidth(width);
    if (state.round !== round) doc.lineCap(round ? 'round' : 'butt').lineJoin(round ? 'round' : 'miter');
    const pattern = dash?.join(' ') ?? '';
    if ((state.dash ?? '') !== pattern) {
      if (dash) doc.dash([...dash] as never);
      else doc.undash();
    }
    Object.assign(state, { stroke: colour, width, round, dash: pattern });
  }

  private restore(): void {
    this.doc.restore();
    this.state = {};
  }

  /** A new page starts with nothing set. */
  startPage(): void {
    this.state = {};
  }
}

function toColour(paint: Paint): string {
  if (typeof paint !== 'string') return paint.hex;
  return WHITE.has(paint) ? '#FFFFFF' : '#000000';
}
