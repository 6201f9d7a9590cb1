import type { Layout } from '../../core/layout';
import type { Point, Polygon } from '../../core/point';
import { along, leftNormal, rightNormal } from '../../core/vector';
import type { Plan } from '../../plan/types';
import { fastenerInRoom, type Fastener } from '../../wood/fasteners';
import { solvedRoom } from '../../top/solved-room';
import { wallFrames, type WallFrame } from '../../top/wall-frame';
import { backGaps } from '../../wood/back-gaps';
import { PageMap, type PageBox } from '../paper/page-map';
import { styles, type PageBuilder } from '../paper/page-builder';
import { drawLetter } from '../tops/draw-pieces';
import { turnPlan, viewTurn } from '../turn-plan';

/** How thick a wall is drawn, inches, and how far from it the middle of its label stands, px. */
const WALL_BODY = 5;
const LABEL_OFF = 16;

/**
 * The tops in their room from above, as the fitter stands in it: walls hatched, letters, screws and slots, gaps at the
 * walls, where to scribe.
 */
export function addFitPlan(
  page: PageBuilder,
  plan: Plan,
  layout: Layout,
  fasteners: readonly Fastener[],
  box: PageBox,
): void {
  const turned = turnPlan(plan, viewTurn(layout.room));
  const walls = turned.room ? wallFrames(solvedRoom(turned.room, layout.room)).byIndex.filter((w) => w !== undefined) : []; // prettier-ignore
  const bodies = walls.map(bodyOf);
  const lying = turned.pieces.filter((piece) => piece.kind !== 'strip' && piece.kind !== 'leg');
  const map = new PageMap(page, [...lying.map((piece) => piece.outline), ...bodies], inset(box));
  bodies.forEach((body) => {
    const outline = map.outline(body);
    page.add({ kind: 'hatch', layer: 'walls', outline, pattern: 'waste', ink: 'ink' });
    page.add({ kind: 'polygon', layer: 'walls', outline, stroke: { ink: 'ink', width: 1 } });
  });
  for (const piece of lying) {
    const stroke = { ink: 'ink', width: 2.4 } as const;
    page.add({ kind: 'polygon', layer: 'tops', id: piece.letter, outline: map.outline(piece.outline), fill: 'paper', stroke }); // prettier-ignore
  }
  for (const cutout of turned.cutouts) {
    const stroke = { ink: 'ink', width: 1.8, dash: [6, 4] } as const;
    page.add({ kind: 'polygon', layer: 'cutouts', id: cutout.id, outline: map.outline(cutout.outline), fill: 'paper', stroke }); // prettier-ignore
  }
  const byLetter = new Map(lying.map((piece) => [piece.letter, piece]));
  for (const fastener of fasteners) {
    const piece = byLetter.get(fastener.letter);
    if (piece) addScrew(page, map, fastenerInRoom(piece, fastener), leftNormal(piece.grain), fastener);
  }
  for (const piece of lying)
    for (const item of drawLetter(piece, false))
      if (item.kind === 'mark' && item.mark === 'disc') page.add({ ...item, at: map.at(item.at), size: 38 });
  addGaps(page, map, turned, layout, walls);
}

const inset = ({ left, top, width, height }: PageBox): PageBox => ({
  left: left + 40,
  top: top + 34,
  width: width - 80,
  height: height - 62,
});

function bodyOf(wall: WallFrame): Polygon {
  const out: Point = [-wall.inward[0], -wall.inward[1]];
  return [wall.start, wall.end, along(wall.end, out, WALL_BODY), along(wall.start, out, WALL_BODY)];
}

/** A fixed screw is a dot, a slotted one a dot in a slot that runs across the grain. */
function addScrew(page: PageBuilder, map: PageMap, at: Point, across: Point, { row }: Fastener): void {
  if (row === 'back') {
    const [half, side] = [7 / map.scale, 4.5 / map.scale];
    const grain = rightNormal(across);
    const corner = (a: number, b: number) => map.at(along(along(at, across, a), grain, b));
    const outline = [corner(-half, -side), corner(-half, side), corner(half, side), corner(half, -side)];
    page.add({ kind: 'polygon', layer: 'hardware', outline, fill: 'paper', stroke: { ink: 'ink', width: 1.4 } });
  }
  page.add({ kind: 'mark', layer: 'hardware', at: map.at(at), mark: 'dot', size: 6, ink: 'ink' });
}

function addGaps(page: PageBuilder, map: PageMap, plan: Plan, layout: Layout, walls: readonly WallFrame[]): void {
  const small = { ...styles.body, size: 15 };
  for (const laid of plan.tops.runs) {
    const run = layout.runs.find((one) => one.id === laid.id);
    const wall = walls.find((one) => one.id === laid.wall);
    if (!run || !wall || run.side === 'back') continue;
    const { most, mostAt } = backGaps(laid, run.backGap, wall);
    const scribe = plan.wallFit.scribes.find((one) => one.run === run.id);
    const middle = (Math.max(0, laid.backFrom) + Math.min(wall.length, laid.backTo)) / 2;
    const place = along(wall.start, wall.along, wall.profile.length > 0 ? mostAt : middle);
    // Beyond the wall's body, along the wall, upright enough to read.
    const [x, y] = map.px(along(place, [-wall.inward[0], -wall.inward[1]], WALL_BODY + LABEL_OFF / map.scale));
    const way = Math.atan2(wall.along[1], wall.along[0]);
    const turn = Math.cos(way) < -1e-6 ? way + Math.PI : way;
    const words = scribe && scribe.takeOff > 0 ? ', scribe' : ' gap';
    page.runs(
      x,
      y,
      [
        { inches: most, step: layout.step, unit: true, style: small },
        { text: words, style: small },
      ],
      small,
      200,
      { anchor: 'middle', middle: true, turn, layer: 'sizes', id: `gap ${run.id}` },
    );
  }
}
