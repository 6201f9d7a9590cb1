import type { Point } from '../core/point';
import type { NetworkObservation, NetworkPoint, NetworkQuantity } from './network';
import { factorNormals, openDirections } from './normal-equations';
import type { WeightedSystem } from './normal-equations';
import { quantityEquation } from './quantity-equation';
import type { QuantityEquation } from './quantity-equation';
import { summarise } from './network-statistics';
import type { NetworkStatistics } from './network-statistics';

export interface Adjustment extends NetworkStatistics {
  /** Adjusted points, in the order of the input. */
  readonly points: readonly Point[];
  /** Observations less unknowns. */
  readonly dof: number;
  /** Weighted sum of squared residuals. */
  readonly chi2: number;
}

export type NetworkResult =
  | { readonly kind: 'adjusted'; readonly adjustment: Adjustment }
  /** Nothing holds the points in these directions; each gives the shift of every point. */
  | { readonly kind: 'open'; readonly points: readonly Point[]; readonly directions: readonly (readonly Point[])[] }
  /** No standstill was found; residuals are those of the best points met. */
  | { readonly kind: 'diverged'; readonly points: readonly Point[]; readonly standardised: readonly number[] };

/** Enough for a start 20 degrees off and readings 6 in wrong, which take about 15. */
const MAX_STEPS = 80;
const MAX_HALVINGS = 12;
/** Standstill, as a share of the network's size: 1e-9 in in a kitchen. */
const STANDSTILL = 1e-11;
/** A step that would lower chi2 by less than this share of it is lost in rounding. */
const NO_GAIN = 1e-13;
const DAMPING_START = 1e-6;
const DAMPING_END = 1e4;

/**
 * Weighted least squares of a plane network of distances, angles and bearings: Gauss-Newton with step halving, damped
 * only where a step cannot be found otherwise.
 *
 * @param points - start values; free coordinates are the unknowns
 * @param observations - with a-priori standard deviations, which are not scaled by the fit
 * @throws RangeError if no coordinate is free or a standard deviation is not positive
 * @see Mikhail & Ackermann, Observations and Least Squares (1976), ch. 7 and 9; Baarda's data snooping for the tests
 */
export function adjustNetwork(
  points: readonly NetworkPoint[],
  observations: readonly NetworkObservation[],
): NetworkResult {
  const network = prepare(points, observations);
  let coordinates = network.start;
  let system = linearise(network, coordinates);
  let damping = 0;
  for (let step = 0; step < MAX_STEPS; step++) {
    const move = system.chi2 < Infinity ? factorNormals(system, damping)?.step() : undefined;
    const next = move && descend(network, coordinates, move, system.chi2);
    if (next) {
      coordinates = next.coordinates;
      system = linearise(network, coordinates);
      const still = next.moved <= STANDSTILL * network.size;
      if (still && damping <= DAMPING_START) return conclude(network, coordinates, system);
      damping = damping <= DAMPING_START ? 0 : damping / 10;
      continue;
    }
    if (move && gain(system, move) <= NO_GAIN * system.chi2 + Number.MIN_VALUE) {
      return conclude(network, coordinates, system);
    }
    damping = Math.max(DAMPING_START, damping * 10);
    if (damping > DAMPING_END) break;
  }
  return diverged(network, coordinates, system);
}

interface Network {
  readonly start: Float64Array;
  /** Index among the unknowns of every coordinate; -1 when it is fixed. */
  readonly unknownOf: Int32Array;
  readonly unknowns: number;
  readonly equations: readonly QuantityEquation[];
  readonly observations: readonly NetworkObservation[];
  /** Extent of the start, to measure standstill against. */
  readonly size: number;
}

type Linearised = WeightedSystem & { readonly chi2: number };

function prepare(points: readonly NetworkPoint[], observations: readonly NetworkObservation[]): Network {
  const unknownOf = new Int32Array(points.length * 2).fill(-1);
  let unknowns = 0;
  points.forEach((p, i) => {
    if (p.freeX) unknownOf[2 * i] = unknowns++;
    if (p.freeY) unknownOf[2 * i + 1] = unknowns++;
  });
  if (unknowns === 0) throw new RangeError('a network needs at least one free coordinate');
  for (const { sd } of observations)
    if (!(sd > 0)) throw new RangeError(`a standard deviation must be over 0, got ${sd}`);
  const start = Float64Array.from(points.flatMap((p) => p.start));
  const xs = points.map((p) => p.start[0]);
  const ys = points.map((p) => p.start[1]);
  const size = Math.max(Math.max(...xs) - Math.min(...xs), Math.max(...ys) - Math.min(...ys), 1);
  const equations = observations.map((o) => quantityEquation(o.quantity));
  return { start, unknownOf, unknowns, equations, observations, size };
}

