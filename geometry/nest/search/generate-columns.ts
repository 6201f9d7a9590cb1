import { worthOf } from './column';
import type { SearchContext } from './context';
import { createMaster, type MasterAnswer, type MasterGoal } from './master';

/** How much of the best duals so far is mixed into those that are priced: pure duals of a young program swing wildly. */
const SMOOTHING = 0.7;
/** A column must save this share of the program's objective to be worth adding. */
const WORTHWHILE = 1e-7;

export interface Generation {
  readonly answer: MasterAnswer;
  /** Best lower bound met, and the values it came from with the worth of each slab under them. */
  readonly bound: number;
  readonly value: readonly number[];
  readonly worth: readonly number[];
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
  pool.list.forEach((column) => goal.counts[column.stock]! > 0 && master.add(column));
  let answer = master.solve();
  let stable = first;
  let best = { bound: -Infinity, value: first, worth: [] as readonly number[] };
  let smoothing = SMOOTHING;
  for (;;) {
    const before = pricing.work();
    const value = answer.value.map((v, i) => smoothing * stable[i]! + (1 - smoothing) * v);
    const { worth, rows } = pricing.price(value, context.most);
    const bound = boundOf(value, worth);
    if (bound > best.bound) {
      best = { bound, value, worth };
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
    if (enough(best.bound, answer)) return { answer, ...best, finished: true };
    if (!helps && smoothing === 0) return { answer, ...best, finished: true };
    if (out) return { answer, ...best, finished: false };
    smoothing = helps ? SMOOTHING : 0;
    fresh.forEach(master.add);
    if (!helps) continue;
    answer = master.solve();
  }
}
