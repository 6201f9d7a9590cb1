import { size, type Rule } from './facts';
import { finding } from './finding';
import { PRACTICE } from './sources';
import { slabPieces, usableSlabs } from './stock-that-fits';

/** Pieces to cut and no slab of their wood and thickness in the list. */
export const noSlabListed: Rule = (facts) => {
  const pieces = slabPieces(facts);
  if (pieces.length === 0 || usableSlabs(facts).length > 0) return [];
  const { species, thickness } = facts.layout.material;
  return [
    finding({
      code: 'no-slab-listed',
      severity: 'stop',
      text: `${pieces.length} ${pieces.length === 1 ? 'piece is' : 'pieces are'} to be cut and no slab of ${species}, ${size(facts, thickness)} thick, is in the list.`,
      action: 'Add slabs to the stock, or choose a wood and thickness that is there.',
      at: { detail: 'stock' },
      source: PRACTICE,
    }),
  ];
};
