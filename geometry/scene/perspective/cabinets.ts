import type { Base, Layout } from '../../core/layout';
import type { Point, Polygon } from '../../core/point';
import { boundingBox } from '../../core/polygon';
import { along, distance, dot, leftNormal, subtract } from '../../core/vector';
import type { Plan } from '../../plan/types';
import { clipHalfPlane, isConvex } from '../../top/clip-convex';
import { solvedRoom } from '../../top/solved-room';
import { alongWall, wallFrames } from '../../top/wall-frame';
import type { DrawItem } from '../display-list';
import { toRoom } from '../tops/draw-pieces';
import { atHeight, type Camera } from './camera';
import { facet, sidesSeen, upright, type Side } from './solids';

type Piece = Plan['pieces'][number];

/** Nobody measures these for a top: toe kick, overhang over doors, width of a door where no cabinet says, inches. */
const KICK = 4;
const OVERHANG = 1;
const DOOR = 18;
const NARROWEST_DOOR = 6;

/** What carries a piece: its outline, back from open edges by the overhang. Counter-clockwise, axes of the plan. */
export function carcassOf(piece: Piece): Polygon {
  const box = boundingBox(piece.shape);
  const island = piece.kind === 'island';
  if (island && !isConvex(piece.shape)) return piece.outline;
  const back = (end: Piece['left']) => (island || end.kind === 'open' ? OVERHANG : 0);
  let shape: Polygon = piece.shape;
  const cut = (a: Point, b: Point) => {
    const kept = clipHalfPlane(shape, a, b);
    if (kept.length > 2) shape = kept;
  };
  cut([0, box.minY + OVERHANG], [1, box.minY + OVERHANG]);
  if (island) cut([1, box.maxY - OVERHANG], [0, box.maxY - OVERHANG]);
  const [left, right] = [box.minX + back(piece.left), box.maxX - back(piece.right)];
  cut([left, 1], [left, 0]);
  cut([right, 0], [right, 1]);
  return shape.map((p) => toRoom(piece, p));
}

/** A cabinet under a piece: its sides with a toe kick and lines between doors. */
export function drawCarcass(
  camera: Camera,
  piece: Piece,
  layout: Layout,
  doorsAt: readonly Point[],
  height: number,
): DrawItem[] {
  const look = { layer: 'bases', id: piece.letter } as const;
  return sidesSeen(camera, carcassOf(piece), 0, height).flatMap((side) => [
    ...facet(camera, side.outline, { ...look, surface: 'cabinet', light: side.light }),
    ...doors(camera, side, doorsAt, height).flatMap((door) =>
      facet(camera, door, { ...look, surface: 'cabinet', light: side.light }),
    ),
    ...facet(camera, upright(side.from, side.to, 0, KICK), { ...look, surface: 'kick', light: side.light }),
  ]);
}

/** A side parted where cabinets meet, else into doors of a usual width. */
function doors(camera: Camera, side: Side, doorsAt: readonly Point[], height: number) {
  const length = distance(side.from, side.to);
  const way: Point = [(side.to[0] - side.from[0]) / length, (side.to[1] - side.from[1]) / length];
  const near = doorsAt
    .filter((p) => Math.abs(dot(leftNormal(way), subtract(p, side.from))) < 4)
    .map((p) => dot(way, subtract(p, side.from)))
    .filter((at) => at > NARROWEST_DOOR && at < length - NARROWEST_DOOR);
  const count = Math.floor(length / DOOR);
  const even = Array.from({ length: Math.max(0, count - 1) }, (_, i) => ((i + 1) * length) / count);
  const marks = [0, ...(near.length > 0 ? near.sort((a, b) => a - b) : even), length];
  return marks
    .slice(1)
    .map((to, i) => upright(along(side.from, way, marks[i]!), along(side.from, way, to), KICK, height));
}

/** Where cabinets meet along the fronts, axes of the plan. */
export function doorMarks(plan: Plan, layout: Layout): Point[] {
  if (!plan.room) return [];
  const walls = wallFrames(solvedRoom(plan.room, layout.room));
  return layout.bases.flatMap((base) => {
    const wall = walls.byId.get(base.wall);
    if (!wall || base.kind === 'window' || base.kind === 'pipe') return [];
    return [base.from, alongWall(wall, base.to)].map((x) =>
      along(along(wall.start, wall.along, x), wall.inward, base.depth),
    );
  });
}

/** A range that stands between tops: its outline on the floor, and its look. */
export interface Range {
  readonly footprint: Polygon;
  readonly burners: readonly { readonly at: Point; readonly radius: number }[];
  readonly id: string;
}

export function rangesOf(plan: Plan, layout: Layout): Range[] {
  if (!plan.room) return [];
  const walls = wallFrames(solvedRoom(plan.room, layout.room));
  return layout.bases.flatMap((base: Base): Range[] => {
    const wall = walls.byId.get(base.wall);
    if (!wall || base.kind !== 'range') return [];
    const to = alongWall(wall, base.to);
    const at = (x: number, y: number) => along(along(wall.start, wall.along, x), wall.inward, y);
    const width = to - base.from;
    const burners = [0.27, 0.73].flatMap((u) =>
      [0.3, 0.7].map((v) => ({
        at: at(base.from + u * width, v * base.depth),
        radius: Math.min(width, base.depth) * 0.13,
      })),
    );
    const footprint = [at(base.from, 0), at(base.from, base.depth), at(to, base.depth), at(to, 0)];
    return [{ footprint, burners, id: base.id }];
  });
}

/** Points of a burner's ring. */
const RING = 24;

export function drawRange(camera: Camera, range: Range, height: number): DrawItem[] {
  const look = { layer: 'bases', id: range.id } as const;
  return [
    ...sidesSeen(camera, range.footprint, 0, height).flatMap((side) => [
      ...facet(camera, side.outline, { ...look, surface: 'steel', light: side.light }),
      ...facet(camera, upright(side.from, side.to, 0, KICK), { ...look, surface: 'kick', light: side.light }),
    ]),
    ...facet(camera, atHeight(range.footprint, height), { ...look, surface: 'hob', light: 0.6 }),
    ...range.burners.flatMap(({ at, radius }) =>
      facet(camera, atHeight(ring(at, radius), height), { ...look, surface: 'hob', light: 1 }),
    ),
  ];
}

export const ring = (at: Point, radius: number): Polygon =>
  Array.from({ length: RING }, (_, i): Point => {
    const angle = (2 * Math.PI * i) / RING;
    return [at[0] + radius * Math.cos(angle), at[1] + radius * Math.sin(angle)];
  });
