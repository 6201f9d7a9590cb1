/** A constraint row; falling short of a `>=` or `=` row by one costs `penalty`, so that there is always an answer. */
export interface LpRow {
  readonly sense: '>=' | '<=' | '=';
  readonly rhs: number;
  readonly penalty: number;
}

export interface LpAnswer {
  readonly objective: number;
  /** Value of each added column, in the order of adding. */
  readonly x: readonly number[];
  readonly duals: readonly number[];
  /** How far the penalised rows fall short in all, times their penalties. */
  readonly shortfall: number;
}

interface Column {
  readonly cost: number;
  readonly rows: readonly number[];
  readonly factors: readonly number[];
}

/** A reduced cost or pivot nearer to 0 than this counts as 0. */
const REDUCED = 1e-7;
const PIVOT = 1e-9;
/** Pivots between two fresh inversions of the basis, and without progress before the safest rule takes over. */
const REFRESH = 120;
const STALL = 60;
/** Pivots that go on without progress, for each row, before the answer is taken as it is: rounding can hide that it is best. */
const MOST_STALLED = 20;

/**
 * Minimises a linear program over columns that arrive in batches (primal revised simplex with a dense basis inverse; rows
 * are few, columns many and thin). Right-hand sides must be 0 or more. Each `solve` goes on from the last basis.
 */
export class LinearProgram {
  private readonly m: number;
  private readonly columns: Column[] = [];
  private readonly own: number;
  private readonly basis: number[] = [];
  private readonly basic: boolean[] = [];
  private readonly inverse: Float64Array;
  private readonly values: Float64Array;
  private readonly duals: Float64Array;
  private readonly step: Float64Array;
  private sinceRefresh = 0;

  constructor(private readonly rows: readonly LpRow[]) {
    const m = rows.length;
    this.m = m;
    this.inverse = new Float64Array(m * m);
    this.values = new Float64Array(m);
    this.duals = new Float64Array(m);
    this.step = new Float64Array(m);
    for (let i = 0; i < m; i++) {
      const row = rows[i]!;
      this.basis.push(this.columns.length);
      if (row.sense !== '<=') this.columns.push({ cost: row.penalty, rows: [i], factors: [1] });
      if (row.sense !== '=') this.columns.push({ cost: 0, rows: [i], factors: [row.sense === '<=' ? 1 : -1] });
      this.inverse[i * m + i] = 1;
    }
    this.own = this.columns.length;
    for (const j of this.basis) this.basic[j] = true;
  }

  /** Adds a column and gives its number. */
  addColumn(cost: number, rows: readonly number[], factors: readonly number[]): number {
    this.columns.push({ cost, rows, factors });
    return this.columns.length - 1 - this.own;
  }

  /** @throws RangeError when there is no least value */
  solve(): LpAnswer {
    this.findValues();
    let last = Infinity;
    let stalled = 0;
    for (;;) {
      if (this.sinceRefresh >= REFRESH) this.refresh();
      this.findDuals();
      const entering = this.findEntering(stalled > STALL);
      if (entering < 0 || stalled > STALL + MOST_STALLED * this.m) break;
      const leaving = this.findLeaving(this.columns[entering]!, stalled > STALL);
      if (leaving < 0) throw new RangeError('the linear program has no least value');
      this.pivot(leaving, entering);
      const objective = this.cost();
      stalled = objective < last - 1e-9 * Math.max(1, Math.abs(last)) ? 0 : stalled + 1;
      last = Math.min(last, objective);
    }
    return this.answer();
  }

  private findValues(): void {
    const { m, inverse, values, rows } = this;
    for (let i = 0; i < m; i++) {
      let sum = 0;
      for (let j = 0; j < m; j++) sum += inverse[i * m + j]! * rows[j]!.rhs;
      values[i] = sum > 0 ? sum : 0;
    }
  }

  private findDuals(): void {
    const { m, inverse, duals, basis, columns } = this;
    duals.fill(0);
    for (let i = 0; i < m; i++) {
      const { cost } = columns[basis[i]!]!;
      if (cost === 0) continue;
      for (let j = 0; j < m; j++) duals[j]! += cost * inverse[i * m + j]!;
    }
  }

