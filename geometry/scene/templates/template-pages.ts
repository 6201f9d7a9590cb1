import { flattenPath } from '../../core/arc-path';
import type { Point } from '../../core/point';
import type { DrawItem } from '../display-list';
import { numberPages, type UnnumberedPage } from '../paper/number-pages';
import { fitText, PageBuilder, PX_PER_INCH, styles } from '../paper/page-builder';
import { addQr, footTop, HEAD_BOTTOM, MARGIN } from '../paper/sheet-frame';
import { PAPER_SIZE, type Paper, type SheetHead } from '../paper/sheet-head';
import type { SheetPages } from '../paper/sheet-request';
import { clipPolyline } from './clip-polyline';
import { addRuler, RULER_HEIGHT } from './ruler';
import { templatesOf, type Template, type TemplateLine } from './template-list';
import { addTileMap, MAP_WIDTH } from './tile-map';
import { tileDrawing, type Tile, type Tiling } from './tiles';

/** Inches; far under the 1/64 that a pencil shows. */
const CHORD = 1 / 2048;
/** px */
const UNDER = 10;
const CROSS = 22;
const QR = 68;

/**
 * Full-size templates, each on as many pages as it needs, one inch of the drawing an inch of paper. No page where the
 * job has nothing to trace.
 */
export const templatePages: SheetPages = ({ plan, layout, head, paper, numbering }) => {
  const drafts = templatesOf(plan, layout).flatMap((template) => pagesOf(template, head, paper));
  return numberPages(drafts, head, numbering);
};

function pagesOf(template: Template, head: SheetHead, paper: Paper): UnnumberedPage[] {
  const blank = () => new PageBuilder(PAPER_SIZE[paper]);
  const { width, height } = roomOn(blank());
  const tiling = tileDrawing(template.box, width, height);
  return tiling.pages.map((tiles, index) => {
    const page = blank();
    const many = tiling.pages.length > 1 ? `, part ${index + 1} of ${tiling.pages.length}` : '';
    addTitle(page, `${template.title}${many}`, template.about, head);
    if (tiling.columns * tiling.rows > 1) addTileMap(page, tiling, tiles, mapRight(page, head));
    tiles.forEach((tile, strip) =>
      addTile(page, template, tiling, tile, HEAD_BOTTOM + strip * tiling.height * PX_PER_INCH),
    );
    addRuler(page, footTop(page) - RULER_HEIGHT - UNDER);
    const alt = `${template.title} at full size${many}. ${template.about}`;
    return { page, title: `Template: ${template.title}${many}`, alt };
  });
}

/** Room for the drawing on a page, inches. */
function roomOn(page: PageBuilder): { readonly width: number; readonly height: number } {
  const bottom = footTop(page) - RULER_HEIGHT - 2 * UNDER;
  return { width: (page.width - 2 * MARGIN) / PX_PER_INCH, height: (bottom - HEAD_BOTTOM) / PX_PER_INCH };
}

function addTitle(page: PageBuilder, title: string, about: string, head: SheetHead): void {
  if (head.qr) addQr(page, head.qr, page.width - MARGIN - QR, 24, QR);
  const room = mapRight(page, head) - MAP_WIDTH - 20 - MARGIN;
  const fitted = fitText(title, { ...styles.title, size: 30 }, room - (head.draft ? 90 : 0), 18);
  page.text(MARGIN, 50, fitted.text, fitted.style, { id: 'title' });
  if (head.draft)
    page.text(MARGIN + room - 40, 42, 'DRAFT', styles.heading, { id: 'draft', anchor: 'middle', middle: true, frame: 'ink', ground: 'card' }); // prettier-ignore
  page.runs(MARGIN, 74, [{ text: about }], { ...styles.body, size: 14 }, room, { id: 'about' });
}

/** px from the page's left edge to where the tile map ends. */
const mapRight = (page: PageBuilder, head: SheetHead): number => page.width - MARGIN - (head.qr ? QR + 22 : 0);

/** One tile with its left upper corner at the page's left margin and `top` px. */
function addTile(page: PageBuilder, template: Template, tiling: Tiling, tile: Tile, top: number): void {
  const { box } = tile;
  const origin = page.at(MARGIN, top);
  const onPaper = ([x, y]: Point): Point => [origin[0] + x - box.minX, origin[1] + y - box.maxY];
  for (const line of template.lines) {
    const points = flattenPath(line.path, CHORD);
    const ring = line.path.closed ? [...points, points[0]!] : points;
    for (const part of clipPolyline(ring, box)) page.add(lineItem(line, part.map(onPaper)));
  }
  for (const { at, text } of template.notes) {
    if (at[0] < box.minX || at[0] > box.maxX || at[1] < box.minY || at[1] > box.maxY) continue;
    const [x, y] = onPaper(at);
    const style = { ...styles.label, size: 16 };
    // A word at the paper's edge would be cut in half: it moves inwards, its tick says what it belongs to.
    const half = (text.length * 3.4) / PX_PER_INCH;
    const inside = Math.min(Math.max(x, MARGIN / PX_PER_INCH + half), (page.width - MARGIN) / PX_PER_INCH - half);
    page.add({ kind: 'text', layer: 'readings', id: `note ${text}`, at: [inside, y], text, style, anchor: 'middle', middle: true, ground: 'card' }); // prettier-ignore
  }
  addJoins(page, tiling, tile, onPaper);
}

function lineItem({ kind }: TemplateLine, points: readonly Point[]): DrawItem {
  if (kind === 'reference')
    return { kind: 'polyline', layer: 'notes', points, stroke: { ink: 'ink', width: 1, dash: [6, 4] } };
  return { kind: 'polyline', layer: 'tops', id: kind, points, stroke: { ink: 'ink', width: 1.2 } };
}

/** Register marks in the middle of each overlap: they lie on both neighbours at the same place of the drawing. */
function addJoins(page: PageBuilder, { joinX, joinY }: Tiling, { box }: Tile, onPaper: (p: Point) => Point): void {
  const xs = joinX.filter((x) => x > box.minX && x < box.maxX);
  const ys = joinY.filter((y) => y > box.minY && y < box.maxY);
  const inset = 0.2;
  for (const x of xs) {
    for (const y of [box.maxY - inset, box.minY + inset]) addCross(page, onPaper([x, y]));
    page.add(joinLine(onPaper([x, box.maxY]), onPaper([x, box.minY])));
  }
  for (const y of ys) {
    for (const x of [box.minX + inset, box.maxX - inset]) addCross(page, onPaper([x, y]));
    page.add(joinLine(onPaper([box.minX, y]), onPaper([box.maxX, y])));
  }
}

const joinLine = (from: Point, to: Point): DrawItem => ({
  kind: 'line',
  layer: 'frame',
  from,
  to,
  stroke: { ink: 'ink', width: 0.6, dash: [2, 6] },
});

function addCross(page: PageBuilder, [x, y]: Point): void {
  const reach = CROSS / 2 / PX_PER_INCH;
  const stroke = { ink: 'ink', width: 1 } as const;
  page.add(
    { kind: 'line', layer: 'hardware', id: 'register', from: [x - reach, y], to: [x + reach, y], stroke },
    { kind: 'line', layer: 'hardware', id: 'register', from: [x, y - reach], to: [x, y + reach], stroke },
    { kind: 'arc', layer: 'hardware', id: 'register', centre: [x, y], radius: reach * 0.6, start: 0, end: 2 * Math.PI, stroke }, // prettier-ignore
  );
}
