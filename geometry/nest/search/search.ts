import { areaCut } from '../bound/area-cut';
import { cheapestMix } from '../bound/cheapest-mix';
import { demandOf, type Problem } from '../model/problem';
import type { Pattern } from '../plan/pattern';
import { createPricing } from '../pricing/pricing';
import { createDepthRows } from '../row/depth-rows';
import { createColumnPool, makeColumn, type Column, type RealColumn } from './column';
import { provenCut, type ProvenCut, type SearchContext } from './context';
import { dive, realiseUsed } from './dive';
import type { Generation } from './generate-columns';
import { greedy } from './greedy';
import { createMixSearch, type FoundPlan, type Learnt, type MixSearch } from './mix-search';
import { createLaneTools } from './pack-sections';
import { groupsOf, recut } from './regroup';
import { areaValues, MET, relax } from './relax';

const MIX_NODES = 100_000;
/** Nodes spent on a mix at first sight; each later visit to an undecided one spends four times more. */
const FIRST_NODES = 20_000;
/** Bound and objective this share apart are near enough for a first dive. */
const ROUGH = 0.02;
/** Groups of slabs cut again between two mixes. */
const GROUPS_PER_ROUND = 12;

export interface SearchResult {
  readonly plan: FoundPlan | null;
  readonly lower: number;
  /** Inequalities and exhausted mixes that prove the bound. */
  readonly learnt: Learnt;
  readonly work: number;
}

export interface SearchLimits {
  readonly stop: () => boolean;
  readonly workLimit: number;
  readonly onBetter: (plan: FoundPlan, soFar: SearchResult) => void;
}

/** Looks for the cheapest plan of the class until it is proved, or until the limits say stop. */
export function search(problem: Problem, limits: SearchLimits): SearchResult {
  const state = createState(problem, limits);
  const { context } = state;
  for (const picked of settledChoices(problem)) {
    const patterns = greedy(problem, context.rowsAt, demandOf(problem, picked));
    if (patterns) state.offer(patterns, picked);
    if (context.spend(1)) break;
  }
  const learn = (...cuts: ProvenCut[]): boolean => {
    state.learnt.cuts.push(...cuts);
    state.raise(boundOf(problem, state.learnt.cuts, state.below()));
    return state.done() || context.spend(0);
  };
  if (learn()) return state.result();
  const rough = relax(context, areaValues(context), ROUGH);
  if (learn(provenCut(problem, rough))) return state.result();
  plunge(state, rough);
  const first = relax(context, rough.value, MET);
  if (!learn(provenCut(problem, first)))
    improve(state, createMixSearch(context, state.learnt, first.value), first.value);
  return state.result();
}

/** A first good plan, by diving from the relaxation with the options of the cheapest mix. */
function plunge({ context, learnt, below, offer }: State, first: Generation): void {
  const { problem } = context;
  const prices = problem.stock.map((s) => s.price);
  const counts = problem.stock.map((s) => s.count);
  const answer = cheapestMix({ prices, counts, ...learnt }, below(), MIX_NODES);
  if (answer.kind !== 'mix') return;
  const { picked } = answer.mix;
  const demand = demandOf(problem, picked);
  realiseUsed(context, first, demand);
  const columns = dive(context, demand, counts, below());
  if (columns)
    offer(
      columns.map((c) => c.pattern),
      picked,
    );
}

/** Mixes from the cheapest on; while they stay undecided, dives and regroups for a better plan in between. */
function improve(state: State, mixes: MixSearch, values: readonly number[]): void {
  const { context } = state;
  let groups: Generator<number[]> | null = null;
  let nodes = FIRST_NODES;
  for (;;) {
    const step = mixes.step(state.below(), nodes);
    state.raise(mixes.lower());
    if (step.kind === 'found') state.offer(step.plan.patterns, step.plan.picked);
    state.raise(mixes.lower());
    if (state.done() || step.kind === 'out of work' || context.spend(0)) return;
    if (mixes.undecided.length === 0 && step.kind === 'moved') continue;
    groups = regroup(state, groups, values);
    if (step.kind === 'done') {
      nodes *= 4;
      mixes.reopen();
    }
    if (state.done() || context.spend(0)) return;
  }
}

