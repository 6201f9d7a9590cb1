import type { Point, Polygon } from '../../core/point';
import type { Face, Ink, TextPlace, Weight } from '../display-list';

/**
 * What every painter can paint: paths, text, clipped groups. Places are in the painter's own unit (px on screen, points on
 * paper), y down. The display list is turned into these once, so that screen, paper and file cannot disagree.
 */
export type Primitive = PathPrimitive | TextPrimitive | ClipPrimitive | SpanPrimitive;

export type Segment =
  | readonly ['M', number, number]
  | readonly ['L', number, number]
  | readonly ['C', number, number, number, number, number, number]
  | readonly ['Z'];

export type Path = readonly Segment[];

/** A role of the theme, or wood, which looks the same in every theme. */
export type Paint = Ink | { readonly hex: string };

export interface Line {
  readonly paint: Paint;
  readonly width: number;
  readonly dash?: readonly number[];
  /** Round ends and joins; else butt ends and mitred joins. */
  readonly round?: boolean;
}

export interface PathPrimitive {
  readonly kind: 'path';
  readonly path: Path;
  readonly fill?: Paint;
  /** Overlapping parts of the path are holes. */
  readonly evenOdd?: boolean;
  readonly line?: Line;
}

export interface TextPrimitive {
  readonly kind: 'text';
  readonly x: number;
  readonly y: number;
  readonly text: string;
  readonly face: Face;
  readonly weight: Weight;
  readonly size: number;
  readonly paint: Paint;
  readonly anchor: TextPlace['anchor'];
  /** Width by the tables, for painters that cannot anchor by themselves. */
  readonly width: number;
  /** Radians counter-clockwise about (x, y). */
  readonly turn: number;
  readonly hollow?: boolean;
}

export interface ClipPrimitive {
  readonly kind: 'clip';
  readonly path: Path;
  readonly evenOdd: boolean;
  readonly children: readonly Primitive[];
}

/** Several things that are read as one text, such as the parts of a stacked fraction. */
export interface SpanPrimitive {
  readonly kind: 'span';
  readonly text: string;
  /** Where its baseline begins, how long it is, and the text it stands among. */
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly turn: number;
  readonly face: Face;
  readonly weight: Weight;
  readonly size: number;
  readonly children: readonly Primitive[];
}

/** How the drawing's plane becomes the painter's. */
export interface View {
  /** Painter's units for an inch of the drawing. */
  readonly pxPerInch: number;
  /** Painter's units for a px of the display list. */
  readonly pixel: number;
  /** Place in the drawing that comes to the painter's (0, 0). */
  readonly origin: Point;
  /** Smallest figure of a fraction, px of the display list. */
  readonly smallest: number;
  /** Wood in its colours, or as grain lines for black on white. */
  readonly wood: 'colour' | 'lines';
}

/** Place of a point of the drawing in the painter's plane, moved by `shift` px. */
export function project(view: View, point: Point, shift: readonly [number, number] = [0, 0]): Point {
  return [
    (point[0] - view.origin[0]) * view.pxPerInch + shift[0] * view.pixel,
    (view.origin[1] - point[1]) * view.pxPerInch - shift[1] * view.pixel,
  ];
}

/** An open or closed path through points of the painter's plane. */
export function pathThrough(points: readonly Point[], closed: boolean): Path {
  const path: Segment[] = points.map((p, i) => [i === 0 ? 'M' : 'L', p[0], p[1]]);
  if (closed && path.length > 0) path.push(['Z']);
  return path;
}

/** Outline and holes of the drawing as one path of the painter's plane, to be filled even-odd. */
export function outlinePath(view: View, outline: Polygon, holes: readonly Polygon[] = []): Path {
  return [outline, ...holes].flatMap((ring) =>
    pathThrough(
      ring.map((p) => project(view, p)),
      true,
    ),
  );
}

/** A box with its middle at `centre`; `turn` radians counter-clockwise on the page. */
export function boxPath(centre: Point, width: number, height: number, turn = 0): Path {
  const half: readonly Point[] = [
    [-width / 2, -height / 2],
    [width / 2, -height / 2],
    [width / 2, height / 2],
    [-width / 2, height / 2],
  ];
  return pathThrough(
    half.map((p) => turned(centre, p, turn)),
    true,
  );
}

/** `offset` (y down) turned counter-clockwise about `centre` as seen on the page. */
export function turned(centre: Point, offset: Point, turn: number): Point {
  const c = Math.cos(turn);
  const s = Math.sin(turn);
  return [centre[0] + offset[0] * c + offset[1] * s, centre[1] - offset[0] * s + offset[1] * c];
}

export const circlePath = (centre: Point, radius: number): Path => [
  ...arcPath(centre, radius, 0, 2 * Math.PI),
  ['Z'] as const,
];

/**
 * Counter-clockwise arc on the page (y down), in Bézier curves of at most a quarter turn; their distance from the true
 * circle is under 0.03 % of the radius.
 */
export function arcPath(centre: Point, radius: number, start: number, end: number): Path {
  const sweep = end > start ? end - start : end - start + 2 * Math.PI;
  const count = Math.max(1, Math.ceil(sweep / (Math.PI / 2) - 1e-9));
  const step = sweep / count;
  const handle = (4 / 3) * Math.tan(step / 4) * radius;
  const at = (angle: number): Point => [centre[0] + radius * Math.cos(angle), centre[1] - radius * Math.sin(angle)];
  const first = at(start);
  const path: Segment[] = [['M', first[0], first[1]]];
  for (let i = 0; i < count; i++) {
    const a = start + i * step;
    const b = a + step;
    const [p, q] = [at(a), at(b)];
    path.push([
      'C',
      p[0] - handle * Math.sin(a),
      p[1] - handle * Math.cos(a),
      q[0] + handle * Math.sin(b),
      q[1] + handle * Math.cos(b),
      q[0],
      q[1],
    ]);
  }
  return path;
}
