import { isWithin, makeColumn, type RealColumn } from './column';
import { cutTrimmed, trimColumn, type TrimmedColumn } from './trim-column';
import type { SearchContext } from './context';
import type { Generation } from './generate-columns';
import { greedy } from './greedy';
import { createMaster, type MasterAnswer } from './master';

/** A column used this nearly whole is taken as it is. */
const NEARLY_WHOLE = 0.95;
/** Share of the slabs still to be used that is settled with each decision. */
const AT_ONCE = 0.15;
/** Rounds of new columns before each decision: the first program needs more than those that follow. */
const FIRST_ROUNDS = 12;
const LATER_ROUNDS = 3;

/** Puts a real section beside the row of each relaxed column that a bound's program uses, so that a dive can begin there. */
export function realiseUsed(context: SearchContext, generation: Generation, demand: readonly number[]): void {
  const { pricing, real } = context;
  const before = pricing.work();
  for (const { row } of generation.used) {
    const made = row && pricing.real(row, generation.value, demand);
    if (made) real.add(made);
  }
  context.spend(pricing.work() - before);
}

/** Nodes of each search for rows while diving. */
const DIVE_NODES = 1000;

/**
 * Plunges to a plan that can be sawn: solves the master program over real columns, takes the columns it uses most, and
 * goes on with what is left.
 *
 * @param demand - copies of each item to cut
 * @param counts - slabs that may be used, by stock entry
 * @param below - gives up when the plan cannot cost less than this
 * @param lead - place, among the columns most used, of the one taken first: another one leads to another plan
 * @returns the columns of a plan, or null when the slabs run out or the plan would cost too much
 */
export function dive(
  context: SearchContext,
  demand: readonly number[],
  counts: readonly number[],
  below: number,
  lead = 0,
): RealColumn[] | null {
  const { problem } = context;
  const prices = problem.stock.map((s) => s.price);
  const left = [...demand];
  const slabs = [...counts];
  const taken: RealColumn[] = [];
  let spent = 0;
  while (left.some((n) => n > 0)) {
    const usable = trimmed(context.real.list, left, slabs);
    const rounds = taken.length === 0 ? FIRST_ROUNDS : LATER_ROUNDS;
    const { columns, answer, out } = solveReal(context, usable, left, slabs, rounds);
    if (out) {
      const rest = greedy(problem, context.rowsAt, left, slabs);
      if (!rest) return null;
      taken.push(...rest.map(makeColumn));
      spent += rest.reduce((sum, pattern) => sum + prices[pattern.stock]!, 0);
      break;
    }
    if (spent + answer.objective >= below - 1e-6) return null;
    const ranked = columns.map((column, k) => ({ column, x: answer.x[k]! })).filter((c) => c.x > 1e-6);
    ranked.sort((a, b) => b.x - a.x || prices[b.column.stock]! - prices[a.column.stock]!);
    if (ranked.length === 0) return null;
    if (taken.length === 0) ranked.unshift(...ranked.splice(lead % ranked.length, 1));
    const atOnce = Math.max(1, Math.floor(ranked.reduce((sum, r) => sum + r.x, 0) * AT_ONCE));
    for (const [k, { column, x }] of ranked.entries()) {
      const copies = Math.max(k < atOnce ? 1 : 0, Math.floor(x + 1 - NEARLY_WHOLE));
      for (let n = copies; n > 0 && slabs[column.stock]! > 0; n--) {
        const cut = k === 0 || isWithin(column, left) ? cutTrimmed(context, column, answer.value, left) : null;
        if (!cut) break;
        cut.items.forEach((i, j) => (left[i]! -= cut.counts[j]!));
        slabs[cut.stock]!--;
        spent += prices[cut.stock]!;
        taken.push(cut);
      }
    }
  }
  return spent < below ? taken : null;
}

/** Columns trimmed to what is left, each once. */
function trimmed(all: readonly RealColumn[], left: readonly number[], slabs: readonly number[]): TrimmedColumn[] {
  const byKey = new Map<string, TrimmedColumn>();
  for (const whole of all) {
    const column = slabs[whole.stock]! > 0 ? trimColumn(whole, left) : null;
    if (column) byKey.set(column.key, column);
  }
  return [...byKey.values()];
}

/** The master program over real columns for what is left, after some rounds of new ones. */
function solveReal(
  context: SearchContext,
  usable: readonly TrimmedColumn[],
  left: readonly number[],
  slabs: readonly number[],
  rounds: number,
): { columns: TrimmedColumn[]; answer: MasterAnswer; out: boolean } {
  const { problem, pricing, real } = context;
  const cost = problem.stock.map((s) => s.price);
  const most = Math.max(...cost);
  const master = createMaster(problem, {
    demand: left,
    withChoices: false,
    counts: slabs,
    cost,
    penalty: problem.items.map(() => 20 * (most + 100)),
  });
  const columns = [...usable];
  columns.forEach(master.add);
  let answer = master.solve();
  let out = false;
  for (let round = 0; round < rounds && !out; round++) {
    const before = pricing.work();
    const { rows } = pricing.price(
      answer.value,
      left,
      cost.map((c, s) => c + answer.rent[s]! + 1e-6),
      DIVE_NODES,
    );
    let helped = false;
    for (const row of rows) {
      if (slabs[row.stock.index]! <= 0 || row.value <= cost[row.stock.index]! + answer.rent[row.stock.index]! + 1e-6)
        continue;
      const column = pricing.real(row, answer.value, left);
      if (!column || !real.add(column)) continue;
      master.add(column);
      columns.push({ ...column, whole: column });
      helped = true;
    }
    out = context.spend(pricing.work() - before + columns.length / 8 + 20);
    if (!helped) break;
    answer = master.solve();
  }
  return { columns, answer, out };
}
