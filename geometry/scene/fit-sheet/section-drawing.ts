import type { DisplayStep } from '../../tape/format-length';
import { styles, type PageBuilder } from '../paper/page-builder';
import type { PageBox } from '../paper/page-map';

/** What the section at the wall shows, inches. */
export interface SectionSizes {
  readonly gap: number;
  readonly thickness: number;
  readonly rail: number;
  readonly bite: number;
  readonly left: number;
  readonly slot: number;
}

/** Wall, gap, top, rail with its slot, screw: not to scale, with the sizes that are. */
export function addSection(page: PageBuilder, sizes: SectionSizes, step: DisplayStep, box: PageBox): void {
  const { left, top, width, height } = box;
  page.box(left, top, width, height, 1.2);
  page.text(left + 12, top + 24, 'Section at the wall', styles.label, { id: 'section' });
  const wall = { x: left + 16, y: top + 40, w: 34, h: height - 56 };
  const outline = [
    page.at(wall.x, wall.y + wall.h),
    page.at(wall.x + wall.w, wall.y + wall.h),
    page.at(wall.x + wall.w, wall.y),
    page.at(wall.x, wall.y),
  ];
  page.add({ kind: 'hatch', layer: 'walls', outline, pattern: 'waste', ink: 'ink' });
  page.add({ kind: 'polygon', layer: 'walls', outline, stroke: { ink: 'ink', width: 1.2 } });
  const board = { x: wall.x + wall.w + 16, y: top + 58, w: width - 150, h: 42 };
  page.box(board.x, board.y, board.w, board.h, 2.4, undefined, { layer: 'tops' });
  for (const share of [1 / 3, 2 / 3])
    page.line(board.x + 6, board.y + board.h * share, board.x + board.w - 6, board.y + board.h * share, 1, { layer: 'tops', dash: [9, 5] }); // prettier-ignore
  const rail = { y: board.y + board.h, h: 20, from: board.x + 26 };
  const screw = board.x + board.w * 0.55;
  page.box(rail.from, rail.y, screw - 12 - rail.from, rail.h, 1.6, undefined, { layer: 'bases' });
  page.box(screw + 12, rail.y, board.x + board.w - screw - 30, rail.h, 1.6, undefined, { layer: 'bases' });
  const point = board.y + board.h - (board.h * sizes.bite) / sizes.thickness;
  page.line(screw, point, screw, rail.y + rail.h + 12, 4, { layer: 'hardware' });
  page.line(screw - 11, rail.y + rail.h + 12, screw + 11, rail.y + rail.h + 12, 4, { layer: 'hardware' });
  const small = { ...styles.body, size: 14 };
  const say = (x: number, y: number, inches: number, words: string, id: string, wrap = 200) =>
    page.runs(x, y, [{ inches, step, unit: true, style: { ...small, weight: 'bold' } }, { text: ` ${words}` }], small, wrap, { id, layer: 'sizes' }); // prettier-ignore
  say(wall.x + wall.w + 4, board.y - 10, sizes.gap, 'gap', 'section gap');
  say(board.x + board.w + 8, board.y + 26, sizes.thickness, '', 'section thickness', 70);
  say(board.x + 8, rail.y + rail.h + 32, sizes.slot, 'slot across the grain', 'section slot');
  say(screw + 26, rail.y + rail.h + 16, sizes.left, 'wood left', 'section left');
}
