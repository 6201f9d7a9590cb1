import { boundingBox } from '../../core/polygon';
import type { NestCrosscut, NestRip } from '../../nest/types';
import type { PlacedPiece, PlacedSlab } from './placed-slab';

/** What a mark on an edge of the slab is for its piece. */
export type MarkWord = 'long point' | 'short point' | 'end' | 'trim' | 'cut';

/** A place on the slab's top (back) or bottom (front) edge, inches from the left end. */
export interface CutMark {
  readonly cut: number;
  readonly edge: 'top' | 'bottom';
  readonly at: number;
  /** Side of the kerf on which the piece lies. */
  readonly side: 'left' | 'right';
  /** Null for a cut that makes no piece's end. */
  readonly letter: string | null;
  readonly word: MarkWord;
}

/** A first cut that takes less than this off the left end trims it, inches. */
const TRIM = 6;
/** Two ends of a cut within this of each other make a square cut, inches: less than any tape shows. */
const SQUARE = 1 / 128;
/** A cut this near to a piece's end makes it, inches: less than any tape shows, more than the search's slack. */
const SAME = 1 / 256;
/** y this near to an edge of the slab lies on it, inches. */
const ON_EDGE = 1e-3;

export const isSquare = (cut: NestCrosscut): boolean => Math.abs(cut.back - cut.front) < SQUARE;

/** The first cut, square, that only takes a little off the left end. */
export const isTrim = (slab: PlacedSlab, cut: NestCrosscut): boolean =>
  cut.n === 1 && isSquare(cut) && keptSides(slab, cut).join() === 'right' && cut.backFar < TRIM;

/** How far the saw is turned from a square cut, degrees. */
export const offSquareDeg = (cut: NestCrosscut): number => Math.abs(90 - cut.angle);

/**
 * Every mark that is set on the slab's own edges before it is cut; both sides of the kerf where both sides are pieces.
 * A cut that makes no end has no mark of its own where a piece's mark stands on the same place.
 */
export function cutMarks(slab: PlacedSlab): CutMark[] {
  const marks = slab.cuts.flatMap((cut) => (cut.kind === 'crosscut' ? crosscutMarks(slab, cut) : []));
  const named = marks.filter((mark) => mark.letter !== null);
  return marks.filter((mark) => mark.letter !== null || !named.some((other) => samePlace(mark, other)));
}

const samePlace = (a: CutMark, b: CutMark): boolean => a.edge === b.edge && Math.abs(a.at - b.at) < SAME;

function crosscutMarks(slab: PlacedSlab, cut: NestCrosscut): CutMark[] {
  const edges = [
    ...(Math.abs(cut.yBack - slab.depth) < ON_EDGE ? (['top'] as const) : []),
    ...(Math.abs(cut.yFront) < ON_EDGE ? (['bottom'] as const) : []),
  ];
  const sides = keptSides(slab, cut);
  return edges.flatMap((edge) =>
    sides.map((side) => {
      const piece = madeEnd(slab, cut, side);
      const at = lineOf(cut, side)[edge];
      return {
        cut: cut.n,
        edge,
        at,
        side,
        letter: piece?.letter ?? null,
        word: markWord(slab, cut, side, edge, piece),
      };
    }),
  );
}

/** The sides of the kerf that somebody has to keep to: those that are a piece's end, else the one the plan keeps. */
export function keptSides(slab: PlacedSlab, cut: NestCrosscut): readonly [Side, ...Side[]] {
  const [first, ...others] = (['left', 'right'] as const).filter((side) => madeEnd(slab, cut, side) !== null);
  if (first) return [first, ...others];
  if (cut.left !== null && cut.right === null) return ['left'];
  if (cut.right !== null && cut.left === null) return ['right'];
  return [cut.kerfSide === 'right' ? 'left' : 'right'];
}

export type Side = 'left' | 'right';

/** Marks of one side of the kerf on the top and the bottom edge. */
export function lineOf(cut: NestCrosscut, side: 'left' | 'right'): { readonly top: number; readonly bottom: number } {
  return side === 'left' ? { top: cut.back, bottom: cut.front } : { top: cut.backFar, bottom: cut.frontFar };
}

/** The piece whose end this side of the cut is; null where the cut only parts a piece from waste before its end is cut. */
export function madeEnd(slab: PlacedSlab, cut: NestCrosscut, side: 'left' | 'right'): PlacedPiece | null {
  const piece = pieceAt(slab, side === 'left' ? cut.left : cut.right);
  if (!piece) return null;
  const line = lineOf(cut, side);
  // A lane may be ripped again after this cut: the piece's end is as high as the piece, not as the lane.
  const { minY, maxY } = boundingBox(piece.outline);
  const slope = (line.top - line.bottom) / (cut.yBack - cut.yFront);
  const meets = (y: number) => Math.abs(reach(piece, side, y) - (line.bottom + slope * (y - cut.yFront))) < SAME;
  return meets(Math.max(cut.yFront, minY)) && meets(Math.min(cut.yBack, maxY)) ? piece : null;
}

/** Where the piece ends on its side of a cut, at the lower or the upper edge of its lane. */
function reach(piece: PlacedPiece, side: 'left' | 'right', y: number): number {
  const xs = piece.outline.filter((p) => Math.abs(p[1] - y) < SAME).map((p) => p[0]);
  return side === 'left' ? Math.max(...xs) : Math.min(...xs);
}

export function pieceAt(slab: PlacedSlab, index: number | null): PlacedPiece | null {
  return index === null ? null : (slab.pieces[index] ?? null);
}

function markWord(
  slab: PlacedSlab,
  cut: NestCrosscut,
  side: 'left' | 'right',
  edge: 'top' | 'bottom',
  piece: PlacedPiece | null,
): MarkWord {
  if (isTrim(slab, cut)) return 'trim';
  if (!piece) return 'cut';
  if (isSquare(cut)) return 'end';
  const leansRight = cut.back > cut.front;
  const reachesOut = (edge === 'top') === (side === 'left' ? leansRight : !leansRight);
  return reachesOut ? 'long point' : 'short point';
}

/** Pieces that get a long edge from a rip: those under its kerf and those over it. */
export function piecesAtRip(slab: PlacedSlab, cut: NestRip): { below: PlacedPiece[]; above: PlacedPiece[] } {
  const along = slab.pieces.filter((piece) => {
    const box = boundingBox(piece.outline);
    return box.minX < cut.to - SAME && box.maxX > cut.from + SAME;
  });
  return {
    below: along.filter((piece) => Math.abs(boundingBox(piece.outline).maxY - cut.across) < SAME),
    above: along.filter((piece) => Math.abs(boundingBox(piece.outline).minY - cut.acrossFar) < SAME),
  };
}
