import type { Point } from '../core/point';
import { boundingBox } from '../core/polygon';
import { extent, toOwn, toRoom, type Deck } from '../top/deck';
import type { BarePiece } from '../top/deck-pieces';
import { spanAt } from '../top/deck-span';
import type { TopSeam } from '../top/types';
import type { PlannedSeam } from './seam-plan';

/** A seam in the room before its pieces have letters. */
export type LaidSeam = Omit<TopSeam, 'letters'> & {
  /** Keys of the pieces on its left and right (an edge seam: in front and behind). */
  readonly keys: readonly [string, string];
};

/** A planned seam as it lies in the room, from its back end to its front end, left to right as seen from the room. */
export function laidSeam(deck: Deck, seam: PlannedSeam, pieces: readonly BarePiece[]): LaidSeam {
  const place = (p: Point) => toRoom(deck.frame, p);
  const common = { on: deck.id, visible: seam.visible, inCutout: seam.inCutout?.id ?? null, pinned: seam.pinned };
  if (seam.kind === 'edge') {
    const [from, to] = edgeSpan(deck, seam.at);
    const keys = [seam.row - 1, seam.row].map((row) => pieces.find((piece) => piece.row === row)?.key ?? '');
    return {
      ...common,
      at: seam.at,
      from: place([from, seam.at]),
      to: place([to, seam.at]),
      keys: [keys[0]!, keys[1]!],
      edge: true,
    };
  }
  const middle = (piece: BarePiece) => toOwn(deck.frame, piece.origin)[0] + boundingBox(piece.shape).maxX / 2;
  const row = pieces.filter((piece) => piece.row === seam.row);
  // Pieces come left to right as seen from the room, which is against own x on the far side of a wall.
  const isLeft = (piece: BarePiece) => deck.sign * (middle(piece) - seam.at) < 0;
  const left = row.filter(isLeft).at(-1);
  const right = row.find((piece) => !isLeft(piece));
  const span = spanAt(deck.outline, seam.at) ?? [0, deck.depth];
  return {
    ...common,
    at: deck.sign * seam.at,
    from: place([seam.at, Math.min(span[1], seam.top)]),
    to: place([seam.at, Math.max(span[0], seam.bottom)]),
    keys: [left?.key ?? '', right?.key ?? ''],
  };
}

/** Where a line along the grain enters and leaves a top. */
function edgeSpan(deck: Deck, y: number): readonly [number, number] {
  const turned = deck.outline.map(([px, py]): Point => [py, px]);
  return spanAt(turned, y) ?? extent(deck);
}
