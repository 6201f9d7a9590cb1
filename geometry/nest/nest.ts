import { areaCut } from './bound/area-cut';
import { cheapestMix } from './bound/cheapest-mix';
import { normalise } from './model/normalise';
import { demandOf, type Problem } from './model/problem';
import { problem as report } from './model/validate';
import { assemble } from './plan/assemble';
import type { Pattern } from './plan/pattern';
import { createDepthRows } from './row/depth-rows';
import { greedy } from './search/greedy';
import type { NestError, NestInstance, NestOptions, NestPlan } from './types';

/** Branching nodes spent on rounding a bound up to a price that can occur. */
const MIX_NODES = 200_000;

/**
 * Lays the parts on the cheapest set of slabs found, with the saw cuts that free them and a lower bound on any plan's cost.
 * Deterministic: the same instance and work limit give the same plan.
 *
 * @returns the best plan, or an error in a sentence when there is none
 */
export function nest(instance: NestInstance, options: NestOptions = {}): NestPlan | NestError {
  const problem = normalise(instance);
  if ('error' in problem) return problem;
  const rowsAt = createDepthRows(problem);
  let best: { patterns: Pattern[]; picked: number[]; cost: number } | null = null;
  for (const picked of settledChoices(problem)) {
    const patterns = greedy(problem, rowsAt, demandOf(problem, picked));
    const cost = patterns?.reduce((sum, p) => sum + problem.stock[p.stock]!.price, 0) ?? Infinity;
    if (patterns && (!best || cost < best.cost)) best = { patterns, picked, cost };
  }
  if (!best)
    return report(
      'not_enough_stock',
      ['stock'],
      'There are not enough slabs for all parts: add stock or raise a count.',
    );
  const { patterns, picked, cost } = best;
  const prices = problem.stock.map((s) => s.price);
  const counts = problem.stock.map((s) => s.count);
  const answer = cheapestMix({ prices, counts, cuts: [areaCut(problem)], tooSmall: [] }, cost, MIX_NODES);
  const lowerBound = answer.kind === 'mix' ? answer.mix.cost : answer.kind === 'none' ? cost : answer.bound;
  const plan: NestPlan = {
    instance: instance.id,
    slabs: assemble(problem, patterns, picked),
    choices: picked.flatMap((o, c) => problem.choices[c]!.options[o]!.picks),
    cost,
    lowerBound,
    gap: cost === lowerBound ? 0 : (cost - lowerBound) / lowerBound,
    proved: cost === lowerBound,
    provedScope: 'any',
    certificate: { kind: 'area' },
    priceTags: [],
    work: 0,
  };
  options.onBetter?.(plan, lowerBound);
  return plan;
}

/** Option numbers to try, choice by choice: every option once, the others at their first. */
function settledChoices(problem: Problem): number[][] {
  const first = problem.choices.map(() => 0);
  return [
    first,
    ...problem.choices.flatMap((choice, c) =>
      choice.options.slice(1).map((_, o) => first.map((p, i) => (i === c ? o + 1 : p))),
    ),
  ];
}
