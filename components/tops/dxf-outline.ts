import DxfParser, {
  type IDxf,
  type IEntity,
  type IArcEntity,
  type ICircleEntity,
  type ILineEntity,
  type ILwpolylineEntity,
} from 'dxf-parser';

import { arcPoints } from '@/geometry/core/arc';
import type { Point, Polygon } from '@/geometry/core/point';
import { area, boundingBox, counterClockwise } from '@/geometry/core/polygon';
import { distance } from '@/geometry/core/vector';
import { outlineProblem, type TypedOutline } from './outline-text';

/** Ends of lines and arcs nearer than this belong together, inches. */
const JOINED = 1 / 64;

/** $INSUNITS codes of the DXF reference, as inches a unit. */
const UNITS: Readonly<Record<number, number>> = { 1: 1, 2: 12, 4: 1 / 25.4, 5: 1 / 2.54, 6: 1000 / 25.4 };

/**
 * The largest closed outline of a maker's DXF file: polylines with arcs, circles, and loops of lines and arcs. In the
 * cutout's own axes: centred on x = 0, front side at y = 0, inches.
 *
 * @returns a sentence where the file holds none
 */
export function outlineFromDxf(text: string): TypedOutline {
  let file: IDxf | null;
  try {
    file = new DxfParser().parseSync(text);
  } catch (error) {
    return {
      ok: false,
      message: `This is no DXF file that can be read: ${error instanceof Error ? error.message : 'unknown reason'}.`,
    };
  }
  if (!file) return { ok: false, message: 'This is no DXF file that can be read.' };
  const scale = unitOf(file.header ?? {});
  const loops = closedLoops(file.entities, scale);
  const largest = loops.reduce<Polygon | null>((best, loop) => (!best || area(loop) > area(best) ? loop : best), null);
  if (!largest) return { ok: false, message: 'The file holds no closed outline of lines, arcs, circles or polylines.' };
  const outline = placed(largest);
  const why = outlineProblem(outline);
  return why === null ? { ok: true, outline } : { ok: false, message: why };
}

/** Inches a drawing unit; a file that does not say is read as its $MEASUREMENT tells, else as inches. */
function unitOf(header: Readonly<Record<string, unknown>>): number {
  const named = UNITS[Number(header.$INSUNITS)];
  if (named !== undefined) return named;
  return Number(header.$MEASUREMENT) === 1 ? 1 / 25.4 : 1;
}

function placed(loop: Polygon): Polygon {
  const box = boundingBox(loop);
  const middle = (box.minX + box.maxX) / 2;
  const near = (a: Point, b: Point) => distance(a, b) < 1e-6;
  return counterClockwise(loop)
    .map(([x, y]): Point => [x - middle, y - box.minY])
    .filter((p, i, all) => !near(p, all[(i + 1) % all.length]!));
}

function closedLoops(entities: readonly IEntity[], scale: number): Polygon[] {
  const loops: Polygon[] = [];
  const open: Point[][] = [];
  for (const entity of entities) {
    const path = pathOf(entity, scale);
    if (!path || path.points.length < 2) continue;
    if (path.closed || distance(path.points[0]!, path.points.at(-1)!) < JOINED) loops.push(path.points);
    else open.push(path.points);
  }
  return [...loops, ...chained(open)].filter((loop) => loop.length > 2);
}

/** Joins open paths end to end until they close. */
function chained(paths: readonly Point[][]): Polygon[] {
  const left = paths.map((path) => [...path]);
  const loops: Polygon[] = [];
  while (left.length > 0) {
    const chain = left.pop()!;
    for (;;) {
      const end = chain.at(-1)!;
      if (chain.length > 2 && distance(end, chain[0]!) < JOINED) {
        loops.push(chain);
        break;
      }
      const next = left.findIndex((path) => distance(path[0]!, end) < JOINED || distance(path.at(-1)!, end) < JOINED);
      if (next < 0) break;
      const [path] = left.splice(next, 1);
      const forward = distance(path![0]!, end) < JOINED ? path! : [...path!].reverse();
      chain.push(...forward.slice(1));
    }
  }
  return loops;
}

function pathOf(entity: IEntity, k: number): { readonly points: Point[]; readonly closed: boolean } | null {
  switch (entity.type) {
    case 'LINE':
      return { points: (entity as ILineEntity).vertices.map(({ x, y }): Point => [x * k, y * k]), closed: false };
    case 'LWPOLYLINE':
    case 'POLYLINE':
      return polylinePath(entity as ILwpolylineEntity, k);
    case 'CIRCLE': {
      const { center, radius } = entity as ICircleEntity;
      return { points: arcPoints([center.x * k, center.y * k], radius * k, 0, 2 * Math.PI), closed: true };
    }
    case 'ARC': {
      const { center, radius, startAngle, endAngle } = entity as IArcEntity;
      const end = endAngle > startAngle ? endAngle : endAngle + 2 * Math.PI;
      return { points: arcPoints([center.x * k, center.y * k], radius * k, startAngle, end), closed: false };
    }
    default:
      return null;
  }
}

function polylinePath({ vertices, shape }: ILwpolylineEntity, k: number): { points: Point[]; closed: boolean } {
  const points: Point[] = [];
  vertices.forEach((vertex, i) => {
    const from: Point = [vertex.x * k, vertex.y * k];
    points.push(from);
    const next = vertices[(i + 1) % vertices.length]!;
    if (!vertex.bulge || (!shape && i === vertices.length - 1)) return;
    points.push(...bulged(from, [next.x * k, next.y * k], vertex.bulge).slice(1, -1));
  });
  return { points, closed: shape };
}

/** Points of a polyline's arc; its bulge is the tangent of a quarter of the angle it spans, positive counter-clockwise. */
function bulged(from: Point, to: Point, bulge: number): Point[] {
  const span = 4 * Math.atan(bulge);
  const chord = distance(from, to);
  if (chord === 0) return [from, to];
  const radius = chord / (2 * Math.sin(span / 2));
  const off = radius * Math.cos(span / 2);
  const [ux, uy] = [(to[0] - from[0]) / chord, (to[1] - from[1]) / chord];
  const centre: Point = [(from[0] + to[0]) / 2 - uy * off, (from[1] + to[1]) / 2 + ux * off];
  const start = Math.atan2(from[1] - centre[1], from[0] - centre[0]);
  return arcPoints(centre, Math.abs(radius), start, start + span);
}
