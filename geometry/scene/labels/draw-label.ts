import { fitText, styles, type PageBuilder } from '../paper/page-builder';
import { addQr } from '../paper/sheet-frame';
import type { SheetHead } from '../paper/sheet-head';
import type { LabelFacts } from './label-facts';

/** Where a label stands on its page, px, and what its job says of itself. */
export interface LabelPlace {
  readonly left: number;
  readonly top: number;
  readonly width: number;
  readonly height: number;
  readonly head: SheetHead;
  readonly id: string;
}

/** px: kept free of ink at a label's edge, since no printer feeds labels truly; largest QR code; length of corner ticks. */
const PAD = 11;
const QR = 84;
const TICK = 5;
/** px; a smaller code could not be read from an arm away. */
const LEAST_QR = 56;

/** Letter and grain arrow on the left, what it is in the middle, the way back to the job on the right. */
export function drawLabel(page: PageBuilder, facts: LabelFacts, place: LabelPlace): void {
  const { left, top, width, height, head, id } = place;
  cornerTicks(page, place);
  const qr = head.qr ? Math.max(LEAST_QR, Math.min(QR, height - 2 * PAD, width * 0.25)) : 0;
  if (head.qr) addQr(page, head.qr, left + width - PAD - qr, top + (height - qr) / 2, qr);
  const signWidth = Math.min(width * 0.21, height * 0.72);
  sign(page, facts, place, signWidth);
  const from = left + PAD + signWidth + 8;
  const room = left + width - PAD - qr - (qr ? 10 : 0) - from;
  const roomy = height > 130;
  const body = { ...styles.body, size: roomy ? 16 : 14 };
  const strong = { ...styles.strong, size: roomy ? 18 : 15 };
  const revision = `Revision ${head.revision}${head.draft ? ', DRAFT' : ''}`;
  const lines = [
    { text: facts.size, style: strong },
    { text: `${head.jobNumber} ${head.jobName}`, style: { ...strong, size: roomy ? 16 : 14 } },
    ...facts.lines.map((text) => ({ text, style: body })),
    { text: revision, style: body },
  ];
  const step = roomy ? 24 : 17;
  const fits = Math.max(2, Math.floor((height - 2 * PAD + 4) / step));
  // What has no room goes from the end, but the revision stays: an old label must be known for one.
  const shown = lines.length <= fits ? lines : [...lines.slice(0, fits - 1), lines.at(-1)!];
  const first = top + (height - (shown.length - 1) * step) / 2 + 5;
  shown.forEach(({ text, style }, i) => {
    const fitted = fitText(text, style, room, 11);
    page.text(from, first + i * step, fitted.text, fitted.style, { id });
  });
}

/** The letter as large as there is room, the direction of the grain under it. */
function sign(page: PageBuilder, facts: LabelFacts, { left, top, height, id }: LabelPlace, width: number): void {
  const middle = left + PAD + width / 2;
  const size = Math.min(height * 0.5, 84);
  const fitted = fitText(facts.letter, { face: 'label', weight: 'extrabold', size, ink: 'ink' }, width, 16);
  page.text(middle, top + height * 0.44, fitted.text, fitted.style, { id, anchor: 'middle', middle: true });
  const arrow = page.at(middle, top + height * 0.8);
  page.add({ kind: 'mark', layer: 'letters', at: arrow, mark: 'grainArrow', size: width * 0.9, ink: 'ink', turn: 0 });
}

/** Corners of a label, so that it can be cut out of plain paper. */
function cornerTicks(page: PageBuilder, { left, top, width, height }: LabelPlace): void {
  for (const [x, dx] of [[left, 1], [left + width, -1]] as const) {
    for (const [y, dy] of [[top, 1], [top + height, -1]] as const) {
      page.line(x, y, x + dx * TICK, y, 0.5);
      page.line(x, y, x, y + dy * TICK, 0.5);
    }
  } // prettier-ignore
}
