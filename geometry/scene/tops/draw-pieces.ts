import type { Layout } from '../../core/layout';
import type { Point, Polygon } from '../../core/point';
import { boundingBox } from '../../core/polygon';
import { along, distance, dot, leftNormal, subtract, unit } from '../../core/vector';
import type { PlacedCutout, Piece } from '../../top/types';
import type { DrawItem, Ink, Stroke } from '../display-list';
import { woodLook } from '../primitives/wood-look';
import { text } from '../room/scene-styles';
import { letterPlace } from './letter-place';

/** px: letter's disc, grain arrow and its distance from the letter. */
const LETTER = 42;
const SMALL_LETTER = 26;
const ARROW = 56;
const ARROW_OFF = 34;

/** A strip less deep than this has room for a small letter and no arrow, inches. */
const NARROW = 8;

/** Place in the room of a point of the piece's own axes (x along the grain, y from its front edge). */
export function toRoom(piece: Piece, [x, y]: Point): Point {
  return along(along(piece.origin, piece.grain, x), leftNormal(piece.grain), y);
}

/** Wood of a piece, less its cutouts, its staves along its own grain so that they turn at a miter. */
export function drawWood(piece: Piece, layout: Layout, grain: boolean): DrawItem {
  const tag = { layer: 'staves', id: piece.letter } as const;
  const holes = piece.cutouts.map((cutout) => cutout.outline.map((p) => toRoom(piece, p)));
  if (!grain)
    return { ...tag, kind: 'polygon', outline: piece.outline, fill: 'card', ...(holes.length > 0 ? { holes } : {}) };
  return {
    ...tag,
    kind: 'staves',
    outline: piece.outline,
    ...(holes.length > 0 ? { holes } : {}),
    along: piece.grain,
    origin: piece.origin,
    width: layout.material.stave,
    species: layout.material.species,
    // The run's name, not the letter: staves run on through a seam when the pieces come from one slab.
    seed: layout.stock.grainMatch ? piece.on : piece.key,
  };
}

/**
 * What lines on the pieces are drawn with. Light wood stays light when the screen is dark, so its lines stay dark; on dark
 * wood, and on none, they are as all lines.
 */
export const inkOnWood = (layout: Layout, grain: boolean): Ink =>
  grain && !woodLook(layout.material.species).dark ? 'tapeInk' : 'ink';

/**
 * The edge of a piece, left out where a cutout has taken it away. Black on dark wood needs the casing that chalk needs on
 * any. The polygon itself has no line where parts of it are missing.
 */
export function drawOutline(piece: Piece, layout: Layout, selected: boolean, ink: Ink = 'ink'): DrawItem[] {
  const dark = woodLook(layout.material.species).dark;
  const stroke: Stroke = selected ? { ink: 'chalk', width: 4, casing: true } : { ink, width: 2, casing: dark };
  const tag = { layer: 'tops', id: piece.letter } as const;
  const holes = piece.cutouts.map((cutout) => cutout.outline.map((p) => toRoom(piece, p)));
  const lines = piece.outline.flatMap((from, i) => leftOf([{ from, to: piece.outline[(i + 1) % piece.outline.length]! }], holes)); // prettier-ignore
  if (holes.length === 0 || lines.length === piece.outline.length)
    return [{ ...tag, kind: 'polygon', outline: piece.outline, stroke }];
  return [
    { ...tag, kind: 'polygon', outline: piece.outline },
    ...lines.map(({ from, to }): DrawItem => ({ ...tag, kind: 'line', from, to, stroke })),
  ];
}

interface Segment {
  readonly from: Point;
  readonly to: Point;
}

/** Shorter leftovers are rounding, inches. */
const LEFTOVER = 1e-6;

/** The parts of some segments that no hole takes. A hole is clipped to its piece, so its own edge may lie on the segment. */
function leftOf(segments: readonly Segment[], holes: readonly Polygon[]): readonly Segment[] {
  return holes.reduce<readonly Segment[]>((left, hole) => left.flatMap((segment) => outside(segment, hole)), segments);
}

/** What a convex or star-like hole leaves of a segment: before and after the stretch that lies in it or on its edge. */
function outside({ from, to }: Segment, hole: Polygon): Segment[] {
  const dir = unit(from, to);
  if (!dir) return [];
  const length = distance(from, to);
  const normal = leftNormal(dir);
  const on = hole
    .filter((p) => Math.abs(dot(normal, subtract(p, from))) < 1e-6)
    .map((p) => dot(dir, subtract(p, from)))
    .filter((at) => at > -LEFTOVER && at < length + LEFTOVER);
  if (on.length < 2) return [{ from, to }];
  const [first, last] = [Math.min(...on), Math.max(...on)];
  return [
    ...(first > LEFTOVER ? [{ from, to: along(from, dir, first) }] : []),
    ...(last < length - LEFTOVER ? [{ from: along(from, dir, last), to }] : []),
  ];
}

