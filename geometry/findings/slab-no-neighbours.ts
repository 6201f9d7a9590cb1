import { type Rule } from './facts';
import { finding } from './finding';
import { meetings } from './slab-neighbours';
import { PRACTICE } from './sources';
import { listText } from './words';

/** A slab that gives several pieces, of which no two meet in the kitchen, so that its color turns up in scattered places. */
export const slabNoNeighbours: Rule = (facts) => {
  const met = meetings(facts);
  if (met.size === 0) return [];
  return (facts.nest?.slabs ?? []).flatMap((slab, i) => {
    const letters = [...new Set(slab.parts.map((part) => part.id))];
    if (letters.length < 2 || letters.some((a) => letters.some((b) => met.get(a)?.has(b)))) return [];
    return [
      finding({
        code: 'slab-no-neighbours',
        severity: 'note',
        text: `Slab ${i + 1} gives ${listText(letters)}, of which no two meet in the kitchen.`,
        action: 'Pick slabs of one color, or move a piece so that neighbors come from one slab.',
        at: { slab: slab.stock, detail: `${i + 1}`, pieces: letters },
        source: PRACTICE,
      }),
    ];
  });
};
