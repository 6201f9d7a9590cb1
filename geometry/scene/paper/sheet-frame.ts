import type { TextRun } from '../display-list';
import { fitText, styles, type PageBuilder } from './page-builder';
import { dateWords, type SheetHead } from './sheet-head';

/** px */
export const MARGIN = 45;
const TOP = 32;
const LOGO = 40;
const FOOT_HEIGHT = 52;
const FOOT_BOTTOM = 32;
const CHECK_BAR = 192;
/** A phone reads modules of 0.45 mm on paper. */
const QR = 68;
/** px that modules overlap, so that no hairline shows between them. */
const OVERLAP = 0.2;

/** px from the top of the page to the first thing under the heading. */
export const HEAD_BOTTOM = 99;

/** px from the top of the page to the foot's frame. */
export const footTop = (page: PageBuilder): number => page.height - FOOT_BOTTOM - FOOT_HEIGHT;

/** The sign, what the sheet is, one line about it, and a bar that shows whether the printer kept the size. */
export function addHeading(
  page: PageBuilder,
  title: string,
  under: readonly TextRun[],
  head: SheetHead,
  notToScale = 'Drawing not to scale.',
): void {
  page.add({ kind: 'mark', layer: 'frame', at: page.at(MARGIN + 22, TOP + 26), mark: 'logo', size: LOGO, ink: 'ink' });
  const left = MARGIN + 58;
  const right = page.width - MARGIN - (head.qr ? QR + 22 : 0);
  const room = right - CHECK_BAR - 40 - left - (head.draft ? 110 : 0);
  const fitted = fitText(title, styles.title, room, 20);
  page.text(left, TOP + 25, fitted.text, fitted.style, { id: 'title' });
  if (head.draft) {
    page.text(right - CHECK_BAR - 76, TOP + 11, 'DRAFT', styles.heading, {
      id: 'draft',
      anchor: 'middle',
      middle: true,
      frame: 'ink',
      ground: 'card',
    });
  }
  page.runs(left, TOP + 51, under, styles.body, right - left - 320, { id: 'about' });
  addCheckBar(page, right, notToScale);
  if (head.qr) addQr(page, head.qr, page.width - MARGIN - QR, TOP - 8);
}

/** A QR code, its quiet zone left free around it: dark runs of each row as boxes. */
export function addQr(page: PageBuilder, rows: readonly string[], x: number, y: number, size = QR): void {
  const module = size / rows.length;
  rows.forEach((row, i) => {
    for (const run of row.matchAll(/1+/g)) {
      page.fill(x + run.index * module, y + i * module, run[0].length * module + OVERLAP, module + OVERLAP, {
        id: 'qr',
      });
    }
  });
}

function addCheckBar(page: PageBuilder, right: number, notToScale: string): void {
  const y = TOP + 16;
  page.line(right - CHECK_BAR, y, right, y, 2);
  for (let i = 0; i <= 4; i++) {
    const x = right - CHECK_BAR + (i * CHECK_BAR) / 4;
    const half = i % 4 === 0 ? 8 : 4;
    page.line(x, y - half, x, y + half, i % 4 === 0 ? 2 : 1.5);
  }
  page.text(right, TOP + 46, `This bar prints 2 in. ${notToScale}`.trimEnd(), styles.body, {
    anchor: 'end',
    id: 'bar',
  });
}

/** Job, revision, who drew and signed it, which sheet of how many. */
export function addFoot(page: PageBuilder, head: SheetHead, sheet: number, of: number): void {
  const top = footTop(page);
  const width = page.width - 2 * MARGIN;
  page.box(MARGIN, top, width, FOOT_HEIGHT, 2);
  const cells: readonly (readonly [share: number, name: string, value: string])[] = [
    [0.35, 'Job', `${head.jobNumber} ${head.jobName}`],
    [0.27, head.changedSince ? `Revision (changed since revision ${head.changedSince})` : 'Revision', `${head.revision}, ${dateWords(head.revisionDate)}`], // prettier-ignore
    [0.22, 'Drawn, signed off', [head.drawnBy, head.signedBy ?? 'not signed off'].filter(Boolean).join(', ')],
    [0.16, 'Sheet', `${sheet} of ${of}`],
  ];
  let x = MARGIN;
  for (const [share, name, value] of cells) {
    const room = share * width - 24;
    if (x > MARGIN) page.line(x, top, x, top + FOOT_HEIGHT, 1);
    const label = fitText(name, { ...styles.label, size: 15 }, room);
    page.text(x + 12, top + 21, label.text, label.style, { id: `foot ${name}` });
    const fitted = fitText(value, styles.strong, room);
    page.text(x + 12, top + 41, fitted.text, fitted.style, { id: `foot ${name}` });
    x += share * width;
  }
}

/** DRAFT across the page, in a dashed outline so that every number under it can still be read. */
export function addDraft(page: PageBuilder): void {
  const style = { face: 'label', weight: 'extrabold', size: 300, ink: 'ink' } as const;
  page.text(page.width / 2, page.height / 2, 'DRAFT', style, {
    layer: 'frame',
    anchor: 'middle',
    middle: true,
    turn: Math.PI / 8,
    hollow: true,
  });
}
