import type { DisplayStep } from '../../tape/format-length';
import type { PageBuilder } from '../paper/page-builder';
import { styles } from '../paper/page-builder';
import type { JointPlace } from './joint-places';

/** px */
export const FACE_HEIGHT = 118;
const BAR = 34;
const BAR_TOP = 44;
const TICK = 11;

/**
 * The face of a joint from its back point to its front point, along one line to one scale: connectors as slots with their
 * distance from the back point above, drawbolts as dots below, the stretch a cutout takes away dashed.
 */
export function addJointFace(
  page: PageBuilder,
  place: JointPlace,
  step: DisplayStep,
  box: { readonly left: number; readonly top: number; readonly width: number },
): void {
  const scale = box.width / place.length;
  const x = (at: number) => box.left + at * scale;
  const top = box.top + BAR_TOP;
  page.box(box.left, top, box.width, BAR, 2.4, undefined, { layer: 'joints' });
  addGone(page, place, x, top);
  const small = { ...styles.body, size: 14 };
  const number = { ...styles.number, size: 16 };
  let last = -Infinity;
  place.connectors.forEach(({ at }) => {
    page.box(x(at) - TICK / 2, top + 6, TICK, BAR - 12, 1.5, 'ink', { layer: 'hardware' });
    // Two rows of numbers, so that none lies on its neighbour.
    const low = x(at) - last < 74;
    page.line(x(at), top - (low ? 4 : 24), x(at), top, 1, { layer: 'sizes' });
    page.runs(x(at), top - (low ? 8 : 28), [{ inches: at, step, style: number }], number, 90, {
      anchor: 'middle',
      layer: 'sizes',
      id: `connector ${place.name} ${at.toFixed(3)}`,
    });
    last = low ? -Infinity : x(at);
  });
  place.bolts.forEach((at) => {
    page.add({ kind: 'mark', layer: 'hardware', at: page.at(x(at), top + BAR / 2), mark: 'dot', size: 10, ink: 'ink' });
    page.line(x(at), top + BAR, x(at), top + BAR + 6, 1, { layer: 'sizes' });
    page.runs(x(at), top + BAR + 22, [{ inches: at, step, style: small }], small, 90, {
      anchor: 'middle',
      layer: 'sizes',
      id: `bolt ${place.name} ${at.toFixed(3)}`,
    });
  });
  page.text(box.left, top + BAR + 38, 'back point', small, { layer: 'sizes' });
  page.text(box.left + box.width, top + BAR + 38, 'front point', small, { layer: 'sizes', anchor: 'end' });
}

function addGone(page: PageBuilder, place: JointPlace, x: (at: number) => number, top: number): void {
  if (!place.gone) return;
  const [from, to] = place.gone;
  const outline = [page.at(x(from), top + BAR), page.at(x(to), top + BAR), page.at(x(to), top), page.at(x(from), top)];
  page.add({ kind: 'hatch', layer: 'cutouts', outline, pattern: 'waste', ink: 'ink' });
  for (const at of place.gone) page.line(x(at), top, x(at), top + BAR, 1.5, { layer: 'cutouts', dash: [4, 4] });
}
