import { type Rule } from './facts';
import { finding } from './finding';
import { PRACTICE } from './sources';
import { sizePair } from './words';

/** A piece beside a seam that is too short to hold and to look right. */
export const shortPiece: Rule = (facts) =>
  facts.tops.pieces.flatMap((piece) => {
    const beside = piece.left.kind === 'seam' || piece.right.kind === 'seam';
    const longest = Math.max(piece.back, piece.front);
    const least = facts.settings.seams.shortestPiece;
    if (!beside || longest >= least) return [];
    const [is, limit] = sizePair(longest, least, facts.layout.step);
    return [
      finding({
        code: 'short-piece',
        severity: 'warn',
        text: `Piece ${piece.letter} is only ${is} long; ${limit} is the shortest a seam may leave.`,
        action: 'Move the seam so that the piece gets longer.',
        at: { pieces: [piece.letter], run: piece.on, detail: piece.key },
        source: PRACTICE,
      }),
    ];
  });
