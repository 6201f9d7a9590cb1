import { boundingBox } from '../core/polygon';
import { size, type Rule } from './facts';
import { finding } from './finding';
import { PRACTICE } from './sources';
import { slabPieces, usableSlabs } from './stock-that-fits';
import { sizePair } from './words';

/** Float dust: a piece as long as the slab itself is cut from it. */
const DUST = 1e-6;

/** A piece that no slab in the list is long or deep enough for. */
export const pieceOverSlab: Rule = (facts) => {
  const slabs = usableSlabs(facts);
  if (slabs.length === 0) return [];
  const longest = Math.max(...slabs.map((slab) => slab.length));
  const deepest = Math.max(...slabs.map((slab) => slab.depth));
  return slabPieces(facts).flatMap((piece) => {
    const box = boundingBox(piece.shape);
    const [length, depth] = [box.maxX - box.minX, box.maxY - box.minY];
    if (slabs.some((slab) => length <= slab.length + DUST && depth <= slab.depth + DUST)) return [];
    const deep = depth > deepest + DUST;
    const [is, limit] = deep
      ? sizePair(depth, deepest, facts.layout.step)
      : sizePair(length, longest, facts.layout.step);
    const both = !deep && length <= longest + DUST;
    return [
      finding({
        code: 'piece-over-slab',
        severity: 'stop',
        text: both
          ? `Piece ${piece.letter} is ${size(facts, length)} by ${size(facts, depth)}; no slab is both ${size(facts, length)} long and ${size(facts, depth)} deep.`
          : `Piece ${piece.letter} is ${is} ${deep ? 'deep' : 'long between its long points'}; the ${deep ? 'deepest' : 'longest'} slab gives ${limit}${deep ? '' : ' after trimming'}.`,
        action: deep ? 'Order a deeper slab, or make the top less deep.' : 'Place a seam, or order a longer slab.',
        at: { pieces: [piece.letter], run: piece.on, detail: piece.key },
        source: PRACTICE,
      }),
    ];
  });
};