function misfit(equation: QuantityEquation, observation: NetworkObservation, value: number): number {
  const difference = value - observation.value;
  return (equation.angular ? nearest(difference) : difference) / observation.sd;
}

const TURN = 2 * Math.PI;

/** The same angle within half a turn of 0. */
const nearest = (angle: number): number => angle - TURN * Math.round(angle / TURN);

function linearise(network: Network, coordinates: Float64Array): Linearised {
  const { equations, observations, unknowns } = network;
  const misfits = new Float64Array(equations.length);
  let chi2 = 0;
  const rows = equations.map((equation, k) => {
    const { row, value } = gradientRow(network, equation, coordinates, 1 / observations[k]!.sd);
    misfits[k] = misfit(equation, observations[k]!, value);
    chi2 += misfits[k]! ** 2;
    return row;
  });
  return { unknowns, rows, misfits, chi2: Number.isNaN(chi2) ? Infinity : chi2 };
}

function gradientRow(
  { unknownOf, unknowns }: Network,
  equation: QuantityEquation,
  coordinates: Float64Array,
  weight: number,
): { row: Float64Array; value: number } {
  const gradient = new Float64Array(equation.slots.length);
  const value = equation.evaluate(coordinates, gradient);
  const row = new Float64Array(unknowns);
  equation.slots.forEach((slot, s) => {
    const unknown = unknownOf[slot]!;
    if (unknown >= 0) row[unknown]! += gradient[s]! * weight;
  });
  return { row, value };
}

function chi2At({ equations, observations }: Network, coordinates: Float64Array): number {
  let sum = 0;
  for (let k = 0; k < equations.length; k++) {
    sum += misfit(equations[k]!, observations[k]!, equations[k]!.evaluate(coordinates)) ** 2;
  }
  return Number.isNaN(sum) ? Infinity : sum;
}

/** The longest of full, half, quarter ... step that does not raise chi2, or null. */
function descend(
  network: Network,
  from: Float64Array,
  move: Float64Array,
  chi2: number,
): { coordinates: Float64Array; moved: number } | null {
  const length = move.reduce((m, x) => Math.max(m, Math.abs(x)), 0);
  if (!Number.isFinite(length)) return null;
  for (let halving = 0, share = 1; halving <= MAX_HALVINGS; halving++, share /= 2) {
    const coordinates = from.map((x, i) => {
      const unknown = network.unknownOf[i]!;
      return unknown < 0 ? x : x + share * move[unknown]!;
    });
    if (chi2At(network, coordinates) <= chi2) return { coordinates, moved: share * length };
  }
  return null;
}

/** What the linear model says chi2 would fall by. */
function gain({ rows, misfits }: WeightedSystem, move: Float64Array): number {
  let sum = 0;
  rows.forEach((row, k) => {
    let change = 0;
    for (let i = 0; i < row.length; i++) change += row[i]! * move[i]!;
    sum += misfits[k]! ** 2 - (misfits[k]! + change) ** 2;
  });
  return sum;
}

function conclude(network: Network, coordinates: Float64Array, system: Linearised): NetworkResult {
  const points = toPoints(coordinates);
  const factors = factorNormals(system);
  if (!factors) {
    const directions = openDirections(system).map((v) => {
      const shift = Float64Array.from(network.unknownOf, (unknown) => (unknown < 0 ? 0 : v[unknown]!));
      return toPoints(shift);
    });
    return { kind: 'open', points, directions };
  }
  const statistics = summarise(system, network.observations, factors.covariance(), (quantity: NetworkQuantity) =>
    gradientRow(network, quantityEquation(quantity), coordinates, 1),
  );
  const dof = network.observations.length - network.unknowns;
  return { kind: 'adjusted', adjustment: { ...statistics, points, dof, chi2: system.chi2 } };
}

function diverged(network: Network, coordinates: Float64Array, system: Linearised): NetworkResult {
  const open = factorNormals(system) === null && system.chi2 < Infinity;
  const points = toPoints(coordinates);
  if (open) return conclude(network, coordinates, system);
  return { kind: 'diverged', points, standardised: [...system.misfits] };
}

function toPoints(coordinates: Float64Array): Point[] {
  const points: Point[] = [];
  for (let i = 0; i < coordinates.length; i += 2) points.push([coordinates[i]!, coordinates[i + 1]!]);
  return points;
}
