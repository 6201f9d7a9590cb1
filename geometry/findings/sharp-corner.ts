import { constant, sourceText } from '../wood/sourced';
import { lettersOn, size, type Facts, type Rule } from './facts';
import { finding } from './finding';
import type { Finding } from './types';
import { sizePair } from './words';

export const CORNER_RADIUS = constant(
  'Radius of a corner that people walk past',
  1 / 2,
  'in',
  'our choice',
  'NKBA guidelines ask for clipped or round corners and give no radius',
);

/** Corners that stand out into the room with no radius or clip. */
export const sharpCorner: Rule = (facts) => [...openEnds(facts), ...islands(facts)];

function openEnds(facts: Facts): readonly Finding[] {
  return facts.tops.pieces.flatMap((piece) =>
    (['left', 'right'] as const).flatMap((side) => {
      const end = piece[side];
      if (piece.kind === 'island' || end.kind !== 'open' || end.radius >= CORNER_RADIUS.value) return [];
      return [
        sharp(facts, `The ${side} end of piece ${piece.letter}`, end.radius, {
          run: piece.on,
          pieces: [piece.letter],
          detail: `${piece.key} ${side}`,
        }),
      ];
    }),
  );
}

function islands(facts: Facts): readonly Finding[] {
  return facts.layout.islands.flatMap((island) => {
    const corner = island.corner ?? 0;
    if (island.shape === 'free' || corner >= CORNER_RADIUS.value) return [];
    const letters = lettersOn(facts, island.id);
    if (letters.length === 0) return [];
    return [sharp(facts, `Island ${letters.join(', ')}`, corner, { run: island.id, pieces: letters })];
  });
}

function sharp(facts: Facts, what: string, radius: number, at: Finding['at']): Finding {
  const [is, limit] = sizePair(radius, CORNER_RADIUS.value, facts.layout.step);
  return finding({
    code: 'sharp-corner',
    severity: 'note',
    text: `${what} has corners of ${is} radius; ${limit} or a clip spares hips and children's heads.`,
    action: `Round it to ${size(facts, CORNER_RADIUS.value)} or more, or clip it.`,
    at,
    source: sourceText(CORNER_RADIUS),
  });
}
