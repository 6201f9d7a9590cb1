import { roundLength, type DisplayStep } from '@/geometry/tape/format-length';
import type { Plan } from '@/geometry/plan/types';

/** What became of one piece between two plans. */
export type PieceDifference =
  | { readonly kind: 'new'; readonly letter: string; readonly back: number; readonly front: number }
  | { readonly kind: 'gone'; readonly letter: string }
  | {
      readonly kind: 'changed';
      readonly letter: string;
      readonly back: readonly [before: number, now: number];
      readonly front: readonly [before: number, now: number];
      readonly depth: readonly [before: number, now: number];
    };

/** Whether two lengths read the same on a tape. */
export const sameOnTape = (a: number, b: number, step: DisplayStep): boolean =>
  roundLength(a, step) === roundLength(b, step);

/** Pieces that are new, gone or of another size to the step, in the order of their letters. */
export function pieceDifferences(before: Plan, now: Plan, step: DisplayStep): PieceDifference[] {
  const then = new Map(before.pieces.map((piece) => [piece.letter, piece]));
  const kept = new Set(now.pieces.map((piece) => piece.letter));
  const differ = (a: number, b: number) => !sameOnTape(a, b, step);
  const found = now.pieces.flatMap((piece): PieceDifference[] => {
    const old = then.get(piece.letter);
    if (!old) return [{ kind: 'new', letter: piece.letter, back: piece.back, front: piece.front }];
    if (!differ(old.back, piece.back) && !differ(old.front, piece.front) && !differ(old.depth, piece.depth)) return [];
    return [
      {
        kind: 'changed',
        letter: piece.letter,
        back: [old.back, piece.back],
        front: [old.front, piece.front],
        depth: [old.depth, piece.depth],
      },
    ];
  });
  const gone = before.pieces
    .filter((piece) => !kept.has(piece.letter))
    .map((piece): PieceDifference => ({ kind: 'gone', letter: piece.letter }));
  return [...found, ...gone].sort((a, b) => a.letter.localeCompare(b.letter, 'en', { numeric: true }));
}
