import type { Piece, Tops } from '../top/types';

/** Pieces that leave the shop as one rigid part, by letter, in the order of the tops. */
export type Section = readonly string[];

/**
 * What is carried in one go: pieces tied by joints that are assembled in the shop. Seams and site joints are closed in
 * the house, so the pieces on both sides of them travel apart.
 *
 * @returns every piece in exactly one section, a piece that is joined to nothing as a section of one
 */
export function assembledSections(tops: Pick<Tops, 'pieces' | 'joints'>): readonly Section[] {
  const parent = new Map(tops.pieces.map((piece) => [piece.letter, piece.letter]));
  const root = (letter: string): string => {
    let at = letter;
    while (parent.get(at) !== undefined && parent.get(at) !== at) at = parent.get(at)!;
    return at;
  };
  for (const joint of tops.joints) {
    const [a, b] = joint.letters;
    if (joint.assembled === 'shop' && parent.has(a) && parent.has(b)) parent.set(root(b), root(a));
  }
  const sections = new Map<string, string[]>();
  for (const piece of tops.pieces) {
    const key = root(piece.letter);
    sections.set(key, [...(sections.get(key) ?? []), piece.letter]);
  }
  return [...sections.values()];
}

/** Longest straight measure of a section, inches: the furthest two corners of its pieces, in the room. */
export function spanOf(pieces: readonly Pick<Piece, 'outline'>[]): number {
  const points = pieces.flatMap((piece) => piece.outline);
  let longest = 0;
  for (let i = 0; i < points.length; i++) {
    for (let j = i + 1; j < points.length; j++) {
      const [a, b] = [points[i]!, points[j]!];
      longest = Math.max(longest, Math.hypot(a[0] - b[0], a[1] - b[1]));
    }
  }
  return longest;
}
