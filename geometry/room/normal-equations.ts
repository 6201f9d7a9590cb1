import { CholeskyDecomposition, EigenvalueDecomposition, Matrix, QrDecomposition } from 'ml-matrix';

/**
 * Squared pivots, of normal equations scaled to a unit diagonal. A chain of twelve walls with 0.001 in and one-degree
 * readings side by side keeps over 1e-7; where nothing fixes a direction, rounding leaves up to 1e-8. Between these the
 * orthogonal factor of the rows themselves decides, which is clear about it but slower.
 */
const WEAK_PIVOT = 1e-9;
export const DOUBTFUL_PIVOT = 1e-5;
/** Smallest diagonal of the orthogonal factor, over unit columns, that is more than rounding. */
const FULL_RANK = 1e-8;

/** Eigenvalue, of normal equations scaled to a unit diagonal, that is nothing but rounding. */
const OPEN_EIGENVALUE = 1e-12;

/** Weighted rows of a linearised network: row * step = misfit, each already divided by its standard deviation. */
export interface WeightedSystem {
  readonly unknowns: number;
  /** One row per observation, `unknowns` long. */
  readonly rows: readonly Float64Array[];
  /** (value at the points - observed) / sd */
  readonly misfits: Float64Array;
}

/** Normal equations of the system, factored. */
export interface FactoredNormals {
  /** Smallest squared pivot; under `DOUBTFUL_PIVOT` ask `hasFullRank`. */
  readonly pivot: number;
  /** The Gauss-Newton step, inches for every unknown. */
  step(): Float64Array;
  /** Inverse of the normal matrix, row by row. */
  covariance(): Float64Array;
}

/**
 * Builds and factors the normal equations, scaled to a unit diagonal so that the size of coordinates and weights does
 * not matter.
 *
 * @param damping - added to the unit diagonal; 0 for plain Gauss-Newton
 * @returns null when the observations leave some direction open
 */
export function factorNormals(system: WeightedSystem, damping = 0): FactoredNormals | null {
  const { unknowns } = system;
  const { normal, scale } = scaledNormals(system);
  for (let i = 0; i < unknowns; i++) normal.set(i, i, 1 + damping);
  if (scale.includes(0)) return null;
  const cholesky = new CholeskyDecomposition(normal);
  if (!cholesky.isPositiveDefinite()) return null;
  const lower = cholesky.lowerTriangularMatrix;
  let pivot = Infinity;
  for (let i = 0; i < unknowns; i++) pivot = Math.min(pivot, lower.get(i, i) ** 2);
  if (pivot < WEAK_PIVOT && !hasFullRank(system)) return null;
  return {
    pivot,
    step: () => {
      const right = scaledRight(system, scale);
      const solved = cholesky.solve(Matrix.columnVector(right));
      return Float64Array.from(scale, (s, i) => s * solved.get(i, 0));
    },
    covariance: () => unscaledInverse(cholesky, scale),
  };
}

/**
 * Directions in which the points can move without any observation noticing; where rounding leaves none, the direction
 * that is noticed least.
 *
 * @returns unit vectors over the unknowns, at least one
 */
export function openDirections(system: WeightedSystem): readonly Float64Array[] {
  const { unknowns } = system;
  const { normal, scale } = scaledNormals(system);
  for (let i = 0; i < unknowns; i++) normal.set(i, i, scale[i] === 0 ? 0 : 1);
  const eigen = new EigenvalueDecomposition(normal, { assumeSymmetric: true });
  const limit = Math.max(OPEN_EIGENVALUE, Math.min(...eigen.realEigenvalues));
  return eigen.realEigenvalues.flatMap((value, k) => {
    if (value > limit) return [];
    const v = Float64Array.from(scale, (s, i) => (s === 0 ? 1 : s) * eigen.eigenvectorMatrix.get(i, k));
    const size = Math.hypot(...v);
    return [v.map((x) => x / size)];
  });
}

/** Whether the observations hold the points in every direction. */
export function hasFullRank({ unknowns, rows }: WeightedSystem): boolean {
  if (rows.length < unknowns) return false;
  const sizes = new Float64Array(unknowns);
  for (const row of rows) row.forEach((x, i) => (sizes[i]! += x * x));
  const scaled = new Matrix(rows.map((row) => row.map((x, i) => (x === 0 ? 0 : x / Math.sqrt(sizes[i]!)))));
  const factor = new QrDecomposition(scaled).upperTriangularMatrix;
  for (let i = 0; i < unknowns; i++) if (!(Math.abs(factor.get(i, i)) > FULL_RANK)) return false;
  return true;
}

function scaledNormals({ unknowns, rows }: WeightedSystem): { normal: Matrix; scale: Float64Array } {
  const sums = new Float64Array(unknowns * unknowns);
  const used = new Int32Array(unknowns);
  for (const row of rows) {
    // A tape reading touches four points at most, so most of a row is nothing.
    let count = 0;
    for (let i = 0; i < unknowns; i++) if (row[i] !== 0) used[count++] = i;
    for (let p = 0; p < count; p++) {
      const i = used[p]!;
      for (let q = 0; q <= p; q++) sums[i * unknowns + used[q]!]! += row[i]! * row[used[q]!]!;
    }
  }
  const scale = new Float64Array(unknowns);
  for (let i = 0; i < unknowns; i++) {
    const d = sums[i * unknowns + i]!;
    scale[i] = d > 0 ? 1 / Math.sqrt(d) : 0;
  }
  const normal = new Matrix(unknowns, unknowns);
  for (let i = 0; i < unknowns; i++) {
    for (let j = 0; j < i; j++) {
      const value = sums[i * unknowns + j]! * scale[i]! * scale[j]!;
      normal.set(i, j, value);
      normal.set(j, i, value);
    }
  }
  return { normal, scale };
}

function scaledRight({ unknowns, rows, misfits }: WeightedSystem, scale: Float64Array): Float64Array {
  const right = new Float64Array(unknowns);
  rows.forEach((row, k) => {
    const misfit = misfits[k]!;
    for (let i = 0; i < unknowns; i++) right[i]! -= row[i]! * misfit;
  });
  for (let i = 0; i < unknowns; i++) right[i]! *= scale[i]!;
  return right;
}

function unscaledInverse(cholesky: CholeskyDecomposition, scale: Float64Array): Float64Array {
  const n = scale.length;
  const inverse = cholesky.solve(Matrix.eye(n, n));
  const out = new Float64Array(n * n);
  for (let i = 0; i < n; i++) {
    for (let j = 0; j <= i; j++) {
      const value = inverse.get(i, j) * scale[i]! * scale[j]!;
      out[i * n + j] = value;
      out[j * n + i] = value;
    }
  }
  return out;
}
