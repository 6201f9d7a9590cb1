import { areaCut } from '../bound/area-cut';
import type { Problem, Stock } from '../model/problem';
import { cutTree } from '../plan/cut-tree';
import { longestKept, offcutsOf } from '../plan/offcuts';
import { patternItems, type Pattern } from '../plan/pattern';
import { createPricing } from '../pricing/pricing';
import { createColumnPool, makeColumn, type Column, type RealColumn } from './column';
import type { SearchContext } from './context';
import { createMixSearch } from './mix-search';
import { areaValues } from './relax';

/** Inches to which the longest offcut is found, work for one try, and mixes looked at in one. */
const FINE = 0.5;
const TRY_EFFORT = 4000;
const TRY_STEPS = 4;

/** Length of the longest full-depth offcut of a plan that is worth keeping; 0 when there is none. */
export function longestOffcut(problem: Problem, patterns: readonly Pattern[]): number {
  const { kerf, instance } = problem;
  return patterns.reduce((most, pattern) => {
    const { slab, trim } = problem.stock[pattern.stock]!;
    const tree = cutTree(problem, pattern);
    return tree ? Math.max(most, longestKept(offcutsOf(tree, slab, trim, kerf, instance.reuseMin))) : most;
  }, 0);
}

/**
 * The same parts from the same slabs, with the longest offcut that the effort finds: one slab is taken to be shorter, and
 * the length by which it can be is halved in on.
 *
 * @returns patterns with a longer offcut, or null when none are found
 */
export function lengthenOffcut(context: SearchContext, patterns: readonly Pattern[]): Pattern[] | null {
  const { problem } = context;
  let best: readonly Pattern[] = patterns;
  let longest = longestOffcut(problem, patterns);
  const entries = [...new Set(patterns.map((p) => p.stock))].map((s) => problem.stock[s]!);
  for (const stock of entries.sort((a, b) => b.usable - a.usable || a.index - b.index)) {
    if (stock.slab.defects?.length) continue;
    let low = Math.max(longest, problem.instance.reuseMin - FINE);
    let high = Math.min(stock.usable, spareLength(problem, patterns, stock));
    // The first step is the smallest: most slabs have nothing more to give.
    for (let goal = low + FINE; goal < high && !context.spend(0); goal = (low + high) / 2) {
      const found = cutWithOffcut(context, patterns, stock, goal);
      const length = found ? longestOffcut(problem, found) : 0;
      if (found && length > longest) {
        best = found;
        longest = length;
        low = Math.max(goal, length);
      } else high = goal;
      if (high - low <= FINE) break;
    }
  }
  return best === patterns ? null : [...best];
}

/** Length of slab that the areas leave over in all. */
function spareLength(problem: Problem, patterns: readonly Pattern[], { depth }: Stock): number {
  const had = patterns.reduce((sum, { stock }) => sum + problem.stock[stock]!.usable * problem.stock[stock]!.depth, 0);
  const used = patterns.flatMap(patternItems).reduce((sum, i) => sum + problem.items[i]!.area, 0);
  return (had - used) / depth;
}

/** The parts cut again when one of these slabs lacks an offcut of this length and the cut that frees it. */
function cutWithOffcut(
  context: SearchContext,
  patterns: readonly Pattern[],
  stock: Stock,
  offcut: number,
): Pattern[] | null {
  const problem = shortened(context.problem, patterns, stock, offcut + context.problem.kerf);
  const short = problem.stock.length - 1;
  const toShort = (s: number): number => (s === short ? stock.index : s);
  const relaxed = createColumnPool<Column>();
  const real = createColumnPool<RealColumn>();
  for (const pattern of patterns) {
    relaxed.add(makeColumn(pattern));
    real.add(makeColumn(pattern));
  }
  const pricing = createPricing(problem, context.rowsAt);
  const part: SearchContext = { ...context, problem, pricing, relaxed, real, most: problem.fixed.need };
  const search = createMixSearch(
    part,
    { cuts: [{ ...areaCut(problem), proof: null }], tooSmall: [] },
    areaValues(part),
  );
  for (let n = 0; n < TRY_STEPS; n++) {
    const step = search.step(Infinity, 0, TRY_EFFORT);
    if (step.kind === 'found') return step.plan.patterns.map((p) => ({ ...p, stock: toShort(p.stock) }));
    if (step.kind !== 'moved') return null;
  }
  return null;
}

function shortened(problem: Problem, patterns: readonly Pattern[], stock: Stock, by: number): Problem {
  const need = problem.items.map(() => 0);
  patterns.flatMap(patternItems).forEach((i) => need[i]!++);
  const counts = problem.stock.map((s) => patterns.filter((p) => p.stock === s.index).length);
  const all = problem.stock.map((s) => ({ ...s, count: counts[s.index]! - (s === stock ? 1 : 0) }));
  const short = { ...stock, index: all.length, usable: stock.usable - by, count: 1 };
  return { ...problem, fixed: { copies: [], need, picks: [] }, choices: [], stock: [...all, short] };
}
