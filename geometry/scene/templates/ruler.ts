import { styles, type PageBuilder } from '../paper/page-builder';
import { MARGIN } from '../paper/sheet-frame';

/** px */
export const RULER_HEIGHT = 46;
const INCH = 96;
const MM = 96 / 25.4;
const INCHES = 6;
const MILLIMETRES = 150;

/** Inches above, millimeters below one line: a tape laid on it shows whether the printer kept the size. */
export function addRuler(page: PageBuilder, top: number): void {
  const y = top + 22;
  const style = { ...styles.label, size: 14 };
  page.line(MARGIN, y, MARGIN + INCHES * INCH, y, 1.4, { layer: 'sizes', id: 'ruler' });
  for (let i = 0; i <= INCHES * 8; i++) {
    const x = MARGIN + (i * INCH) / 8;
    const tick = i % 8 === 0 ? 14 : i % 4 === 0 ? 9 : 5;
    page.line(x, y, x, y - tick, i % 8 === 0 ? 1.4 : 0.8, { layer: 'sizes', id: 'ruler' });
    if (i % 8 === 0 && i > 0)
      page.text(x + 3, y - 7, i === INCHES * 8 ? `${INCHES} in` : String(i / 8), style, { id: 'ruler in' });
  }
  for (let i = 0; i <= MILLIMETRES / 5; i++) {
    const x = MARGIN + i * 5 * MM;
    page.line(x, y, x, y + (i % 2 === 0 ? 9 : 5), 0.8, { layer: 'sizes', id: 'ruler' });
    if (i % 10 === 0 && i > 0) page.text(x - 3, y + 21, i === MILLIMETRES / 5 ? `${MILLIMETRES} mm` : String(i * 5), style, { id: 'ruler mm', anchor: 'end' }); // prettier-ignore
  }
  const words = 'Print at 100 %, never “fit to page”. Hold a tape to the ruler: is 6 in or 150 mm off, bin the page.';
  const left = MARGIN + INCHES * INCH + 40;
  page.runs(left, top + 12, [{ text: words }], { ...styles.body, size: 14 }, page.width - MARGIN - left, {
    id: 'ruler words',
  });
}
