import type { Point, Polygon } from '../core/point';
import { boundingBox } from '../core/polygon';
import { clipHalfPlane } from './clip-convex';
import { endAngleDeg, endAt, stripOutline, type Deck, type DeckEnd } from './deck';
import { intersection } from './polygon-boolean';
import type { PieceEnd } from './types';

/** Where a deck is cut: along the grain at `rows` (own y), across it at `cross[row]` (own x), both rising. */
export interface DeckCut {
  readonly rows: readonly number[];
  readonly cross: readonly (readonly number[])[];
}

/** One piece of a deck in the deck's own axes. */
export interface Cell {
  readonly row: number;
  readonly outline: Polygon;
  readonly left: PieceEnd;
  readonly right: PieceEnd;
  /** Lengths of the front and the back edge. */
  readonly front: number;
  readonly back: number;
  readonly frontSeen: boolean;
  readonly backSeen: boolean;
}

/** Cuts a deck into its pieces, front row first, each row from its left end to its right end (own axes). */
export function deckCells(deck: Deck, cut: DeckCut): readonly Cell[] {
  const cells: Cell[] = [];
  for (let row = 0; row <= cut.rows.length; row++) {
    const bottom = cut.rows[row - 1] ?? 0;
    const top = cut.rows[row] ?? deck.depth;
    const seen = {
      frontSeen: row === 0 && deck.frontSeen,
      backSeen: row === cut.rows.length && deck.backSeen,
    };
    const xs = cut.cross[row] ?? [];
    const plain = deck.shape === 'strip' && betweenEnds(deck, xs, row, bottom, top);
    for (let column = 0; column <= xs.length; column++) {
      const [from, to] = [xs[column - 1] ?? null, xs[column] ?? null];
      const outlines = plain ? null : clipped(deck, from, to, bottom, top);
      if (outlines) for (const outline of outlines) cells.push({ row, ...seen, ...freeCell(outline, deck, from, to) });
      else cells.push({ row, ...seen, ...stripCell(deck, row, from, to, bottom, top) });
    }
  }
  return cells;
}

const SEAM_END = { kind: 'seam', angle: 90, finished: false, radius: 0 } as const;

type CellShape = Omit<Cell, 'row' | 'frontSeen' | 'backSeen'>;

function stripCell(
  deck: Deck,
  row: number,
  from: number | null,
  to: number | null,
  bottom: number,
  top: number,
): CellShape {
  const left = rowEnd(deck.left, from, deck.depth, row, bottom, top);
  const right = rowEnd(deck.right, to, deck.depth, row, bottom, top);
  const outline = stripOutline(left, right, top - bottom).map(([x, y]): Point => [x, y + bottom]);
  return {
    outline,
    left: from === null ? pieceEnd(deck.left, endAngleDeg(left, top - bottom, 'left')) : SEAM_END,
    right: to === null ? pieceEnd(deck.right, endAngleDeg(right, top - bottom, 'right')) : SEAM_END,
    front: Math.max(0, right.front - left.front),
    back: Math.max(0, right.back - left.back),
  };
}

/** Whether no seam cuts across an end that leans. */
function betweenEnds(deck: Deck, xs: readonly number[], row: number, bottom: number, top: number): boolean {
  if (xs.length === 0) return true;
  const left = rowEnd(deck.left, null, deck.depth, row, bottom, top);
  const right = rowEnd(deck.right, null, deck.depth, row, bottom, top);
  const from = Math.max(left.back, left.front, left.wing?.[0] ?? -Infinity);
  const to = Math.min(right.back, right.front, right.wing?.[0] ?? Infinity);
  return xs[0]! >= from && xs[xs.length - 1]! <= to;
}

/** The part of an end, or of a seam, that bounds one row. */
function rowEnd(end: DeckEnd, seam: number | null, depth: number, row: number, bottom: number, top: number): DeckEnd {
  if (seam !== null) return { kind: 'edge', back: seam, front: seam, wing: null, finished: false, radius: 0 };
  const front = row === 0 ? end.front : endAt(end, depth, bottom);
  return { ...end, back: top === depth ? end.back : endAt(end, depth, top), front, wing: row === 0 ? end.wing : null };
}

function pieceEnd(end: DeckEnd, angle: number): PieceEnd {
  return {
    kind: end.kind,
    angle,
    finished: end.finished,
    radius: end.radius,
    ...(end.kind === 'waterfall' && { bevel: 45 }),
  };
}

function clipped(deck: Deck, from: number | null, to: number | null, bottom: number, top: number): readonly Polygon[] {
  if (from === null && to === null && bottom === 0 && top === deck.depth) return [deck.outline];
  const winged = deck.left.wing !== null || deck.right.wing !== null;
  if (deck.shape === 'convex' || (deck.shape === 'strip' && !winged)) {
    let rest: Polygon = deck.outline;
    if (from !== null) rest = clipHalfPlane(rest, [from, 1], [from, 0]);
    if (to !== null) rest = clipHalfPlane(rest, [to, 0], [to, 1]);
    if (bottom > 0) rest = clipHalfPlane(rest, [0, bottom], [1, bottom]);
    if (top < deck.depth) rest = clipHalfPlane(rest, [1, top], [0, top]);
    return rest.length > 2 ? [rest] : [];
  }
  const box = boundingBox(deck.outline);
  const [x0, x1] = [from ?? box.minX - 1, to ?? box.maxX + 1];
  const [y0, y1] = [bottom === 0 ? box.minY - 1 : bottom, top === deck.depth ? box.maxY + 1 : top];
  const parts = intersection(deck.outline, [
    [x0, y0],
    [x1, y0],
    [x1, y1],
    [x0, y1],
  ]);
  return [...parts].sort((a, b) => boundingBox(a).minX - boundingBox(b).minX);
}

/** Inches; a corner this near to the cell's side lies on it. */
const ON_SIDE = 1e-6;

function freeCell(outline: Polygon, deck: Deck, from: number | null, to: number | null): CellShape {
  const box = boundingBox(outline);
  const open = (end: DeckEnd, side: 'left' | 'right'): PieceEnd =>
    pieceEnd(end, deck.shape === 'strip' ? endAngleDeg(end, deck.depth, side) : 90);
  return {
    outline,
    left: from !== null && box.minX - from < ON_SIDE ? SEAM_END : open(deck.left, 'left'),
    right: to !== null && to - box.maxX < ON_SIDE ? SEAM_END : open(deck.right, 'right'),
    front: lengthAt(outline, box.minY),
    back: lengthAt(outline, box.maxY),
  };
}

/** Length of the edges that lie along the grain at height y. */
function lengthAt(outline: Polygon, y: number): number {
  let sum = 0;
  outline.forEach((a, i) => {
    const b = outline[(i + 1) % outline.length]!;
    if (Math.abs(a[1] - y) < ON_SIDE && Math.abs(b[1] - y) < ON_SIDE) sum += Math.abs(b[0] - a[0]);
  });
  return sum;
}
