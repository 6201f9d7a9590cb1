import { wallLabel, type Layout } from '@/geometry/core/layout';
import { intersect } from '@/geometry/core/line';
import type { Point } from '@/geometry/core/point';
import { add, along, cross, distance, dot, rightNormal, scale, subtract, unit } from '@/geometry/core/vector';
import { freshWallId } from '@/shared/layout/wall-chain';

/** Walls as they are drawn: left to right, the room on their right-hand side. */
export interface Sketch {
  readonly walls: readonly string[];
  /** One more than walls; as many when closed. Inches. */
  readonly points: readonly Point[];
  readonly closed: boolean;
}

/** Walls nearer to each other's direction than this do not cross usefully; sine of the angle. */
const NEARLY_PARALLEL = 0.1;

export const sketchOf = ({ room }: Layout): Sketch => ({
  walls: room.walls.map((w) => w.id),
  points: room.sketch,
  closed: room.closed,
});

/** The edit that makes this the room's sketch. */
export const traceEdit = ({ walls, points, closed }: Sketch) => ({
  kind: 'traceRoom' as const,
  walls: [...walls],
  points: points.map(([x, y]): [number, number] => [x, y]),
  closed,
});

/** A name for a wall that is new. */
export function newWall(walls: readonly string[], also: readonly string[] = []): string {
  const all = [...walls, ...also];
  return freshWallId({ walls: all.map((id) => ({ id })) }, wallLabel(all.length));
}

export const wallIndex = (sketch: Sketch, wall: string): number => sketch.walls.indexOf(wall);

/** Both ends of the wall at `index`. */
export function endsOf({ points, closed }: Sketch, index: number): readonly [Point, Point] {
  return [points[index]!, points[closed ? (index + 1) % points.length : index + 1]!];
}

export const lengthOf = (sketch: Sketch, index: number): number => distance(...endsOf(sketch, index));

/** Bearing of the wall at `index`, radians, or null where there is none. */
export function bearingOf(sketch: Sketch, index: number): number | null {
  const count = sketch.walls.length;
  const at = sketch.closed ? (index + count) % count : index;
  if (at < 0 || at >= count) return null;
  const [from, to] = endsOf(sketch, at);
  const [dx, dy] = subtract(to, from);
  return Math.atan2(dy, dx);
}

export const withPoint = (sketch: Sketch, index: number, to: Point): Sketch => ({
  ...sketch,
  points: sketch.points.map((point, i) => (i === index ? to : point)),
});

/** A wall more at one open end. */
export function extend(sketch: Sketch, end: 'left' | 'right', to: Point): Sketch {
  const fresh = newWall(sketch.walls);
  return end === 'right'
    ? { ...sketch, walls: [...sketch.walls, fresh], points: [...sketch.points, to] }
    : { ...sketch, walls: [fresh, ...sketch.walls], points: [to, ...sketch.points] };
}

/** Whether the chain can be closed: a ring needs three walls, the new one counted. */
export const canClose = (sketch: Sketch): boolean => !sketch.closed && sketch.walls.length >= 2;

/** Joins both open ends: by a new wall, or, when they lie on each other, in one corner. */
export function close(sketch: Sketch, reach: number): Sketch {
  const first = sketch.points[0]!;
  const last = sketch.points.at(-1)!;
  if (distance(first, last) <= reach && sketch.walls.length >= 3)
    return { ...sketch, points: sketch.points.slice(0, -1), closed: true };
  return { ...sketch, walls: [...sketch.walls, newWall(sketch.walls)], closed: true };
}

/** Leaves a ring open between its last wall and its first. */
export const open = (sketch: Sketch): Sketch => ({
  ...sketch,
  points: [...sketch.points, sketch.points[0]!],
  closed: false,
});

