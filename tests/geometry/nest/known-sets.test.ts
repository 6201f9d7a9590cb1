import { knownInstance } from '@/scripts/bench/nest-instances';
import { checkBound } from '@/shared/nest-check/bound/check-bound';
import { checkPlan } from '@/shared/nest-check/check-plan';
import { seeded } from '@/tests/helpers/random';
import { instance, planOf, rectangle } from '@/tests/helpers/nest-builder';

describe('nest on sets whose best plan is known by construction', () => {
  it.each([1, 2, 3, 4])('puts the pieces of %i slabs back on as many, and proves it by area', (slabs) => {
    for (let seed = 1; seed <= 6; seed++) {
      const given = knownInstance(seed, slabs);
      const plan = planOf(given, 2_000_000);
      expect([given.id, plan.cost, plan.proved, plan.provedScope]).toEqual([given.id, slabs * 40_000, true, 'any']);
      expect([...checkPlan(given, plan), ...checkBound(given, plan)]).toEqual([]);
    }
  });
});

/**
 * E. Falkenauer, A hybrid grouping genetic algorithm for bin packing, J. of Heuristics 2 (1996): triplets are made by rule so
 * that every bin of 1000 is filled exactly by three items: one in [380, 490], one from 250 up to half of what is left, and
 * the rest. t60_00 of that collection has 20 bins by this rule; these are made afresh.
 */
function triplets(seed: number, bins: number): number[] {
  const { below } = seeded(seed);
  return Array.from({ length: bins }, () => {
    const a = 380 + below(111);
    const rest = 1000 - a;
    const b = 250 + below(Math.floor(rest / 2) - 250 + 1);
    return [a, b, rest - b];
  }).flat();
}

describe('nest on one-dimensional bin packing with a known answer', () => {
  it.each([
    [10, 1],
    [10, 2],
    [20, 3],
    [20, 4],
  ])('fills %i bins of 1000 exactly with triplets, as set %i was made', (bins, seed) => {
    const parts = triplets(seed, bins).map((tenth, i) => ({ id: `t${i}`, outline: rectangle(tenth / 10, 25) }));
    const bin = { id: 'bin', length: 100, depth: 25, price: 100, count: null };
    const given = instance({ kerf: 0, trim: 0, stock: [bin], parts });
    const plan = planOf(given, 3_000_000);
    expect([plan.cost, plan.lowerBound, plan.proved]).toEqual([bins * 100, bins * 100, true]);
    expect(checkPlan(given, plan)).toEqual([]);
  });
});
