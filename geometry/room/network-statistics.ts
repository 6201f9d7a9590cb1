import type { NetworkObservation, NetworkQuantity } from './network';
import type { WeightedSystem } from './normal-equations';

/** Redundancy under which a reading is not checked by any other, so that its residual says nothing. */
export const UNCHECKED = 1e-6;

export interface NetworkStatistics {
  /** adjusted - observed, per observation, in its own unit. */
  readonly residuals: readonly number[];
  /** Redundancy numbers, 0 to 1; they add up to the degrees of freedom. */
  readonly redundancies: readonly number[];
  /** residual / (sd sqrt(redundancy)); null where the redundancy is under 1e-6. */
  readonly standardised: readonly (number | null)[];
  /** Correlation of the residuals of two observations; 0 when either is not checked by others. */
  residualCorrelation(i: number, j: number): number;
  /** Any quantity at the adjusted points, with its variance. */
  predict(quantity: NetworkQuantity): Prediction;
  /** Covariance of two predictions. */
  covarianceOf(a: Prediction, b: Prediction): number;
}

export interface Prediction {
  readonly value: number;
  readonly variance: number;
  /** Derivative by every unknown. */
  readonly gradient: Float64Array;
  /** Covariance matrix times the gradient. */
  readonly spread: Float64Array;
}

/**
 * Residuals, redundancies and predictions of a network at its adjusted points.
 *
 * @param system - linearised there
 * @param covariance - inverse of its normal matrix, row by row
 * @param gradientOf - value and derivatives of any quantity there
 */
export function summarise(
  system: WeightedSystem,
  observations: readonly NetworkObservation[],
  covariance: Float64Array,
  gradientOf: (quantity: NetworkQuantity) => { readonly row: Float64Array; readonly value: number },
): NetworkStatistics {
  const { rows, misfits } = system;
  const spreads = rows.map((row) => times(covariance, row));
  const redundancies = rows.map((row, k) => Math.max(0, 1 - inner(row, spreads[k]!)));
  const standardised = redundancies.map((r, k) => (r < UNCHECKED ? null : misfits[k]! / Math.sqrt(r)));
  return {
    residuals: observations.map((o, k) => misfits[k]! * o.sd),
    redundancies,
    standardised,
    residualCorrelation(i, j) {
      if (standardised[i] === null || standardised[j] === null) return 0;
      const shared = (i === j ? 1 : 0) - inner(rows[i]!, spreads[j]!);
      return shared / Math.sqrt(redundancies[i]! * redundancies[j]!);
    },
    predict(quantity) {
      const { row: gradient, value } = gradientOf(quantity);
      const spread = times(covariance, gradient);
      return { value, gradient, spread, variance: Math.max(0, inner(gradient, spread)) };
    },
    covarianceOf: (a, b) => inner(a.gradient, b.spread),
  };
}

function inner(a: Float64Array, b: Float64Array): number {
  let sum = 0;
  for (let i = 0; i < a.length; i++) sum += a[i]! * b[i]!;
  return sum;
}

function times(matrix: Float64Array, vector: Float64Array): Float64Array {
  const n = vector.length;
  const out = new Float64Array(n);
  for (let j = 0; j < n; j++) {
    const x = vector[j]!;
    if (x === 0) continue;
    for (let i = 0; i < n; i++) out[i]! += matrix[j * n + i]! * x;
  }
  return out;
}