/** Takes a wall away; its neighbours then meet where their lines cross, or in the middle of where it stood. */
export function without(sketch: Sketch, wall: string): Sketch {
  const index = wallIndex(sketch, wall);
  const count = sketch.walls.length;
  const walls = sketch.walls.filter((id) => id !== wall);
  if (count <= 1) return { walls: [], points: [], closed: false };
  if (sketch.closed && count <= 3) return without(open(rotated(sketch, (index + 1) % count)), wall);
  if (!sketch.closed && index === 0) return { ...sketch, walls, points: sketch.points.slice(1) };
  if (!sketch.closed && index === count - 1) return { ...sketch, walls, points: sketch.points.slice(0, -1) };
  const meeting = neighboursMeet(sketch, index);
  const after = (index + 1) % sketch.points.length;
  const points = sketch.points.map((point, i) => (i === index ? meeting : point)).filter((_, i) => i !== after);
  // In a ring the last wall ends in the first point, which is the one taken away.
  return after === 0 && sketch.closed
    ? { ...sketch, walls, points: [meeting, ...points.slice(0, -1)] }
    : { ...sketch, walls, points };
}

/** The same ring begun at another wall. */
function rotated(sketch: Sketch, start: number): Sketch {
  const turn = <T>(list: readonly T[]): T[] => [...list.slice(start), ...list.slice(0, start)];
  return { ...sketch, walls: turn(sketch.walls), points: turn(sketch.points) };
}

function neighboursMeet(sketch: Sketch, index: number): Point {
  const count = sketch.walls.length;
  const [from, to] = endsOf(sketch, index);
  const before = endsOf(sketch, (index - 1 + count) % count);
  const after = endsOf(sketch, (index + 1) % count);
  const a = unit(...before);
  const b = unit(...after);
  const middle = scale(add(from, to), 0.5);
  if (!a || !b || Math.abs(cross(a, b)) < NEARLY_PARALLEL) return middle;
  const crossing = intersect({ origin: before[0], direction: a }, { origin: after[0], direction: b });
  return crossing && distance(crossing, middle) < 2 * distance(from, to) ? crossing : middle;
}

/**
 * Slides a wall sideways by `by` inches into the room (minus: out of it); its neighbours keep their directions where they
 * can and become longer or shorter.
 */
export function slideWall(sketch: Sketch, index: number, by: number): Sketch {
  const [from, to] = endsOf(sketch, index);
  const direction = unit(from, to);
  if (!direction) return sketch;
  const inward = rightNormal(direction);
  const line = { origin: along(from, inward, by), direction };
  const moved = (corner: Point, other: readonly [Point, Point] | null): Point => {
    const shifted = along(corner, inward, by);
    const way = other && unit(...other);
    if (!way || Math.abs(cross(direction, way)) < NEARLY_PARALLEL) return shifted;
    return intersect(line, { origin: corner, direction: way }) ?? shifted;
  };
  const count = sketch.walls.length;
  const neighbour = (i: number) =>
    sketch.closed ? endsOf(sketch, (i + count) % count) : i >= 0 && i < count ? endsOf(sketch, i) : null;
  const next = sketch.closed ? (index + 1) % sketch.points.length : index + 1;
  const left = moved(from, neighbour(index - 1));
  const right = moved(to, neighbour(index + 1));
  return {
    ...sketch,
    points: sketch.points.map((point, i) => (i === index ? left : i === next ? right : point)),
  };
}

/** Where along the wall at `index` a point lies, inches from its left end, held inside the wall. */
export function footOnWall(sketch: Sketch, index: number, point: Point): number {
  const [from, to] = endsOf(sketch, index);
  const direction = unit(from, to);
  if (!direction) return 0;
  return Math.min(distance(from, to), Math.max(0, dot(subtract(point, from), direction)));
}

/** Which way a drawn chain turns: over 0 to the right, as walls do that go round a room from left to right. */
export function turnsRight({ points, closed }: Sketch): boolean {
  let turn = 0;
  const count = points.length;
  for (let i = closed ? 0 : 1; i < (closed ? count : count - 1); i++) {
    const before = points[(i - 1 + count) % count]!;
    const at = points[i]!;
    const after = points[(i + 1) % count]!;
    const into = subtract(at, before);
    const out = subtract(after, at);
    turn -= Math.atan2(cross(into, out), dot(into, out));
  }
  return turn > -1e-9;
}

/** The same walls walked from the other end, for a room that was drawn right to left. */
export function reversed(sketch: Sketch): Sketch {
  const { points } = sketch;
  const back = sketch.closed ? [points[0]!, ...points.slice(1).reverse()] : [...points].reverse();
  return { ...sketch, walls: [...sketch.walls].reverse(), points: back };
}
