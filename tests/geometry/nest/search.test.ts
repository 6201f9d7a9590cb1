import { cheapestMix } from '@/geometry/nest/bound/cheapest-mix';
import { normalise } from '@/geometry/nest/model/normalise';
import { nest } from '@/geometry/nest/nest';
import type { Pattern } from '@/geometry/nest/plan/pattern';
import { makeColumn } from '@/geometry/nest/search/column';
import { createState } from '@/geometry/nest/search/search-state';
import { cutTrimmed, trimColumn } from '@/geometry/nest/search/trim-column';
import type { NestProgress } from '@/geometry/nest/types';
import { mixedInstance } from '@/scripts/bench/nest-instances';
import { checkPlan } from '@/shared/nest-check/check-plan';
import { instance, planOf, rectangle, run } from '@/tests/helpers/nest-builder';

describe('the search of a nest', () => {
  it.each([
    [7, 12, 8, 6],
    [1, 12, 20, 0],
    [2, 20, 40, 0],
  ])('ends at its limit of work, set %i of %i runs, %i strips and %i offcuts', (seed, runs, strips, offcuts) => {
    const given = mixedInstance(seed, runs, strips, offcuts);
    for (const limit of [500, 20_000, 60_000]) {
      const plan = planOf(given, limit);
      expect(plan.work).toBeLessThan(limit + 20_000);
      expect(plan.lowerBound).toBeLessThanOrEqual(plan.cost);
      expect(checkPlan(given, plan)).toEqual([]);
    }
  });

  it('tells its progress: more tried, costs only falling, bounds only rising, the last ones those of the plan', () => {
    const told: NestProgress[] = [];
    const plan = nest(mixedInstance(3, 12, 8, 6), { workLimit: 60_000, onProgress: (p) => told.push(p) });
    if ('error' in plan) throw new Error(plan.error.message);
    expect(told.length).toBeGreaterThan(10);
    for (let i = 1; i < told.length; i++) {
      expect(told[i]!.tried).toBeGreaterThanOrEqual(told[i - 1]!.tried);
      expect(told[i]!.cost ?? Infinity).toBeLessThanOrEqual(told[i - 1]!.cost ?? Infinity);
      expect(told[i]!.lowerBound).toBeGreaterThanOrEqual(told[i - 1]!.lowerBound);
    }
    expect(told[told.length - 1]).toMatchObject({ cost: plan.cost, lowerBound: plan.lowerBound });
  });
});

describe('a pattern trimmed to what is left', () => {
  const parts = [
    run('A', 40),
    run('B', 30),
    run('C', 20),
    { id: 's', count: 6, outline: rectangle(20, 4) },
    { id: 't', outline: rectangle(18, 8) },
  ];
  const problem = normalise(instance({ parts }));
  if ('error' in problem) throw new Error(problem.error.message);
  const { context } = createState(problem, {
    stop: () => false,
    workLimit: Infinity,
    onBetter: () => undefined,
    onProgress: () => undefined,
  });
  const entry = (item: number) => ({ item, move: 0 }) as const;
  const pattern: Pattern = {
    stock: 0,
    slots: [entry(0), entry(1), { length: 20, lanes: [{ depth: 4, entries: [entry(3)] }] }],
  };
  const whole = makeColumn(pattern);

  it('stays as it is while everything in it is wanted', () => {
    expect(trimColumn(whole, [1, 1, 1, 6, 1])?.counts).toEqual(whole.counts);
    expect(cutTrimmed(context, trimColumn(whole, [1, 1, 1, 6, 1])!, [9, 9, 9, 1, 1], [1, 1, 1, 6, 1])).toBe(whole);
  });

  it('is nothing when nothing in it is wanted', () => {
    expect(trimColumn(whole, [0, 0, 1, 0, 1])).toBeNull();
  });

  it('loses what is not wanted and takes what fits in its place', () => {
    // The 30 in run is cut already: the 20 in run comes in, and beside it six strips at 40 are worth more than four and t at 70.
    const left = [1, 0, 1, 6, 1];
    const cut = cutTrimmed(context, trimColumn(whole, left)!, [400, 300, 200, 40, 70], left)!;
    expect(cut.items).toEqual([0, 2, 3]);
    expect(cut.counts).toEqual([1, 1, 6]);
  });
});

describe('the cheapest mix of slabs', () => {
  it('is found when one kind of slab is worth next to nothing: its number is no loop without an end', () => {
    const cuts = [{ worth: [1e-9, 50], need: 100, optionNeed: [] }];
    const answer = cheapestMix({ prices: [1, 700], counts: [Infinity, Infinity], cuts, tooSmall: [] }, Infinity, 1e5);
    expect(answer).toEqual({ kind: 'mix', mix: { cost: 1400, slabs: [0, 2], picked: [] } });
  });
});
