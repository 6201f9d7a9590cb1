import { cheapestMix } from './bound/cheapest-mix';
import { normalise } from './model/normalise';
import type { Copy, Problem } from './model/problem';
import { problem as report } from './model/validate';
import { assemble } from './plan/assemble';
import { chosen, evidenceFor, priceTags } from './plan/certificate';
import type { FoundPlan } from './search/mix-search';
import { search } from './search/search';
import type { SearchResult } from './search/search-state';
import type { NestError, NestInstance, NestOptions, NestPlan } from './types';

/** Units of work when the caller sets no limit: some ten seconds on a small machine. */
const DEFAULT_WORK = 5_000_000;

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
    onProgress: (progress) => options.onProgress?.(progress),
    onBetter: (plan, soFar) => options.onBetter?.(finished(problem, plan, soFar, false), soFar.lower),
  });
  if (!result.plan)
    return report(
      'not_enough_stock',
      ['stock'],
      'There are not enough slabs for all parts: add stock or raise a count.',
    );
  return finished(problem, result.plan, result, options.evidence ?? false);
}

function finished(problem: Problem, plan: FoundPlan, result: SearchResult, withEvidence: boolean): NestPlan {
  const { patterns, picked, cost } = plan;
  const { lower, learnt, work } = result;
  const copies = [problem.fixed, ...picked.map((o, c) => problem.choices[c]!.options[o]!)].flatMap((o) => o.copies);
  const duals = learnt.cuts.findLast((cut) => cut.proof)?.proof?.value;
  const tags = priceTags(problem, duals ?? areaShares(problem, copies, cost), copies);
  const byArea = areaSuffices(problem, result);
  const evidence = withEvidence ? { evidence: evidenceFor(problem, lower, learnt) } : {};
  return {
    instance: problem.instance.id,
    slabs: assemble(problem, patterns, picked),
    choices: chosen(problem, picked),
    cost,
    lowerBound: lower,
    gap: cost === lower ? 0 : (cost - lower) / lower,
    proved: cost === lower,
    provedScope: byArea ? 'any' : 'class',
    certificate: byArea ? { kind: 'area' } : { kind: 'duals', values: tags, ...evidence },
    priceTags: tags,
    work,
  };
}

/** Where nothing finer is known, each part costs its share of the area cut. */
function areaShares({ items }: Problem, copies: readonly Copy[], cost: number): number[] {
  const total = copies.reduce((sum, { item }) => sum + items[item]!.area, 0);
  return items.map((item) => (cost * item.area) / (total || 1));
}

/** The areas of parts and slabs alone prove the bound: it then holds for every plan, not only for those of the class. */
function areaSuffices(problem: Problem, { learnt, lower }: SearchResult): boolean {
  const area = learnt.cuts.filter((cut) => cut.proof === null);
  const prices = problem.stock.map((s) => s.price);
  const counts = problem.stock.map((s) => s.count);
  return cheapestMix({ prices, counts, cuts: area, tooSmall: [] }, lower, 20_000).kind === 'none';
}
