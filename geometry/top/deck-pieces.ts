import type { Run } from '../core/layout';
import type { Point, Polygon } from '../core/point';
import { area, boundingBox, type Box } from '../core/polygon';
import { clipConvex, insideConvex, isConvex } from './clip-convex';
import { deckCells, type Cell, type DeckCut } from './deck-cells';
import { outlineToOwn, outlineToRoom, toRoom, type Deck } from './deck';
import type { LaidCutout } from './lay-cutouts';
import { intersection } from './polygon-boolean';
import type { Piece } from './types';

/** A piece before it has a letter. */
export type BarePiece = Omit<Piece, 'letter'> & {
  /** Row of the deck, 0 at the front edge. */
  readonly row: number;
};

/**
 * Pieces of one run or island, left to right as seen from the room, front row first.
 *
 * @param cutouts - cutouts that may touch the deck, its own and those of runs it is joined to
 * @param thickness - inches
 */
export function piecesOf(
  deck: Deck,
  cut: DeckCut,
  cutouts: readonly LaidCutout[],
  thickness: number,
): readonly BarePiece[] {
  const cells = deckCells(deck, cut);
  const ordered = deck.sign === 1 ? cells : [...cells].sort((a, b) => a.row - b.row || leftmost(b) - leftmost(a));
  const holes = cutouts.map((cutout) => onDeck(cutout, deck));
  return ordered.map((cell, i) => pieceOf(deck, cell, `${deck.id}.${i + 1}`, holes, thickness));
}

const leftmost = (cell: Cell): number => boundingBox(cell.outline).minX;

interface Hole {
  readonly id: string;
  readonly outline: Polygon;
  readonly box: Box;
  readonly convex: boolean;
}

function onDeck({ id, deck, outline, box, convex }: LaidCutout, target: Deck): Hole {
  if (deck === target) return { id, outline, box, convex };
  const moved = outlineToOwn(target.frame, outlineToRoom(deck.frame, outline));
  return { id, outline: moved, box: boundingBox(moved), convex };
}

function pieceOf(deck: Deck, cell: Cell, key: string, holes: readonly Hole[], thickness: number): BarePiece {
  const box = boundingBox(cell.outline);
  const toShape = ([x, y]: Point): Point => [x - box.minX, y - box.minY];
  const cutouts = holes.flatMap((hole) => {
    const parts = cutFrom(cell.outline, box, hole);
    return parts.map((outline) => ({ id: hole.id, outline: outline.map(toShape) }));
  });
  const gross = area(cell.outline);
  const finishedEdges: Piece['finishedEdges'][number][] = [];
  if (cell.frontSeen) finishedEdges.push('front');
  if (cell.backSeen) finishedEdges.push('back');
  if (cell.left.finished) finishedEdges.push('left');
  if (cell.right.finished) finishedEdges.push('right');
  return {
    key,
    on: deck.id,
    kind: deck.kind,
    outline: outlineToRoom(deck.frame, cell.outline),
    shape: cell.outline.map(toShape),
    origin: toRoom(deck.frame, [box.minX, box.minY]),
    grain: deck.frame.x,
    back: cell.back,
    front: cell.front,
    depth: box.maxY - box.minY,
    thickness,
    left: cell.left,
    right: cell.right,
    area: gross,
    netArea: cutouts.reduce((sum, cutout) => sum - area(cutout.outline), gross),
    finishedEdges,
    cutouts,
    count: 1,
    row: cell.row,
  };
}

/** Parts of a cutout inside a piece; the package is asked only when neither outline is plain. */
function cutFrom(piece: Polygon, box: Box, hole: Hole): readonly Polygon[] {
  const apart =
    hole.box.minX >= box.maxX || hole.box.maxX <= box.minX || hole.box.minY >= box.maxY || hole.box.maxY <= box.minY;
  if (apart) return [];
  const plain = isConvex(piece);
  if (plain && insideConvex(piece, hole.outline)) return [hole.outline];
  if (!plain || !hole.convex) return intersection(hole.outline, piece);
  const rest = clipConvex(hole.outline, piece);
  return rest.length > 2 && area(rest) > SLIVER ? [rest] : [];
}

/** A cutout that only touches a piece takes nothing from it, square inches. */
const SLIVER = 1e-6;

/**
 * Waterfall legs of a run: pieces of their own, grain running down, folded flat outwards from the end. x runs with the
 * run's own axis, so a left-hand leg has its floor end at 0 and a right-hand leg its mitred end. `height` is measured to
 * the long point of the miter, the top's show face.
 */
export function legsOf(run: Run, deck: Deck, thickness: number): readonly BarePiece[] {
  const legs: BarePiece[] = [];
  for (const side of ['left', 'right'] as const) {
    const end = run[side];
    if (end.kind !== 'waterfall' || !(end.height > 0)) continue;
    const ownLeft = (side === 'left') === (deck.sign === 1);
    const at = ownLeft ? deck.left.back : deck.right.back;
    const [from, to] = ownLeft ? [at - end.height, at] : [at, at + end.height];
    const flat: Polygon = [
      [from, 0],
      [to, 0],
      [to, deck.depth],
      [from, deck.depth],
    ];
    const floor = { kind: 'edge', angle: 90, finished: true, radius: 0 } as const;
    const mitred = { kind: 'waterfall', angle: 90, finished: false, radius: 0, bevel: 45 } as const;
    legs.push({
      key: `${run.id}.${side === 'left' ? 'L' : 'R'}`,
      on: run.id,
      kind: 'leg',
      outline: outlineToRoom(deck.frame, flat),
      shape: flat.map(([x, y]): Point => [x - from, y]),
      origin: toRoom(deck.frame, [from, 0]),
      grain: deck.frame.x,
      back: end.height,
      front: end.height,
      depth: deck.depth,
      thickness,
      left: ownLeft ? floor : mitred,
      right: ownLeft ? mitred : floor,
      area: end.height * deck.depth,
      netArea: end.height * deck.depth,
      finishedEdges: ['front', ownLeft ? 'left' : 'right'],
      cutouts: [],
      count: 1,
      row: 0,
    });
  }
  return legs;
}
