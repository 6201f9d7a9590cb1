import { normalise } from './model/normalise';
import type { Problem } from './model/problem';
import { problem as report } from './model/validate';
import { assemble } from './plan/assemble';
import type { FoundPlan } from './search/mix-search';
import { search } from './search/search';
import type { NestError, NestInstance, NestOptions, NestPlan } from './types';

/** Units of work when the caller sets no limit: some ten seconds on a small machine. */
const DEFAULT_WORK = 10_000_000;

/**
 * Lays the parts on the cheapest set of slabs, with the saw cuts that free them and a lower bound on what any plan costs.
 * A first plan is told at once, better ones as they are found. Deterministic: the same instance and work limit give the
 * same plan, unless `stop` ends the search.
 *
 * @returns the best plan, or an error in a sentence when there is none
 */
export function nest(instance: NestInstance, options: NestOptions = {}): NestPlan | NestError {
  const problem = normalise(instance);
  if ('error' in problem) return problem;
  const result = search(problem, {
    stop: options.stop ?? (() => false),
    workLimit: options.workLimit ?? DEFAULT_WORK,
    onBetter: (plan, lower) => options.onBetter?.(finished(problem, plan, lower, 0), lower),
  });
  if (!result.plan)
    return report(
      'not_enough_stock',
      ['stock'],
      'There are not enough slabs for all parts: add stock or raise a count.',
    );
  return finished(problem, result.plan, result.lower, result.work);
}

function finished(problem: Problem, { patterns, picked, cost }: FoundPlan, lower: number, work: number): NestPlan {
  return {
    instance: problem.instance.id,
    slabs: assemble(problem, patterns, picked),
    choices: picked.flatMap((o, c) => problem.choices[c]!.options[o]!.picks),
    cost,
    lowerBound: lower,
    gap: cost === lower ? 0 : (cost - lower) / lower,
    proved: cost === lower,
    provedScope: 'class',
    certificate: { kind: 'area' },
    priceTags: [],
    work,
  };
}
