import type { Layout } from '../../core/layout';
import type { Point, Polygon } from '../../core/point';
import { boundingBox } from '../../core/polygon';
import type { Plan } from '../../plan/types';
import type { DrawItem, Scene } from '../display-list';
import { doorMarks, drawCarcass, drawRange, rangesOf } from './cabinets';
import type { Camera } from './camera';
import { drawFittings } from './cutout-fittings';
import { roomShell } from './room-shell';
import { inOrderOfPainting } from './solid-order';
import { viewPoint } from './view-point';
import { drawLeg, drawTop, standingLeg } from './wood-solids';

/** Floor to the show face: a 34 1/2 in cabinet and the top on it. Common practice. */
const CABINET = 34.5;
/** Share of the tops' own size that is shown round them. */
const AROUND = 0.14;

/** Something that stands on the floor. */
interface Standing {
  readonly footprint: Polygon;
  /** The run or island it is part of. */
  readonly on?: string;
  readonly draw: () => DrawItem[];
}

/**
 * The finished tops as somebody standing in the room would see them: every piece in its true place with its staves, on
 * plain cabinets. Drawn from the plan alone; cabinets, walls and windows have heights that nobody measured.
 *
 * @param plan - turned as it is to be seen (`turnPlan`), or in room axes
 */
export function perspectiveScene(plan: Plan, layout: Layout): Scene {
  const pieces = plan.pieces.filter((piece) => piece.kind !== 'strip');
  if (pieces.length === 0)
    return { bounds: { minX: 0, minY: 0, maxX: 1, maxY: 1 }, items: [], title: 'Picture', alt: 'No tops yet.' };
  const camera = viewPoint(plan);
  const height = CABINET + layout.material.thickness;
  const eye: Point = [camera.eye[0], camera.eye[1]];
  const standing = inOrderOfPainting(standingThings(camera, plan, layout, height), (thing) => thing.footprint, eye);
  // A cutout may lie over several pieces: what fills it comes after the last of them.
  const things = standing.flatMap((thing, i) => {
    const { on } = thing;
    const last = on !== undefined && !standing.slice(i + 1).some((other) => other.on === on);
    return [...thing.draw(), ...(last ? drawFittings(camera, plan, layout, on, height) : [])];
  });
  const shell = roomShell(camera, plan, layout, height);
  return {
    bounds: boundsOf(things),
    items: [...shell, ...things],
    title: 'Picture',
    alt: `Picture of the finished tops in ${layout.material.species}: ${pieces.length} ${pieces.length === 1 ? 'piece' : 'pieces'}${sinkWords(plan)}.`,
  };
}

function standingThings(camera: Camera, plan: Plan, layout: Layout, height: number): Standing[] {
  const laid = plan.pieces.filter((piece) => piece.kind === 'run' || piece.kind === 'island');
  const marks = doorMarks(plan, layout);
  const tops = laid.map((piece): Standing => ({
    footprint: piece.outline,
    on: piece.on,
    draw: () => [
      ...drawCarcass(camera, piece, layout, marks, height - piece.thickness),
      ...drawTop(camera, piece, laid, layout, height),
    ],
  }));
  const legs = plan.pieces.filter((piece) => piece.kind === 'leg').map(standingLeg);
  const all: Standing[] = [
    ...tops,
    ...legs.map((leg): Standing => ({ footprint: leg.footprint, draw: () => drawLeg(camera, leg, layout, height) })),
    ...rangesOf(plan, layout).map((range): Standing => ({
      footprint: range.footprint,
      draw: () => drawRange(camera, range, height),
    })),
  ];
  return all;
}

function sinkWords(plan: Plan): string {
  const sinks = plan.cutouts.filter((cutout) => cutout.kind === 'sink').length;
  return sinks === 0 ? '' : sinks === 1 ? ', one sink' : `, ${sinks} sinks`;
}

/** Box round what stands in the room, with a share of the room about it. */
function boundsOf(items: readonly DrawItem[]): Scene['bounds'] {
  const points = items.flatMap((item) => (item.kind === 'facet' || item.kind === 'boards' ? [...item.outline] : []));
  const box = boundingBox(points);
  const [w, h] = [(box.maxX - box.minX) * AROUND, (box.maxY - box.minY) * AROUND];
  return { minX: box.minX - w / 2, minY: box.minY - h / 2, maxX: box.maxX + w / 2, maxY: box.maxY + h * 2 };
}
