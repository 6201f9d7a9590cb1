import { type Rule } from './facts';
import { finding } from './finding';
import { PRACTICE } from './sources';

/** An open end that is seen and gets no finish, or any open end while no finish is chosen. */
export const endUnfinished: Rule = (facts) =>
  facts.tops.pieces.flatMap((piece) =>
    (['left', 'right'] as const).flatMap((side) => {
      const end = piece[side];
      const bare = facts.layout.finish.kind === 'none';
      if (end.kind !== 'open' || (end.finished && !bare)) return [];
      return [
        finding({
          code: 'end-unfinished',
          severity: 'warn',
          text: `The ${side} end of piece ${piece.letter} is open and gets no finish: end grain drinks and dries fastest.`,
          action: 'Finish that end like the face, with one coat more.',
          at: { pieces: [piece.letter], run: piece.on, detail: `${piece.key} ${side}` },
          source: PRACTICE,
        }),
      ];
    }),
  );