  private findEntering(first: boolean): number {
    const { columns, duals, basic } = this;
    let best = -1;
    let least = -REDUCED;
    for (let j = 0; j < columns.length; j++) {
      const { cost, rows, factors } = columns[j]!;
      let reduced = cost;
      for (let k = 0; k < rows.length; k++) reduced -= duals[rows[k]!]! * factors[k]!;
      if (reduced >= least || basic[j]) continue;
      if (first) return j;
      least = reduced;
      best = j;
    }
    return best;
  }

  /** The row with the least ratio; of equal ones the safest pivot, or (Bland's rule, which never runs in circles) the first column. */
  private findLeaving({ rows, factors }: Column, first: boolean): number {
    const { m, inverse, values, step, basis } = this;
    let best = -1;
    let least = Infinity;
    for (let i = 0; i < m; i++) {
      let sum = 0;
      for (let k = 0; k < rows.length; k++) sum += inverse[i * m + rows[k]!]! * factors[k]!;
      step[i] = sum;
      if (sum <= PIVOT) continue;
      const ratio = values[i]! / sum;
      const isBetter = (): boolean => (first ? basis[i]! < basis[best]! : sum > step[best]!);
      if (ratio < least - 1e-12 || (ratio <= least + 1e-12 && best >= 0 && isBetter())) {
        least = Math.min(least, ratio);
        best = i;
      }
    }
    return best;
  }

  private pivot(leaving: number, entering: number): void {
    const { m, inverse, values, step, basis } = this;
    const p = step[leaving]!;
    const at = leaving * m;
    for (let j = 0; j < m; j++) inverse[at + j]! /= p;
    const moved = values[leaving]! / p;
    for (let i = 0; i < m; i++) {
      const f = step[i]!;
      if (i === leaving || f === 0) continue;
      values[i] = Math.max(0, values[i]! - f * moved);
      for (let j = 0; j < m; j++) inverse[i * m + j]! -= f * inverse[at + j]!;
    }
    values[leaving] = moved;
    this.basic[basis[leaving]!] = false;
    this.basic[entering] = true;
    basis[leaving] = entering;
    this.sinceRefresh++;
  }

  private refresh(): void {
    invert(
      this.m,
      this.basis.map((j) => this.columns[j]!),
      this.inverse,
    );
    this.sinceRefresh = 0;
    this.findValues();
  }

  private cost(): number {
    let sum = 0;
    for (let i = 0; i < this.m; i++) sum += this.columns[this.basis[i]!]!.cost * this.values[i]!;
    return sum;
  }

  private answer(): LpAnswer {
    const x = new Array<number>(this.columns.length - this.own).fill(0);
    let shortfall = 0;
    for (let i = 0; i < this.m; i++) {
      const j = this.basis[i]!;
      if (j >= this.own) x[j - this.own] = this.values[i]!;
      else shortfall += this.columns[j]!.cost * this.values[i]!;
    }
    return { objective: this.cost(), x, duals: Array.from(this.duals), shortfall };
  }
}

/** Writes the inverse of the matrix with these columns, by Gauss-Jordan elimination with row exchange. */
function invert(m: number, columns: readonly Column[], inverse: Float64Array): void {
  const a = new Float64Array(m * m);
  inverse.fill(0);
  columns.forEach((c, j) => c.rows.forEach((row, k) => (a[row * m + j]! += c.factors[k]!)));
  for (let i = 0; i < m; i++) inverse[i * m + i] = 1;
  for (let j = 0; j < m; j++) {
    let p = j;
    for (let i = j + 1; i < m; i++) if (Math.abs(a[i * m + j]!) > Math.abs(a[p * m + j]!)) p = i;
    swapRows(a, m, p, j);
    swapRows(inverse, m, p, j);
    const d = a[j * m + j]!;
    if (Math.abs(d) < 1e-12) throw new RangeError('the basis has no inverse');
    for (let k = 0; k < m; k++) {
      a[j * m + k]! /= d;
      inverse[j * m + k]! /= d;
    }
    for (let i = 0; i < m; i++) {
      const f = a[i * m + j]!;
      if (i === j || f === 0) continue;
      for (let k = 0; k < m; k++) {
        a[i * m + k]! -= f * a[j * m + k]!;
        inverse[i * m + k]! -= f * inverse[j * m + k]!;
      }
    }
  }
}

function swapRows(a: Float64Array, m: number, p: number, q: number): void {
  if (p === q) return;
  for (let k = 0; k < m; k++) {
    const t = a[p * m + k]!;
    a[p * m + k] = a[q * m + k]!;
    a[q * m + k] = t;
  }
}
