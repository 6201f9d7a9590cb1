import { isWithin, type RealColumn } from './column';
import type { SearchContext } from './context';
import type { Generation } from './generate-columns';
import { createMaster, type MasterAnswer } from './master';

/** A column used this nearly whole is taken as it is. */
const NEARLY_WHOLE = 0.95;
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
 * @returns the columns of a plan, or null when the slabs run out or the plan would cost too much
 */
export function dive(
  context: SearchContext,
  demand: readonly number[],
  counts: readonly number[],
  below: number,
): RealColumn[] | null {
  const { problem } = context;
  const prices = problem.stock.map((s) => s.price);
  const left = [...demand];
  const slabs = [...counts];
  const taken: RealColumn[] = [];
  let spent = 0;
  while (left.some((n) => n > 0)) {
    const usable = context.real.list.filter((c) => slabs[c.stock]! > 0 && isWithin(c, left));
    const rounds = taken.length === 0 ? FIRST_ROUNDS : LATER_ROUNDS;
    const { columns, answer, out } = solveReal(context, usable, left, slabs, rounds);
    if (out || spent + answer.objective >= below - 1e-6) return null;
    const ranked = columns.map((column, k) => ({ column, x: answer.x[k]! })).filter((c) => c.x > 1e-6);
    ranked.sort((a, b) => b.x - a.x || prices[b.column.stock]! - prices[a.column.stock]!);
    if (ranked.length === 0) return null;
    ranked.forEach(({ column, x }, k) => {
      for (
        let n = k === 0 ? Math.max(1, Math.floor(x + 1 - NEARLY_WHOLE)) : Math.floor(x + 1 - NEARLY_WHOLE);
        n > 0;
        n--
      ) {
        if (slabs[column.stock]! <= 0 || !isWithin(column, left)) return;
        column.items.forEach((i, j) => (left[i]! -= column.counts[j]!));
        slabs[column.stock]!--;
        spent += prices[column.stock]!;
        taken.push(column);
      }
    });
  }
  return spent < below ? taken : null;
}

/** The master program over real columns for what is left, after some rounds of new ones. */
function solveReal(
  context: SearchContext,
  usable: readonly RealColumn[],
  left: readonly number[],
  slabs: readonly number[],
  rounds: number,
): { columns: RealColumn[]; answer: MasterAnswer; out: boolean } {
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
      columns.push(column);
      helped = true;
    }
    out = context.spend(pricing.work() - before + columns.length / 8 + 20);
    if (!helped) break;
    answer = master.solve();
  }
  return { columns, answer, out };
}