/** A round of cutting a few slabs again; begins a new order of groups whenever the plan has changed. */
function regroup(
  state: State,
  groups: Generator<number[]> | null,
  values: readonly number[],
): Generator<number[]> | null {
  let order = groups;
  for (let n = 0; n < GROUPS_PER_ROUND; n++) {
    const plan = state.plan();
    if (!plan || plan.patterns.length < 2 || state.context.spend(0)) return null;
    order ??= groupsOf(plan.patterns.length, 4);
    const group = order.next().value as number[];
    const better = recut(state.context, plan.patterns, group, values);
    if (!better) continue;
    const kept = plan.patterns.filter((_, i) => !group.includes(i));
    state.offer([...kept, ...better], plan.picked);
    order = null;
    if (state.done()) return null;
  }
  return order;
}

interface State {
  readonly context: SearchContext;
  readonly plan: () => FoundPlan | null;
  /** What a better plan must cost less than. */
  readonly below: () => number;
  readonly done: () => boolean;
  readonly raise: (bound: number) => void;
  readonly offer: (patterns: readonly Pattern[], picked: readonly number[]) => void;
  readonly learnt: Learnt;
  readonly result: () => SearchResult;
}

function createState(problem: Problem, { stop, workLimit, onBetter }: SearchLimits): State {
  const rowsAt = createDepthRows(problem);
  let work = 0;
  let best: FoundPlan | null = null;
  let lower = 0;
  const context: SearchContext = {
    problem,
    rowsAt,
    lanesAt: createLaneTools(problem, rowsAt),
    pricing: createPricing(problem, rowsAt),
    relaxed: createColumnPool<Column>(),
    real: createColumnPool<RealColumn>(),
    most: problem.items.map((_, i) => mostOf(problem, i)),
    spend(units) {
      work += units;
      return work >= workLimit || stop();
    },
  };
  const learnt: Learnt = { cuts: [{ ...areaCut(problem), proof: null }], tooSmall: [] };
  const below = (): number => best?.cost ?? Infinity;
  const result = (): SearchResult => ({ plan: best, lower, learnt, work });
  return {
    context,
    plan: () => best,
    below,
    done: () => best !== null && lower >= best.cost,
    raise: (bound) => void (lower = Math.max(lower, Math.min(bound, below()))),
    offer(patterns, picked) {
      const cost = patterns.reduce((sum, p) => sum + problem.stock[p.stock]!.price, 0);
      for (const pattern of patterns) {
        const column = makeColumn(pattern);
        context.relaxed.add(column);
        context.real.add(column);
      }
      if (cost >= below()) return;
      best = { patterns, picked, cost };
      onBetter(best, result());
    },
    learnt,
    result,
  };
}

/** Most copies of an item that any way of settling the choices needs. */
const mostOf = (problem: Problem, i: number): number =>
  problem.choices.reduce((sum, c) => sum + Math.max(...c.options.map((o) => o.need[i]!)), problem.fixed.need[i]!);

function boundOf(problem: Problem, cuts: readonly ProvenCut[], below: number): number {
  const prices = problem.stock.map((s) => s.price);
  const counts = problem.stock.map((s) => s.count);
  const answer = cheapestMix({ prices, counts, cuts, tooSmall: [] }, below, MIX_NODES);
  return answer.kind === 'mix' ? answer.mix.cost : answer.kind === 'none' ? below : answer.bound;
}

/** Option numbers to try at once: every option with the others at their first. */
function settledChoices(problem: Problem): number[][] {
  const first = problem.choices.map(() => 0);
  const others = problem.choices.flatMap((choice, c) =>
    choice.options.slice(1).map((_, o) => first.map((p, i) => (i === c ? o + 1 : p))),
  );
  return [first, ...others];
}
