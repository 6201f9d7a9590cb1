import { type Rule } from './facts';
import { finding } from './finding';
import { PRACTICE } from './sources';
import { listText } from './words';

/** Pieces laid face down on slabs that have only one good face. */
export const faceDown: Rule = (facts) => {
  const { stock, material } = facts.layout;
  const facesOf = new Map([...stock.slabs, ...stock.rack].map((slab) => [slab.id, slab.faces ?? material.faces]));
  return (facts.nest?.slabs ?? []).flatMap((slab, i) => {
    if ((facesOf.get(slab.stock) ?? material.faces) === 'both') return [];
    const over = slab.parts.filter((part) => part.turnedOver).map((part) => part.id);
    if (over.length === 0) return [];
    return [
      finding({
        code: 'face-down',
        severity: 'stop',
        text: `Slab ${i + 1} has one good face, and ${listText(over)} ${over.length > 1 ? 'lie' : 'lies'} face down on it.`,
        action: 'Forbid turning over, or order slabs with both faces good.',
        at: { slab: slab.stock, detail: `${i + 1}`, pieces: over },
        source: PRACTICE,
      }),
    ];
  });
};
