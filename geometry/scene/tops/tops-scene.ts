import type { Layout } from '../../core/layout';
import { boundingBox } from '../../core/polygon';
import { along } from '../../core/vector';
import type { Plan } from '../../plan/types';
import { solvedRoom } from '../../top/solved-room';
import { wallFrames } from '../../top/wall-frame';
import type { DrawItem, Scene } from '../display-list';
import { drawBase } from '../room/draw-bases';
import { text } from '../room/scene-styles';
import { outward, wallBodies, WALL_THICKNESS } from '../room/wall-bodies';
import { runEnds, type OpenRunEnd } from './run-ends';
import { drawConnectors, drawJoint, drawJointSize, drawSeam, drawSeamHandle, seamName } from './draw-joints';
import { drawCutout, drawLetter, drawOutline, drawSizes, drawWood, inkOnWood } from './draw-pieces';

/** What is shown besides the tops themselves; all of it when left out but sizes and hardware. */
export interface TopsLayers {
  readonly grain: boolean;
  readonly sizes: boolean;
  readonly hardware: boolean;
  readonly walls: boolean;
}

export interface TopsSceneOptions {
  readonly layers?: Partial<TopsLayers>;
  /** `piece Q`, `joint 1-2`, `seam R-S`, `cutout c1`, `end 1 left`, or all of a run or an island: `top 1`. */
  readonly selected?: string | null;
  /** Letters of pieces to light besides what is selected. */
  readonly lit?: readonly string[];
  /** Seams can be slid: each has its handle and a blade with what stays visible. */
  readonly handles?: boolean;
  /** Each joint has a blade with its length, whether sizes are shown or not. */
  readonly jointSizes?: boolean;
}

const LAYERS: TopsLayers = { grain: true, sizes: false, hardware: false, walls: true };
/** Appliances that stand between tops; all others are under them. */
const SEEN = new Set(['range', 'opening']);

/** The tops in the room: wood with its grain, joints, seams, cutouts, letters. Room axes, inches. */
export function topsScene(plan: Plan, layout: Layout, options: TopsSceneOptions = {}): Scene {
  const layers = { ...LAYERS, ...options.layers };
  const chosen = (name: string) => options.selected === name;
  const lit = new Set(options.lit);
  const lights = (piece: Plan['pieces'][number]) =>
    chosen(`piece ${piece.letter}`) || chosen(`top ${piece.on}`) || lit.has(piece.letter);
  const { pieces, cutouts, joints, seams } = plan;
  const ink = inkOnWood(layout, layers.grain);
  const items: DrawItem[] = [
    ...(layers.walls ? surroundings(plan, layout) : []),
    ...pieces.map((piece) => drawWood(piece, layout, layers.grain)),
    ...cutouts.flatMap((cutout) => drawCutout(cutout, layout, chosen(`cutout ${cutout.id}`), ink)),
    ...pieces.flatMap((piece) => drawOutline(piece, layout, false, ink)),
    ...joints.map((joint) => drawJoint(joint, layout, chosen(`joint ${joint.between.join('-')}`), ink)),
    ...seams.flatMap((seam) => drawSeam(seam, cutouts)),
    ...pieces.filter(lights).flatMap((piece) => drawOutline(piece, layout, true)),
    ...runEnds(plan)
      .filter((end) => chosen(`end ${end.run} ${end.side}`))
      .map(drawRunEnd),
    ...(layers.hardware ? joints.flatMap(drawConnectors) : []),
    ...pieces.flatMap((piece) => drawLetter(piece, layers.grain && !layers.sizes, ink)),
    ...(layers.sizes ? pieces.flatMap((piece) => drawSizes(piece, layout)) : []),
    ...(layers.sizes || options.jointSizes ? joints.flatMap((joint) => drawJointSize(joint, layout)) : []),
    ...seams.flatMap((seam) =>
      // A seam along the grain lies where its rows part: nothing slides it.
      !seam.edge && (options.handles || chosen(`seam ${seamName(seam)}`)) ? drawSeamHandle(seam, layout) : [],
    ),
  ];
  const letters = pieces.map((piece) => piece.letter).join(', ');
  return {
    bounds: boundsOf(plan, layout, layers),
    items,
    title: 'Tops',
    alt: pieces.length > 0 ? `Tops from above: pieces ${letters}.` : 'No tops yet.',
  };
}

/** The end that is chosen, on its run. */
const drawRunEnd = ({ run, side, from, to }: OpenRunEnd): DrawItem => ({
  layer: 'tops',
  id: `${run} ${side}`,
  kind: 'line',
  from,
  to,
  stroke: { ink: 'chalk', width: 6, casing: true },
});

function boundsOf(plan: Plan, layout: Layout, layers: TopsLayers): Scene['bounds'] {
  const points = plan.pieces.flatMap((piece) => [...piece.outline]);
  if (layers.walls && plan.room) {
    const walls = wallFrames(solvedRoom(plan.room, layout.room));
    points.push(...wallBodies(walls).flatMap(({ outline }) => [...outline]));
  }
  return points.length > 0 ? boundingBox(points) : { minX: 0, minY: 0, maxX: 1, maxY: 1 };
}

/** Walls as bodies with their letters, and what stands between the tops. */
function surroundings(plan: Plan, layout: Layout): DrawItem[] {
  if (!plan.room) return [];
  const walls = wallFrames(solvedRoom(plan.room, layout.room));
  const bodies = wallBodies(walls).flatMap(({ wall, outline }): DrawItem[] => [
    { layer: 'walls', id: wall.id, kind: 'polygon', outline, fill: 'wall' },
    {
      layer: 'walls',
      id: wall.id,
      kind: 'text',
      at: along(along(wall.start, wall.along, wall.length / 2), outward(wall), WALL_THICKNESS / 2),
      text: wall.label,
      style: { ...text.caption, size: 19 },
      anchor: 'middle',
      middle: true,
    },
  ]);
  const standing = layout.bases.flatMap((base) => {
    const wall = walls.byId.get(base.wall);
    return wall && SEEN.has(base.kind) ? drawBase(base, wall) : [];
  });
  return [...bodies, ...standing];
}
