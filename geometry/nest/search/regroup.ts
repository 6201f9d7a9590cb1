import { areaCut } from '../bound/area-cut';
import type { Problem } from '../model/problem';
import { patternItems, type Pattern } from '../plan/pattern';
import { createColumnPool, makeColumn, type Column, type RealColumn } from './column';
import { provenCut, type SearchContext } from './context';
import { createMixSearch } from './mix-search';
import { MET, relax } from './relax';

/** Work spent on one mix of a few slabs, and mixes looked at before the group is left as it is. */
const GROUP_EFFORT = 3000;
const GROUP_STEPS = 8;

/**
 * Cuts the parts of a few slabs again from the cheapest slabs for just those parts.
 *
 * @param values - of the items in the whole plan, a first guess
 * @returns cheaper patterns for the same parts, or null when none are found
 */
export function recut(
  context: SearchContext,
  all: readonly Pattern[],
  group: readonly number[],
  values: readonly number[],
): Pattern[] | null {
  const inGroup = new Set(group);
  const own = all.filter((_, i) => inGroup.has(i));
  const problem = groupProblem(
    context.problem,
    all.filter((_, i) => !inGroup.has(i)),
    own,
  );
  const cost = own.reduce((sum, p) => sum + problem.stock[p.stock]!.price, 0);
  const most = problem.fixed.need;
  const relaxed = createColumnPool<Column>();
  const real = createColumnPool<RealColumn>();
  for (const pattern of own) {
    const column = makeColumn(pattern);
    relaxed.add(column);
    real.add(column);
  }
  const part: SearchContext = { ...context, problem, relaxed, real, most };
  const first = relax(part, values, MET);
  if (!first.finished || first.bound >= cost - 1e-6) return null;
  const learnt = { cuts: [{ ...areaCut(problem), proof: null }, provenCut(problem, first)], tooSmall: [] };
  const search = createMixSearch(part, learnt, first.value);
  for (let n = 0; n < GROUP_STEPS; n++) {
    const step = search.step(cost, 0, GROUP_EFFORT);
    if (step.kind === 'found') return [...step.plan.patterns];
    if (step.kind !== 'moved') return null;
  }
  return null;
}

/** Only the group's parts, and only the slabs that the other patterns leave. */
function groupProblem(problem: Problem, others: readonly Pattern[], own: readonly Pattern[]): Problem {
  const need = problem.items.map(() => 0);
  own.forEach((pattern) => patternItems(pattern).forEach((i) => need[i]!++));
  const stock = problem.stock.map((s) => ({
    ...s,
    count: s.count - others.filter((p) => p.stock === s.index).length,
  }));
  return { ...problem, fixed: { copies: [], need, picks: [] }, choices: [], stock };
}

/** Groups of slabs to cut again, in a fixed order that looks random: every slab leads in turn, with one to `most` - 1 others. */
export function* groupsOf(slabs: number, most: number): Generator<number[]> {
  let state = 12345;
  const draw = (n: number): number => {
    state = (Math.imul(state, 1103515245) + 12345) >>> 0;
    return Math.floor((state / 4294967296) * n);
  };
  for (let round = 0; ; round++) {
    const size = Math.min(slabs, 2 + (round % (most - 1)));
    for (let lead = 0; lead < slabs; lead++) {
      const group = new Set([lead]);
      while (group.size < size) group.add(draw(slabs));
      yield [...group];
    }
  }
}
