import loadHighs from 'highs';

import { LinearProgram, type LpRow } from '@/geometry/nest/lp/simplex';
import { seeded } from '@/tests/helpers/random';

interface Sparse {
  readonly cost: number;
  readonly factors: readonly number[];
}

/** A program in the LP format of HiGHS (Huangfu and Hall's solver, here the referee), shortfalls as columns of their own. */
function inWords(rows: readonly LpRow[], columns: readonly Sparse[]): string {
  const signed = (x: number): string => (x < 0 ? `- ${-x}` : `+ ${x}`);
  const short = rows.flatMap((row, i) => (row.sense === '<=' ? [] : [`${signed(row.penalty)} s${i}`]));
  const goal = [...columns.map((c, j) => `${signed(c.cost)} x${j}`), ...short].join(' ');
  const limits = rows.map((row, i) => {
    const sum = columns.flatMap((c, j) => (c.factors[i] ? [`${signed(c.factors[i]!)} x${j}`] : []));
    const more = row.sense === '<=' ? [] : [`+ 1 s${i}`];
    return ` r${i}: ${[...sum, ...more, '+ 0 x0'].join(' ')} ${row.sense} ${row.rhs}`;
  });
  return `Minimize\n obj: ${goal}\nSubject To\n${limits.join('\n')}\nEnd\n`;
}

/** Covers with small whole numbers: many equal ratios, so that a careless rule runs in circles. */
function cover(seed: number): { rows: LpRow[]; columns: Sparse[] } {
  const { below } = seeded(seed);
  const rows = Array.from({ length: 3 + below(10) }, (_, i): LpRow =>
    i % 4 === 3 ? { sense: '<=', rhs: below(4), penalty: 0 } : { sense: '>=', rhs: below(3), penalty: 1000 },
  );
  const columns = Array.from({ length: 5 + below(30) }, () => ({
    cost: 1 + below(6),
    factors: rows.map(() => (below(3) === 0 ? 1 + below(2) : 0)),
  }));
  return { rows, columns };
}

function add(program: LinearProgram, { cost, factors }: Sparse): void {
  const rows = factors.flatMap((f, i) => (f === 0 ? [] : [i]));
  program.addColumn(
    cost,
    rows,
    rows.map((i) => factors[i]!),
  );
}

describe('LinearProgram against HiGHS', () => {
  const seeds = Array.from({ length: 60 }, (_, i) => i + 1);

  it('finds the least cost, also when columns come late and when they are priced anew', async () => {
    const highs = await loadHighs();
    for (const seed of seeds) {
      const { rows, columns } = cover(seed);
      const least = (list: readonly Sparse[]): number => highs.solve(inWords(rows, list)).ObjectiveValue;
      const program = new LinearProgram(rows);
      const half = Math.ceil(columns.length / 2);
      columns.slice(0, half).forEach((c) => add(program, c));
      expect(program.solve().objective).toBeCloseTo(least(columns.slice(0, half)), 5);
      columns.slice(half).forEach((c) => add(program, c));
      expect(program.solve().objective).toBeCloseTo(least(columns), 5);
      const dearer = columns.map((c, j) => ({ ...c, cost: 1 + ((c.cost + j * seed) % 7) }));
      dearer.forEach((c, j) => program.setCost(j, c.cost));
      expect(program.solve().objective).toBeCloseTo(least(dearer), 5);
    }
  });

  it('gives duals that no column undercuts and that are worth the answer', () => {
    for (const seed of seeds) {
      const { rows, columns } = cover(seed);
      const program = new LinearProgram(rows);
      columns.forEach((c) => add(program, c));
      const { objective, duals } = program.solve();
      for (const { cost, factors } of columns)
        expect(cost - factors.reduce((sum, f, i) => sum + f * duals[i]!, 0)).toBeGreaterThan(-1e-6);
      expect(rows.reduce((sum, row, i) => sum + row.rhs * duals[i]!, 0)).toBeCloseTo(objective, 5);
    }
  });
});
