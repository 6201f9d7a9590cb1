import { type Rule } from './facts';
import { finding } from './finding';
import { PRACTICE } from './sources';
import { usableSlabs } from './stock-that-fits';

/** Fewer slabs than the pieces need: the nest found no way, or its plan takes more of one slab than there are. */
export const slabsShort: Rule = (facts) => {
  const source = PRACTICE;
  if (facts.nestProblem?.code === 'not_enough_stock') {
    return [
      finding({
        code: 'slabs-short',
        severity: 'stop',
        text: facts.nestProblem.message,
        action: 'Add slabs to the stock, or drop a piece.',
        at: { detail: 'stock' },
        source,
      }),
    ];
  }
  const used = new Map<string, number>();
  for (const { stock } of facts.nest?.slabs ?? []) used.set(stock, (used.get(stock) ?? 0) + 1);
  return usableSlabs(facts).flatMap(({ id, count }) => {
    const needs = used.get(id) ?? 0;
    if (count === null || needs <= count) return [];
    return [
      finding({
        code: 'slabs-short',
        severity: 'stop',
        text: `The plan takes ${needs} of slab ${id} and there ${count === 1 ? 'is' : 'are'} ${count}.`,
        action: 'Order more of it, or let the plan search again.',
        at: { slab: id },
        source,
      }),
    ];
  });
};
