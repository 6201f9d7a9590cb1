import PDFDocument from 'pdfkit';

import type { DrawItem, Scene } from '@/geometry/scene/display-list';
import type { View } from '@/geometry/scene/primitives/primitive';
import { toPrimitives } from '@/geometry/scene/primitives/to-primitives';

import { FONT_NAMES, fontFile } from './fonts';
import { PdfPen } from './pdf-pen';

const POINTS_PER_INCH = 72;
/** px of the display list on paper: 1/96 in. */
const POINTS_PER_PX = POINTS_PER_INCH / 96;
/** px; a shop reads paper at arm's length. */
const SMALLEST_FIGURE = 14;

export interface PdfInfo {
  readonly title: string;
  readonly subject?: string;
  readonly author?: string;
  /** When the revision was made. Nothing else in the file tells a time, so that a revision gives the same bytes any day. */
  readonly created: Date;
}

type Doc = typeof PDFDocument.prototype;

/**
 * Paints pages into a PDF: fonts embedded as subsets, titled, language and structure marked, black on white. Stacked
 * fractions carry their plain text, so that `pdftotext` and screen readers give "59 11/16". The same pages and info give
 * the same bytes in every process and time zone.
 *
 * @param pages - drawings with a `paper` size
 * @returns the document, readable from its first byte
 * @throws RangeError if a drawing is not a page
 */
export function paintPdf(pages: readonly Scene[], info: PdfInfo): NodeJS.ReadableStream {
  const doc = new PDFDocument({
    autoFirstPage: false,
    pdfVersion: '1.7',
    lang: 'en-US',
    tagged: true,
    displayTitle: true,
    margin: 0,
    info: documentInfo(info),
  });
  for (const name of FONT_NAMES) doc.registerFont(name, fontFile(name));
  const root = doc.struct('Document');
  doc.addStructure(root);
  const pen = new PdfPen(doc);
  for (const page of pages) {
    const { width, height } = paperOf(page);
    doc.addPage({ size: [width * POINTS_PER_INCH, height * POINTS_PER_INCH], margin: 0 });
    pen.startPage();
    new TaggedPage(doc, pen, page, height).paint(root);
  }
  root.end();
  doc.end();
  return doc;
}

function documentInfo({ title, subject, author, created }: PdfInfo): PDFKit.DocumentInfo {
  return {
    Title: title,
    ...(author ? { Author: author } : {}),
    ...(subject ? { Subject: subject } : {}),
    Creator: 'Offsquare',
    Producer: 'PDFKit',
    CreationDate: created,
    ModDate: created,
  };
}

function paperOf(page: Scene): { readonly width: number; readonly height: number } {
  if (!page.paper) throw new RangeError(`"${page.title ?? 'A drawing'}" has no paper size`);
  return page.paper;
}

/** One page: paragraphs and the figure go into the document's structure, frames are left out of it. */
class TaggedPage {
  private readonly view: View;

  constructor(
    private readonly doc: Doc,
    private readonly pen: PdfPen,
    private readonly page: Scene,
    height: number,
  ) {
    this.view = {
      pxPerInch: POINTS_PER_INCH,
      pixel: POINTS_PER_PX,
      origin: [0, height],
      smallest: SMALLEST_FIGURE,
      wood: 'lines',
    };
  }

  paint(root: PDFKit.PDFStructureElement): void {
    const { doc } = this;
    const section = doc.struct('Sect', { title: this.page.title ?? '' });
    root.add(section);
    let figure: PDFKit.PDFStructureElement | null = null;
    for (const group of readingGroups(this.page.items)) {
      if (group.role === 'frame') {
        doc.markContent('Artifact');
        this.items(group.items);
        doc.endMarkedContent();
        continue;
      }
      const alt = { alt: this.page.alt ?? this.page.title ?? '' };
      const element: PDFKit.PDFStructureElement =
        group.role === 'figure' ? (figure ?? doc.struct('Figure', alt)) : doc.struct(group.role);
      if (element !== figure) section.add(element);
      const content = doc.markStructureContent(group.role === 'figure' ? 'Figure' : group.role);
      this.items(group.items);
      doc.endMarkedContent();
      element.add(content);
      if (group.role === 'figure') figure = element;
      else element.end();
    }
    figure?.end();
    section.end();
  }

  private items(items: readonly DrawItem[]): void {
    for (const item of items) this.pen.paint(toPrimitives(item, this.view));
  }
}

interface ReadingGroup {
  readonly role: 'frame' | 'figure' | 'H1' | 'P';
  readonly items: DrawItem[];
}

/** Neighbours that are read together, in the order of painting. */
function readingGroups(items: readonly DrawItem[]): ReadingGroup[] {
  const groups: ReadingGroup[] = [];
  let lastKey = '';
  for (const item of items) {
    const role = roleOf(item);
    const key = role === 'P' || role === 'H1' ? `text ${item.id ?? ''}` : role;
    if (key === lastKey) {
      groups.at(-1)!.items.push(item);
      continue;
    }
    groups.push({ role, items: [item] });
    lastKey = key;
  }
  return groups;
}

function roleOf(item: DrawItem): ReadingGroup['role'] {
  if (item.layer === 'frame') return 'frame';
  if (item.layer !== 'text') return 'figure';
  return item.id === 'title' ? 'H1' : 'P';
}
