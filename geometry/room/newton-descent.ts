import { CholeskyDecomposition, Matrix } from 'ml-matrix';

import { chi2At, descend, linearise } from './network-system';
import type { Network } from './network-system';

const MAX_STEPS = 40;
/** Offset for differences of the gradient, as a share of the network's size: 1e-3 in in a kitchen. */
const DIFFERENCE = 1e-5;
const SHIFT_START = 1e-3;
const SHIFT_END = 1e6;
/** Two readings of chi2 that differ by less than this share differ by rounding. */
const NO_GAIN = 1e-13;

/**
 * Newton's method with the full second derivatives of chi2, shifted until they curve upwards everywhere. Some twenty
 * times the work of a Gauss-Newton step, so only for networks where that does not come to rest: readings that
 * contradict each other stretch a figure flat, and there the curvature of the residuals decides.
 *
 * @param standstill - inches under which a step counts as none
 */
export function newtonDescent(
  network: Network,
  start: Float64Array,
  standstill: number,
): { readonly coordinates: Float64Array; readonly still: boolean } {
  let coordinates = start;
  for (let step = 0; step < MAX_STEPS; step++) {
    const chi2 = chi2At(network, coordinates);
    if (!(chi2 < Infinity)) return { coordinates, still: false };
    const gradient = gradientAt(network, coordinates);
    const move = newtonStep(gradient, hessianAt(network, coordinates));
    if (!move) return { coordinates, still: false };
    const fall = -move.reduce((sum, x, i) => sum + x * gradient[i]!, 0);
    const next = descend(network, coordinates, move, chi2);
    if (!next) return { coordinates, still: fall <= NO_GAIN * chi2 };
    coordinates = next.coordinates;
    if (next.moved <= standstill || fall <= NO_GAIN * NO_GAIN * chi2) return { coordinates, still: true };
  }
  return { coordinates, still: false };
}

/** Half the derivative of chi2 by every unknown. */
function gradientAt(network: Network, coordinates: Float64Array): Float64Array {
  const { rows, misfits, unknowns } = linearise(network, coordinates);
  const gradient = new Float64Array(unknowns);
  rows.forEach((row, k) => row.forEach((x, i) => (gradient[i]! += x * misfits[k]!)));
  return gradient;
}

/** Half the second derivatives, by differences of the gradient. */
function hessianAt(network: Network, coordinates: Float64Array): Matrix {
  const h = DIFFERENCE * network.size;
  const hessian = new Matrix(network.unknowns, network.unknowns);
  network.unknownOf.forEach((unknown, slot) => {
    if (unknown < 0) return;
    const shifted = (by: number): Float64Array =>
      gradientAt(
        network,
        coordinates.map((x, i) => (i === slot ? x + by : x)),
      );
    const [plus, minus] = [shifted(h), shifted(-h)];
    for (let i = 0; i < network.unknowns; i++) hessian.set(i, unknown, (plus[i]! - minus[i]!) / (2 * h));
  });
  return Matrix.add(hessian, hessian.transpose()).mul(0.5);
}

function newtonStep(gradient: Float64Array, hessian: Matrix): Float64Array | null {
  const sizes = hessian.diagonal().map((d) => Math.max(Math.abs(d), Number.MIN_VALUE));
  for (let shift = 0; shift <= SHIFT_END; shift = shift === 0 ? SHIFT_START : shift * 10) {
    const shifted = hessian.clone();
    sizes.forEach((size, i) => shifted.set(i, i, shifted.get(i, i) + shift * size));
    const cholesky = new CholeskyDecomposition(shifted);
    if (!cholesky.isPositiveDefinite()) continue;
    const solved = cholesky.solve(Matrix.columnVector(gradient));
    return gradient.map((_, i) => -solved.get(i, 0));
  }
  return null;
}
