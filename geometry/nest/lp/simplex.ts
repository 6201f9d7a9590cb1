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

export interface LinearProgram {
  /** Adds a column and gives its number. */
  addColumn(cost: number, rows: readonly number[], factors: readonly number[]): number;
  /** Minimises; goes on from the last basis. */
  solve(): LpAnswer;
  readonly pivots: () => number;
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

/**
 * Minimises a linear program over columns that arrive in batches (primal revised simplex with a dense basis inverse; rows
 * are few, columns many and thin). Right-hand sides must be 0 or more.
 */
export function createLinearProgram(rows: readonly LpRow[]): LinearProgram {
  const m = rows.length;
  const columns: Column[] = [];
  rows.forEach((row, i) => {
    if (row.sense !== '<=') columns.push({ cost: row.penalty, rows: [i], factors: [1] });
    if (row.sense !== '=') columns.push({ cost: 0, rows: [i], factors: [row.sense === '<=' ? 1 : -1] });
  });
  const own = columns.length;
  const basis = rows.map((_, i) => columns.findIndex((c) => c.rows[0] === i && c.factors[0] === 1));
  const inBasis = new Set(basis);
  const inverse = new Float64Array(m * m);
  const values = new Float64Array(m);
  const duals = new Float64Array(m);
  const step = new Float64Array(m);
  let pivots = 0;
  let sinceRefresh = 0;
  for (let i = 0; i < m; i++) inverse[i * m + i] = 1;

  function findValues(): void {
    for (let i = 0; i < m; i++) {
      let sum = 0;
      for (let j = 0; j < m; j++) sum += inverse[i * m + j]! * rows[j]!.rhs;
      values[i] = sum > 0 ? sum : 0;
    }
  }

  function findDuals(): void {
    duals.fill(0);
    for (let i = 0; i < m; i++) {
      const cost = columns[basis[i]!]!.cost;
      if (cost === 0) continue;
      for (let j = 0; j < m; j++) duals[j]! += cost * inverse[i * m + j]!;
    }
  }

  const reducedCost = (c: Column): number => {
    let cost = c.cost;
    for (let k = 0; k < c.rows.length; k++) cost -= duals[c.rows[k]!]! * c.factors[k]!;
    return cost;
  };

  function findEntering(first: boolean): number {
    let best = -1;
    let least = -REDUCED;
    for (let j = 0; j < columns.length; j++) {
      const cost = reducedCost(columns[j]!);
      if (cost >= least || inBasis.has(j)) continue;
      if (first) return j;
      least = cost;
      best = j;
    }
    return best;
  }

  function findLeaving(entering: Column): number {
    for (let i = 0; i < m; i++) {
      let sum = 0;
      for (let k = 0; k < entering.rows.length; k++) sum += inverse[i * m + entering.rows[k]!]! * entering.factors[k]!;
      step[i] = sum;
    }
    let best = -1;
    let least = Infinity;
    for (let i = 0; i < m; i++) {
      if (step[i]! <= PIVOT) continue;
      const ratio = values[i]! / step[i]!;
      if (ratio < least - 1e-12 || (ratio <= least + 1e-12 && best >= 0 && step[i]! > step[best]!)) {
        least = Math.min(least, ratio);
        best = i;
      }
    }
    return best;
  }

  function pivot(leaving: number, entering: number): void {
    const p = step[leaving]!;
    for (let j = 0; j < m; j++) inverse[leaving * m + j]! /= p;
    const moved = values[leaving]! / p;
    for (let i = 0; i < m; i++) {
      const f = step[i]!;
      if (i === leaving || f === 0) continue;
      values[i] = Math.max(0, values[i]! - f * moved);
      for (let j = 0; j < m; j++) inverse[i * m + j]! -= f * inverse[leaving * m + j]!;
    }
    values[leaving] = moved;
    inBasis.delete(basis[leaving]!);
    inBasis.add(entering);
    basis[leaving] = entering;
    pivots++;
    sinceRefresh++;
  }

  function refresh(): void {
    invert(
      m,
      basis.map((j) => columns[j]!),
      inverse,
    );
    sinceRefresh = 0;
    findValues();
  }

  function solve(): LpAnswer {
    findValues();
    let last = Infinity;
    let stalled = 0;
    for (;;) {
      if (sinceRefresh >= REFRESH) refresh();
      findDuals();
      const entering = findEntering(stalled > STALL);
      if (entering < 0) break;
      const leaving = findLeaving(columns[entering]!);
      if (leaving < 0) throw new RangeError('the linear program has no least value');
      pivot(leaving, entering);
      const objective = costOf();
      stalled = objective < last - 1e-9 * Math.max(1, Math.abs(last)) ? 0 : stalled + 1;
      last = Math.min(last, objective);
    }
    return answer();
  }

  function costOf(): number {
    let sum = 0;
    for (let i = 0; i < m; i++) sum += columns[basis[i]!]!.cost * values[i]!;
    return sum;
  }

  function answer(): LpAnswer {
    const x = new Array<number>(columns.length - own).fill(0);
    let shortfall = 0;
    for (let i = 0; i < m; i++) {
      const j = basis[i]!;
      if (j >= own) x[j - own] = values[i]!;
      else shortfall += columns[j]!.cost * values[i]!;
    }
    return { objective: costOf(), x, duals: Array.from(duals), shortfall };
  }

  return {
    addColumn(cost, at, factors) {
      columns.push({ cost, rows: at, factors });
      return columns.length - 1 - own;
    },
    solve,
    pivots: () => pivots,
  };
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
