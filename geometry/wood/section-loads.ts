import type { Piece, Tops } from '../top/types';
import type { Hands } from './hands';
import { handsFor } from './hands';
import { assembledSections, spanOf, type Section } from './sections';

/** What one carry weighs and how many it takes. */
export interface SectionLoad {
  readonly letters: Section;
  readonly weightLb: number;
  /** Longest straight measure, inches. */
  readonly span: number;
  readonly hands: Hands;
}

/** Loads of all sections as they leave the shop, in the order of the tops. */
export function sectionLoads(
  tops: Pick<Tops, 'pieces' | 'joints'>,
  pieces: readonly (Piece & { readonly weight: number })[],
): readonly SectionLoad[] {
  const byLetter = new Map(pieces.map((piece) => [piece.letter, piece]));
  return assembledSections(tops).map((letters) => {
    const parts = letters.flatMap((letter) => byLetter.get(letter) ?? []);
    const weightLb = parts.reduce((sum, part) => sum + part.weight, 0);
    const span = spanOf(parts);
    return { letters, weightLb, span, hands: handsFor(weightLb, span) };
  });
}
