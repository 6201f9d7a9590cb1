import { isWithin, worthOf, type Column } from './column';
import type { Proof, SearchContext } from './context';
import { createMaster, type MasterAnswer, type MasterGoal } from './master';

/** How much of the best duals so far is mixed into those that are priced: pure duals of a young program swing wildly. */
const SMOOTHING = 0.6;
/** Most nodes of one search for the best rows of a slab. */
const ROW_NODES = 60_000;
/** A column must save this share of the program's objective to be worth adding. */
const WORTHWHILE = 1e-7;

export interface Generation extends Proof {
  readonly answer: MasterAnswer;
  /** Columns that the last program uses, the most used first. */
  readonly used: readonly Column[];
  /** Best lower bound met; the proof is what it came from. */
  readonly bound: number;
  /** False when work ran out first. */
  readonly finished: boolean;
}

/**
 * Solves a master program over all patterns: adds the patterns that its duals ask for until none helps, or until the bound
 * has met the objective or passed `enough`.
 *
 * @param first - values to price first, a sensible guess
 * @param boundOf - lower bound on the goal that values and the worth of slabs under them prove
 */
export function generateColumns(
  context: SearchContext,
  goal: MasterGoal,
  first: readonly number[],
  boundOf: (value: readonly number[], worth: readonly number[]) => number,
  enough: (bound: number, answer: MasterAnswer) => boolean,
): Generation {
  const { relaxed: pool, pricing } = context;
  const master = createMaster(context.problem, goal);
  const added: Column[] = [];
  const add = (column: Column): void => {
    master.add(column);
    added.push(column);
  };
  pool.list.forEach((column) => goal.counts[column.stock]! > 0 && add(column));
  let answer = master.solve();
  let stable = first;
  let best: Proof & { readonly bound: number } = { bound: -Infinity, value: first, worth: [], penalties: [] };
  let smoothing = SMOOTHING;
  const finish = (finished: boolean): Generation => ({ answer, used: usedColumns(added, answer.x), ...best, finished });
  for (;;) {
    const before = pricing.work();
    const value = answer.value.map((v, i) => smoothing * stable[i]! + (1 - smoothing) * v);
    const { worth, rows, penalties } = pricing.price(
      value,
      context.most,
      knownWorth(context, pool.list, value),
      ROW_NODES,
    );
    const bound = boundOf(value, worth);
    if (bound > best.bound) {
      best = { bound, value, worth, penalties };
      stable = value;
    }
    const columns = rows.flatMap((row) => pricing.relaxed(row, value, context.most) ?? []);
    columns.forEach((c) => c.pattern && context.real.add({ ...c, pattern: c.pattern }));
    const fresh = columns.filter((c) => pool.add(c) && goal.counts[c.stock]! > 0);
    const helps = fresh.some((c) => {
      const saving = worthOf(c, answer.value) - goal.cost[c.stock]! - answer.rent[c.stock]!;
      return saving > WORTHWHILE * Math.max(1, answer.objective);
    });
    const out = context.spend(pricing.work() - before + pool.list.length / 8 + 20);
    if (enough(best.bound, answer)) return finish(true);
    if (!helps && smoothing === 0) return finish(true);
    if (out) return finish(false);
    smoothing = helps ? SMOOTHING : 0;
    fresh.forEach(add);
    if (!helps) continue;
    answer = master.solve();
  }
}

function usedColumns(added: readonly Column[], x: readonly number[]): Column[] {
  const used = added.map((column, k) => ({ column, x: x[k] ?? 0 })).filter((c) => c.x > 1e-6);
  return used.sort((a, b) => b.x - a.x).map((c) => c.column);
}

/** By stock entry, the most that a column met so far is worth; columns with more copies than this context asks for do not count. */
function knownWorth({ problem, most }: SearchContext, columns: readonly Column[], value: readonly number[]): number[] {
  const known = problem.stock.map(() => 0);
  for (const column of columns) {
    const worth = worthOf(column, value);
    if (worth > known[column.stock]! && isWithin(column, most)) known[column.stock] = worth;
  }
  return known;
}
