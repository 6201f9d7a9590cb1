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

/** Columns one after the other in flat arrays: `start[j]` is where the rows and factors of column j begin. */
class ColumnStore {
  count = 0;
  cost = new Float64Array(64);
  start = new Int32Array(65);
  row = new Int32Array(256);
  factor = new Float64Array(256);

  push(cost: number, rows: readonly number[], factors: readonly number[]): void {
    const from = this.start[this.count]!;
    if (this.count + 1 >= this.cost.length) {
      this.cost = grown(this.cost, new Float64Array(2 * this.cost.length));
      this.start = grown(this.start, new Int32Array(2 * this.start.length));
    }
    while (from + rows.length > this.row.length) {
      this.row = grown(this.row, new Int32Array(2 * this.row.length));
      this.factor = grown(this.factor, new Float64Array(2 * this.factor.length));
    }
    for (let k = 0; k < rows.length; k++) {
      this.row[from + k] = rows[k]!;
      this.factor[from + k] = factors[k]!;
    }
    this.cost[this.count++] = cost;
    this.start[this.count] = from + rows.length;
  }
}

function grown<T extends Float64Array | Int32Array>(old: T, larger: T): T {
  larger.set(old);
  return larger;
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
  private readonly columns = new ColumnStore();
  private readonly own: number;
  private readonly basis: number[] = [];
  private readonly basic: boolean[] = [];
  private readonly inverse: Float64Array;
  private readonly values: Float64Array;
  private readonly duals: Float64Array;
  private readonly step: Float64Array;
  /** What the basis costs. */
  private spent = 0;
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
      this.basis.push(this.columns.count);
      if (row.sense !== '<=') this.columns.push(row.penalty, [i], [1]);
      if (row.sense !== '=') this.columns.push(0, [i], [row.sense === '<=' ? 1 : -1]);
      this.inverse[i * m + i] = 1;
    }
    this.own = this.columns.count;
    for (const j of this.basis) this.basic[j] = true;
  }

  /** Adds a column and gives its number. */
  addColumn(cost: number, rows: readonly number[], factors: readonly number[]): number {
    this.columns.push(cost, rows, factors);
    return this.columns.count - 1 - this.own;
  }

  /** Prices an added column anew; the last basis stays a place to begin from. */
  setCost(column: number, cost: number): void {
    this.columns.cost[column + this.own] = cost;
  }

  /** @throws RangeError when there is no least value */
  solve(): LpAnswer {
    this.findValues();
    this.findDuals();
    let last = Infinity;
    let stalled = 0;
    for (;;) {
      if (this.sinceRefresh >= REFRESH) this.refresh();
      const entering = this.findEntering(stalled > STALL);
      if (entering < 0 || stalled > STALL + MOST_STALLED * this.m) break;
      const leaving = this.findLeaving(entering, stalled > STALL);
      if (leaving < 0) throw new RangeError('the linear program has no least value');
      this.pivot(leaving, entering);
      stalled = this.spent < last - 1e-9 * Math.max(1, Math.abs(last)) ? 0 : stalled + 1;
      last = Math.min(last, this.spent);
    }
    this.findDuals();
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
    const { m, inverse, duals, basis, values } = this;
    const costs = this.columns.cost;
    duals.fill(0);
    this.spent = 0;
    for (let i = 0; i < m; i++) {
      const cost = costs[basis[i]!]!;
      if (cost === 0) continue;
      this.spent += cost * values[i]!;
      for (let j = 0; j < m; j++) duals[j]! += cost * inverse[i * m + j]!;
    }
  }

  private reducedCost(column: number): number {
    const { duals } = this;
    const { cost, start, row, factor } = this.columns;
    let reduced = cost[column]!;
    for (let k = start[column]!, end = start[column + 1]!; k < end; k++) reduced -= duals[row[k]!]! * factor[k]!;
    return reduced;
  }

  private findEntering(first: boolean): number {
    const { duals, basic } = this;
    const { count, cost, start, row, factor } = this.columns;
    let best = -1;
    let least = -REDUCED;
    let k = 0;
    for (let j = 0; j < count; j++) {
      let reduced = cost[j]!;
      for (const end = start[j + 1]!; k < end; k++) reduced -= duals[row[k]!]! * factor[k]!;
      if (reduced >= least || basic[j]) continue;
      if (first) return j;
      least = reduced;
      best = j;
    }
    return best;
  }

  /** The row with the least ratio; of equal ones the safest pivot, or (Bland's rule, which never runs in circles) the first column. */
  private findLeaving(entering: number, first: boolean): number {
    const { m, inverse, values, step, basis } = this;
    const { start, row, factor } = this.columns;
    step.fill(0);
    for (let k = start[entering]!, end = start[entering + 1]!; k < end; k++) {
      const by = factor[k]!;
      for (let i = 0, at = row[k]!; i < m; i++, at += m) step[i]! += inverse[at]! * by;
    }
    let best = -1;
    let least = Infinity;
    for (let i = 0; i < m; i++) {
      const sum = step[i]!;
      if (sum <= PIVOT) continue;
      const ratio = values[i]! / sum;
      if (ratio > least + 1e-12) continue;
      if (ratio >= least - 1e-12 && best >= 0 && !(first ? basis[i]! < basis[best]! : sum > step[best]!)) continue;
      least = Math.min(least, ratio);
      best = i;
    }
    return best;
  }

  private pivot(leaving: number, entering: number): void {
    const { m, inverse, values, step, basis, duals } = this;
    const p = step[leaving]!;
    const at = leaving * m;
    const reduced = this.reducedCost(entering);
    for (let j = 0; j < m; j++) inverse[at + j]! /= p;
    for (let j = 0; j < m; j++) duals[j]! += reduced * inverse[at + j]!;
    const moved = values[leaving]! / p;
    this.spent += reduced * moved;
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
    invert(this.m, this.basis, this.columns, this.inverse);
    this.sinceRefresh = 0;
    this.findValues();
    this.findDuals();
  }

  private answer(): LpAnswer {
    const x = new Array<number>(this.columns.count - this.own).fill(0);
    let shortfall = 0;
    for (let i = 0; i < this.m; i++) {
      const j = this.basis[i]!;
      if (j >= this.own) x[j - this.own] = this.values[i]!;
      else shortfall += this.columns.cost[j]! * this.values[i]!;
    }
    return { objective: this.spent, x, duals: Array.from(this.duals), shortfall };
  }
}

/** Writes the inverse of the matrix with these columns, by Gauss-Jordan elimination with row exchange. */
function invert(m: number, basis: readonly number[], columns: ColumnStore, inverse: Float64Array): void {
  const a = new Float64Array(m * m);
  inverse.fill(0);
  const { start, row, factor } = columns;
  basis.forEach((c, j) => {
    for (let k = start[c]!; k < start[c + 1]!; k++) a[row[k]! * m + j]! += factor[k]!;
  });
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
