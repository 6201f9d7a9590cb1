import { size, type Rule } from './facts';
import { finding } from './finding';
import { PRACTICE } from './sources';
import { isJobStock } from './stock-that-fits';

/** Slabs in the job's list that it cannot use because their wood or thickness is another. */
export const stockDiffers: Rule = (facts) => {
  const { stock, material } = facts.layout;
  return [...stock.slabs, ...stock.rack].flatMap((slab) => {
    if (isJobStock(facts, slab)) return [];
    const wood = slab.species ?? material.species;
    const thick = size(facts, slab.thickness ?? material.thickness);
    return [
      finding({
        code: 'stock-differs',
        severity: 'note',
        text: `Slab ${slab.id} is ${wood}, ${thick} thick; this job is ${material.species}, ${size(facts, material.thickness)}.`,
        action: 'It is left out of the plan. Take it off the list, or correct its entry.',
        at: { slab: slab.id },
        source: PRACTICE,
      }),
    ];
  });
};
