import { LinearProgram, type LpAnswer, type LpRow } from '../lp/simplex';
import type { Problem } from '../model/problem';
import type { Counted } from './column';

/** The linear program over the columns known so far, with the duals read by what they belong to. */
export interface Master {
  add(column: Counted): void;
  solve(): MasterAnswer;
}

export interface MasterAnswer {
  readonly objective: number;
  /** What is not covered yet, at its penalty; 0 when the columns cover everything. */
  readonly shortfall: number;
  /** By item, cents (or penalty units), 0 or more. */
  readonly value: readonly number[];
  /** By stock entry: what one more of a limited slab is worth. */
  readonly rent: readonly number[];
  /** By added column. */
  readonly x: readonly number[];
}

export interface MasterGoal {
  /** By item. */
  readonly demand: readonly number[];
  /** Options whose needs are added; the program mixes them. Left out when the choices are settled in `demand`. */
  readonly withChoices: boolean;
  readonly counts: readonly number[];
  /** By stock entry, cost of a column. */
  readonly cost: readonly number[];
  /** By item, cost of leaving one uncut. */
  readonly penalty: readonly number[];
}

export function createMaster(problem: Problem, goal: MasterGoal): Master {
  const choices = goal.withChoices ? problem.choices : [];
  const items = problem.items
    .map((item) => item.index)
    .filter((i) => goal.demand[i]! > 0 || choices.some((c) => c.options.some((o) => o.need[i]! > 0)));
  const limited = goal.counts.flatMap((count, s) => (Number.isFinite(count) ? [s] : []));
  const rowOf = new Map(items.map((item, row) => [item, row]));
  const limitOf = new Map(limited.map((s, k) => [s, items.length + k]));
  const most = Math.max(...goal.penalty, 1);
  const rows: LpRow[] = [
    ...items.map((i): LpRow => ({ sense: '>=', rhs: goal.demand[i]!, penalty: goal.penalty[i]! })),
    ...limited.map((s): LpRow => ({ sense: '<=', rhs: goal.counts[s]!, penalty: 0 })),
    ...choices.map((): LpRow => ({ sense: '=', rhs: 1, penalty: most * items.length })),
  ];
  const program = new LinearProgram(rows);
  let extra = 0;
  choices.forEach(({ options }, c) =>
    options.forEach(({ need }) => {
      const used = need.flatMap((n, i) => (n > 0 ? [i] : []));
      const at = [...used.map((i) => rowOf.get(i)!), items.length + limited.length + c];
      program.addColumn(0, at, [...used.map((i) => -need[i]!), 1]);
      extra++;
    }),
  );

  function read(answer: LpAnswer): MasterAnswer {
    const value = problem.items.map(() => 0);
    items.forEach((i, row) => (value[i] = Math.max(0, answer.duals[row]!)));
    const rent = problem.stock.map((_, s) => Math.max(0, -(answer.duals[limitOf.get(s) ?? -1] ?? 0)));
    return { objective: answer.objective, shortfall: answer.shortfall, value, rent, x: answer.x.slice(extra) };
  }

  function add(column: Counted): void {
    const at: number[] = [];
    const factors: number[] = [];
    column.items.forEach((i, k) => {
      const row = rowOf.get(i);
      if (row === undefined) return;
      at.push(row);
      factors.push(column.counts[k]!);
    });
    const limit = limitOf.get(column.stock);
    if (limit !== undefined) {
      at.push(limit);
      factors.push(1);
    }
    program.addColumn(goal.cost[column.stock]!, at, factors);
  }

  return { add, solve: () => read(program.solve()) };
}
