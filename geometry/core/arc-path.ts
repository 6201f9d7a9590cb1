import { arcPoints, CHORD_ERROR } from './arc';
import type { Point, Polygon } from './point';
import { distance } from './vector';

/**
 * A corner of a path and how it goes on to the next one: `bulge` is the tangent of a quarter of the arc's angle, plus for
 * counter-clockwise, 0 for a straight line (the convention of DXF's polylines).
 */
export interface PathVertex {
  readonly at: Point;
  readonly bulge: number;
}

/** Lines and true arcs, inches. The bulge of an open path's last vertex says nothing. */
export interface ArcPath {
  readonly vertices: readonly PathVertex[];
  readonly closed: boolean;
}

export interface Arc {
  readonly centre: Point;
  readonly radius: number;
  /** Radians, plus is counter-clockwise. */
  readonly from: number;
  readonly sweep: number;
}

export const straightPath = (points: readonly Point[], closed: boolean): ArcPath => ({
  vertices: points.map((at) => ({ at, bulge: 0 })),
  closed,
});

/** The arc from a to b with this bulge; null for a straight line. */
export function arcOf(a: Point, b: Point, bulge: number): Arc | null {
  const chord = distance(a, b);
  if (bulge === 0 || chord === 0) return null;
  const sweep = 4 * Math.atan(bulge);
  const radius = Math.abs(chord / (2 * Math.sin(sweep / 2)));
  // The centre stands left of the chord for a counter-clockwise arc of less than half a turn.
  const off = (chord * (1 - bulge * bulge)) / (4 * bulge);
  const [ux, uy] = [(b[0] - a[0]) / chord, (b[1] - a[1]) / chord];
  const centre: Point = [(a[0] + b[0]) / 2 - uy * off, (a[1] + b[1]) / 2 + ux * off];
  return { centre, radius, from: Math.atan2(a[1] - centre[1], a[0] - centre[0]), sweep };
}

/** A full circle as two half turns. */
export function circlePathOf(centre: Point, radius: number): ArcPath {
  const [x, y] = centre;
  return {
    vertices: [
      { at: [x - radius, y], bulge: 1 },
      { at: [x + radius, y], bulge: 1 },
    ],
    closed: true,
  };
}

/** The same path seen through a turn, a move or a mirror. */
export function movePath(path: ArcPath, move: (p: Point) => Point, mirrored = false): ArcPath {
  const sign = mirrored ? -1 : 1;
  return {
    ...path,
    vertices: path.vertices.map(({ at, bulge }) => ({ at: move(at), bulge: bulge === 0 ? 0 : sign * bulge })),
  };
}

/** Legs of a path in order, with the arc of those that are round. */
export function legsOf({
  vertices,
  closed,
}: ArcPath): { readonly from: Point; readonly to: Point; readonly arc: Arc | null }[] {
  const count = closed ? vertices.length : vertices.length - 1;
  return Array.from({ length: Math.max(0, count) }, (_, i) => {
    const { at, bulge } = vertices[i]!;
    const to = vertices[(i + 1) % vertices.length]!.at;
    return { from: at, to, arc: arcOf(at, to, bulge) };
  });
}

/** Points along the path, no chord further than `chordError` off its arc; a closed path's first point is not repeated. */
export function flattenPath(path: ArcPath, chordError = CHORD_ERROR): Point[] {
  const points = legsOf(path).flatMap(({ from, arc }): Point[] => {
    if (!arc) return [from];
    const round = arcPoints(arc.centre, arc.radius, arc.from, arc.from + arc.sweep, chordError);
    return [from, ...round.slice(1, -1)];
  });
  return path.closed || path.vertices.length === 0 ? points : [...points, path.vertices.at(-1)!.at];
}

/** Area inside a closed path with its arcs, square inches; plus for counter-clockwise. */
export function pathArea(path: ArcPath): number {
  let area = 0;
  for (const { from, to, arc } of legsOf(path)) {
    area += (from[0] * to[1] - from[1] * to[0]) / 2;
    if (arc) area += (arc.radius * arc.radius * (arc.sweep - Math.sin(arc.sweep))) / 2;
  }
  return area;
}

/**
 * Rounds corners of an outline.
 *
 * @param radii - by the corner's place in the outline, inches; a corner that has too little room on a side stays sharp
 */
export function roundCorners(outline: Polygon, radii: ReadonlyMap<number, number>): ArcPath {
  const vertices = outline.flatMap((at, i): PathVertex[] => {
    const radius = radii.get(i) ?? 0;
    const before = outline[(i + outline.length - 1) % outline.length]!;
    const after = outline[(i + 1) % outline.length]!;
    const [a, b] = [distance(at, before), distance(at, after)];
    if (radius <= 0 || a === 0 || b === 0) return [{ at, bulge: 0 }];
    const u: Point = [(before[0] - at[0]) / a, (before[1] - at[1]) / a];
    const v: Point = [(after[0] - at[0]) / b, (after[1] - at[1]) / b];
    const inside = Math.atan2(Math.abs(u[0] * v[1] - u[1] * v[0]), u[0] * v[0] + u[1] * v[1]);
    const reach = radius / Math.tan(inside / 2);
    if (reach > Math.min(a, b) + 1e-9) return [{ at, bulge: 0 }];
    const turn = Math.sign(v[0] * u[1] - v[1] * u[0]);
    return [
      { at: [at[0] + u[0] * reach, at[1] + u[1] * reach], bulge: turn * Math.tan((Math.PI - inside) / 4) },
      { at: [at[0] + v[0] * reach, at[1] + v[1] * reach], bulge: 0 },
    ];
  });
  return {
    vertices: vertices.filter(({ at }, i) => distance(at, vertices[(i + 1) % vertices.length]!.at) > 1e-9),
    closed: true,
  };
}
