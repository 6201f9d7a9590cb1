import { areaCut } from '../bound/area-cut';
import { cheapestMix, type MixCut } from '../bound/cheapest-mix';
import type { Problem } from '../model/problem';
import type { NestProgress } from '../types';
import type { Pattern } from '../plan/pattern';
import { createPricing } from '../pricing/pricing';
import { createDepthRows } from '../row/depth-rows';
import { createColumnPool, makeColumn, type Column, type RealColumn } from './column';
import type { SearchContext } from './context';
import type { FoundPlan, Learnt } from './mix-search';
import { createLaneTools } from './pack-sections';

/** Branching nodes spent on rounding a bound up to a total that the prices can reach. */
export const MIX_NODES = 100_000;

/** Units of work after which progress is told though nothing better was found. */
const TELL_EVERY = 1000;

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
  readonly onProgress: (progress: NestProgress) => void;
}

/** Best plan, best bound and what both rest on, while a search goes on. */
export interface SearchState {
  readonly context: SearchContext;
  readonly plan: () => FoundPlan | null;
  /** What a better plan must cost less than. */
  readonly below: () => number;
  readonly done: () => boolean;
  readonly spent: () => number;
  readonly raise: (bound: number) => void;
  readonly offer: (patterns: readonly Pattern[], picked: readonly number[]) => void;
  /** Puts other patterns for the same parts at no higher cost in the best plan's place. */
  readonly replace: (patterns: readonly Pattern[]) => void;
  readonly learnt: Learnt;
  readonly result: () => SearchResult;
}

export function createState(problem: Problem, { stop, workLimit, onBetter, onProgress }: SearchLimits): SearchState {
  const rowsAt = createDepthRows(problem);
  let work = 0;
  let best: FoundPlan | null = null;
  let lower = 0;
  let told = 0;
  const tell = (): void => {
    told = work;
    onProgress({ tried: Math.round(work), cost: best?.cost ?? null, lowerBound: result().lower });
  };
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
      if (work >= told + TELL_EVERY) tell();
      return work >= workLimit || stop();
    },
  };
  const area = { ...areaCut(problem), proof: null };
  const learnt: Learnt = { cuts: [area], tooSmall: [] };
  const below = (): number => best?.cost ?? Infinity;
  // Rows know a part by a trapezoid round it: where that is not the part itself, only areas speak for every plan.
  const isExact = problem.items.every((item) => item.exact);
  const result = (): SearchResult =>
    isExact
      ? { plan: best, lower, learnt, work }
      : { plan: best, lower: boundOf(problem, [area], below()), learnt: { cuts: [area], tooSmall: [] }, work };
  return {
    context,
    plan: () => best,
    below,
    spent: () => work,
    done: () => best !== null && lower >= best.cost,
    raise(bound) {
      const raised = Math.min(bound, below());
      if (raised <= lower) return;
      lower = raised;
      tell();
    },
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
      tell();
    },
    replace(patterns) {
      if (best) best = { ...best, patterns };
    },
    learnt,
    result,
  };
}

/** Most copies of an item that any way of settling the choices needs. */
const mostOf = (problem: Problem, i: number): number =>
  problem.choices.reduce((sum, c) => sum + Math.max(...c.options.map((o) => o.need[i]!)), problem.fixed.need[i]!);

/** The cheapest total that the cuts allow, or `below` when nothing under it is left. */
export function boundOf(problem: Problem, cuts: readonly MixCut[], below: number): number {
  const prices = problem.stock.map((s) => s.price);
  const counts = problem.stock.map((s) => s.count);
  const answer = cheapestMix({ prices, counts, cuts, tooSmall: [] }, below, MIX_NODES);
  return answer.kind === 'mix' ? answer.mix.cost : answer.kind === 'none' ? below : answer.bound;
}