/** Letter on a disc where the piece has room beside its cutouts, and an arrow along the grain next to it. */
export function drawLetter(piece: Piece, grain: boolean, ink: Ink = 'ink'): DrawItem[] {
  const holes = piece.cutouts.map((cutout) => cutout.outline);
  const at = toRoom(piece, letterPlace(piece.shape, holes, piece.depth));
  const tag = { layer: 'letters', id: piece.letter } as const;
  const narrow = piece.depth < NARROW;
  const size = narrow ? SMALL_LETTER : LETTER;
  const disc: DrawItem = { ...tag, kind: 'mark', at, mark: 'disc', size, ink: 'ink', text: piece.letter };
  if (!grain || narrow) return [disc];
  // Towards the back edge: at an inside corner that is the longer one.
  const back = leftNormal(piece.grain);
  const arrow: DrawItem = {
    ...tag,
    kind: 'mark',
    at,
    shift: [back[0] * ARROW_OFF, back[1] * ARROW_OFF],
    mark: 'grainArrow',
    size: ARROW,
    ink,
    turn: Math.atan2(piece.grain[1], piece.grain[0]),
  };
  return [disc, arrow];
}

/** The hole: its edge, and a cross to say that nothing is there. */
export function drawCutout(cutout: PlacedCutout, layout: Layout, selected: boolean, ink: Ink = 'ink'): DrawItem[] {
  const tag = { layer: 'cutouts', id: cutout.id } as const;
  const corners = farCorners(cutout.outline);
  const cross: DrawItem[] = corners.map(([from, to]) => ({ ...tag, kind: 'line', from, to, stroke: { ink: 'line', width: 1.3 } })); // prettier-ignore
  const casing = selected || woodLook(layout.material.species).dark;
  const stroke: Stroke = { ink: selected ? 'chalk' : ink, width: selected ? 3.6 : 1.6, casing };
  return [...cross, { ...tag, kind: 'polygon', outline: cutout.outline, stroke }];
}

/** Two diagonals of an outline, each between the points that lie farthest out along it. */
function farCorners(outline: Polygon): (readonly [Point, Point])[] {
  const box = boundingBox(outline);
  const centre: Point = [(box.minX + box.maxX) / 2, (box.minY + box.maxY) / 2];
  const longest = outline.reduce<readonly [Point, Point] | null>((best, a, i) => {
    const b = outline[(i + 1) % outline.length]!;
    const length = (p: readonly [Point, Point]) => Math.hypot(p[1][0] - p[0][0], p[1][1] - p[0][1]);
    return !best || length([a, b]) > length(best) ? [a, b] : best;
  }, null);
  if (!longest) return [];
  const size = Math.hypot(longest[1][0] - longest[0][0], longest[1][1] - longest[0][1]);
  const axis: Point = [(longest[1][0] - longest[0][0]) / size, (longest[1][1] - longest[0][1]) / size];
  const normal = leftNormal(axis);
  const far = (u: number, v: number) =>
    outline.reduce((best, p) => (reach(p, u, v) > reach(best, u, v) ? p : best), outline[0]!);
  const reach = ([x, y]: Point, u: number, v: number) => {
    const [dx, dy] = [x - centre[0], y - centre[1]];
    return u * (dx * axis[0] + dy * axis[1]) + v * (dx * normal[0] + dy * normal[1]);
  };
  return [
    [far(1, 1), far(-1, -1)],
    [far(1, -1), far(-1, 1)],
  ];
}

/** Lengths of the front and the back edge, just inside them, to the display step. */
export function drawSizes(piece: Piece, layout: Layout): DrawItem[] {
  const tag = { layer: 'sizes', id: piece.letter } as const;
  const edge = (y: number) => {
    const xs = piece.shape.filter((p) => Math.abs(p[1] - y) < 1e-6).map((p) => p[0]);
    return [Math.min(...xs), Math.max(...xs)] as const;
  };
  return [[0, piece.front, 17] as const, [piece.depth, piece.back, -17] as const].flatMap(
    ([y, inches, offset]): DrawItem[] => {
      const [from, to] = edge(y);
      if (!(to > from)) return [];
      const ends = { from: toRoom(piece, [from, y]), to: toRoom(piece, [to, y]) };
      return [{ ...tag, kind: 'dimension', ...ends, offset, inches, step: layout.step, style: text.number }];
    },
  );
}
