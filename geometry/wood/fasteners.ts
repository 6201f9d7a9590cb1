import type { Base } from '../core/layout';
import type { ScrewSettings } from '../core/settings';
import type { Point, Polygon } from '../core/point';
import { contains } from '../core/polygon';
import { distance, dot, leftNormal, subtract } from '../core/vector';
import type { Piece, Tops } from '../top/types';
import type { WallFrame } from '../top/wall-frame';
import { baseReach, carriesTop } from './under';

/** One screw from below. x along the grain from the piece's left end, y from its front edge, inches. */
export interface Fastener {
  readonly letter: string;
  readonly x: number;
  readonly y: number;
  /** Front line: a round hole that fixes the top. Back line: a slot the top can travel in. */
  readonly row: 'front' | 'back';
  /** Length of the slot across the grain, inches; the shank for a round hole. */
  readonly slot: number;
  /** Base it goes up through; null where none is drawn. */
  readonly base: string | null;
}

/** A length of a piece that something below carries, in the piece's own x. */
interface Support {
  readonly from: number;
  readonly to: number;
  readonly base: string | null;
}

/**
 * Screws of one piece: a fixed line behind the front edge and a slotted one before the back edge, over every cabinet that
 * carries it. Each cabinet gets one at either side of it and more between at the shop's spacing. None lies in a cutout,
 * nor within the edge distance of a cutout, an end, a joint or a seam.
 *
 * A piece with no base drawn under it is taken as carried along its whole length.
 *
 * @param wall - the wall its run stands on; null for an island, which is carried all along
 * @param slot - slot length for the back line, inches
 */
export function fastenersOf(
  piece: Piece,
  bases: readonly Base[],
  wall: WallFrame | null,
  settings: ScrewSettings,
  slot: number,
): readonly Fastener[] {
  if (piece.kind === 'strip' || piece.kind === 'leg') return [];
  const rows = [
    { row: 'front' as const, y: settings.frontLine, slot: settings.shank },
    { row: 'back' as const, y: piece.depth - settings.backLine, slot },
  ].filter(({ y }) => y > 0 && y < piece.depth);
  return supportsOf(piece, bases, wall).flatMap((support) =>
    rows.flatMap((row) =>
      spread(support.from + settings.edgeDistance, support.to - settings.edgeDistance, settings.spacing)
        .map((x): Point => [x, row.y])
        .filter((point) => hasWood(point, piece, settings.edgeDistance))
        .map(([x, y]) => ({ letter: piece.letter, x, y, row: row.row, slot: row.slot, base: support.base })),
    ),
  );
}

/** Screws of every piece, run by run; the same list drilled is the pre-drill map. */
export function fastenersOfTops(
  tops: Pick<Tops, 'pieces' | 'runs'>,
  bases: readonly Base[],
  walls: readonly WallFrame[],
  settings: ScrewSettings,
  slot: number,
): readonly Fastener[] {
  return tops.pieces.flatMap((piece) => {
    const run = tops.runs.find((r) => r.id === piece.on);
    const wall = walls.find((w) => w.id === run?.wall) ?? null;
    return fastenersOf(piece, wall ? bases.filter((b) => b.wall === wall.id) : [], wall, settings, slot);
  });
}

function supportsOf(piece: Piece, bases: readonly Base[], wall: WallFrame | null): readonly Support[] {
  const xs = piece.shape.map((p) => p[0]);
  const whole: Support = { from: Math.min(...xs), to: Math.max(...xs), base: null };
  if (!wall || bases.length === 0) return [whole];
  const ownX = (inches: number) =>
    dot(
      subtract([wall.start[0] + wall.along[0] * inches, wall.start[1] + wall.along[1] * inches], piece.origin),
      piece.grain,
    );
  return bases.filter(carriesTop).flatMap((base): Support[] => {
    const [a, b] = baseReach(wall, base).map(ownX) as [number, number];
    const from = Math.max(whole.from, Math.min(a, b));
    const to = Math.min(whole.to, Math.max(a, b));
    return to > from ? [{ from, to, base: base.id }] : [];
  });
}

/** Places from one end to the other, evenly, at most `spacing` apart; the middle when the ends pass each other. */
function spread(from: number, to: number, spacing: number): readonly number[] {
  if (to < from) return [(from + to) / 2];
  const gaps = Math.max(1, Math.ceil((to - from) / spacing - 1e-9));
  return to - from < 1e-9 ? [from] : Array.from({ length: gaps + 1 }, (_, i) => from + ((to - from) * i) / gaps);
}

function hasWood(point: Point, piece: Piece, clear: number): boolean {
  if (!contains(piece.shape, point) || edgeGap(piece.shape, point) < clear - 1e-9) return false;
  return piece.cutouts.every(({ outline }) => !contains(outline, point) && edgeGap(outline, point) >= clear - 1e-9);
}

/** Distance from a point to the nearest edge of an outline, inches. */
export function edgeGap(outline: Polygon, point: Point): number {
  let nearest = Infinity;
  outline.forEach((a, i) => {
    const b = outline[(i + 1) % outline.length]!;
    const edge = subtract(b, a);
    const square = dot(edge, edge);
    const t = square === 0 ? 0 : Math.min(1, Math.max(0, dot(subtract(point, a), edge) / square));
    nearest = Math.min(nearest, distance(point, [a[0] + edge[0] * t, a[1] + edge[1] * t]));
  });
  return nearest;
}

/** Room place of a fastener. */
export function fastenerInRoom(piece: Pick<Piece, 'origin' | 'grain'>, { x, y }: Pick<Fastener, 'x' | 'y'>): Point {
  const back = leftNormal(piece.grain);
  return [piece.origin[0] + piece.grain[0] * x + back[0] * y, piece.origin[1] + piece.grain[1] * x + back[1] * y];
}
