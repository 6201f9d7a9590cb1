import type { Point } from '../core/point';
import type { NetworkObservation, NetworkPoint, NetworkQuantity } from './network';
import { summarise } from './network-statistics';
import type { NetworkStatistics } from './network-statistics';
import { descend, gradientRow, linearise, prepareNetwork, toPoints } from './network-system';
import type { Linearised, Network } from './network-system';
import { newtonDescent } from './newton-descent';
import { DOUBTFUL_PIVOT, factorNormals, hasFullRank, openDirections } from './normal-equations';
import type { WeightedSystem } from './normal-equations';
import { quantityEquation } from './quantity-equation';

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
  | {
      readonly kind: 'open';
      readonly points: readonly Point[];
      readonly directions: readonly (readonly Point[])[];
      /** True when the observations would hold the points elsewhere, but stretch the figure flat here. */
      readonly flat: boolean;
      /** (value at these points - observed) / sd */
      readonly misfits: readonly number[];
    }
  /** No standstill was found; misfits are those of the best points met. */
  | { readonly kind: 'diverged'; readonly points: readonly Point[]; readonly misfits: readonly number[] };

/** Enough for a start 20 degrees off and readings 6 in wrong, which take about 15. */
const MAX_STEPS = 40;
/** Standstill, as a share of the network's size: 1e-9 in in a kitchen. */
const STANDSTILL = 1e-11;
/** A step that would lower chi2 by less than this share of it is lost in rounding. */
const NO_GAIN = 1e-13;
/** Misfits up to here, in standard deviations, are no contradiction. */
const AGREEMENT = 3.29;
const DAMPING_START = 1e-6;
const DAMPING_END = 1e4;

/**
 * Weighted least squares of a plane network of distances, angles and bearings: Gauss-Newton with step halving, damped
 * only where a step cannot be found otherwise; full Newton steps where readings disagree so much that Gauss-Newton
 * circles round the minimum.
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
  const network = prepareNetwork(points, observations);
  const first = gaussNewton(network);
  if (first.still) return conclude(network, first.coordinates, first.system);
  const { coordinates, still } = newtonDescent(network, first.coordinates, STANDSTILL * network.size);
  const system = linearise(network, coordinates);
  return still ? conclude(network, coordinates, system) : standstillMissed(network, coordinates, system);
}

interface Descent {
  readonly coordinates: Float64Array;
  readonly system: Linearised;
  readonly still: boolean;
}

function gaussNewton(network: Network): Descent {
  let coordinates = network.start;
  let system = linearise(network, coordinates);
  let damping = 0;
  for (let step = 0; step < MAX_STEPS; step++) {
    const move = system.chi2 < Infinity ? factorNormals(system, damping)?.step() : undefined;
    const next = move && descend(network, coordinates, move, system.chi2);
    if (next) {
      coordinates = next.coordinates;
      system = linearise(network, coordinates);
      const still = next.moved <= STANDSTILL * network.size && damping <= DAMPING_START;
      if (still) return { coordinates, system, still };
      damping = damping <= DAMPING_START ? 0 : damping / 10;
      continue;
    }
    const still = move !== undefined && gain(system, move) <= NO_GAIN * system.chi2 + Number.MIN_VALUE;
    if (still) return { coordinates, system, still };
    damping = Math.max(DAMPING_START, damping * 10);
    if (damping > DAMPING_END) break;
  }
  return { coordinates, system, still: false };
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
  if (!factors || (factors.pivot < DOUBTFUL_PIVOT && !hasFullRank(system))) return open(network, coordinates, system);
  const covariance = factors.covariance();
  const loosest = looseColumn(network, covariance);
  if (loosest) return open(network, coordinates, system, loosest);
  const statistics = summarise(system, network.observations, covariance, (quantity: NetworkQuantity) =>
    gradientRow(network, quantityEquation(quantity), coordinates, 1),
  );
  const dof = network.observations.length - network.unknowns;
  return { kind: 'adjusted', adjustment: { ...statistics, points, dof, chi2: system.chi2 } };
}

/**
 * The way in which a coordinate moves that is less certain than the whole network is large. A figure stretched flat is
 * held by nothing across, though rounding gives it full rank.
 */
function looseColumn({ unknowns, size }: Network, covariance: Float64Array): Float64Array | null {
  let worst = 0;
  for (let i = 1; i < unknowns; i++) {
    if (covariance[i * unknowns + i]! > covariance[worst * unknowns + worst]!) worst = i;
  }
  if (covariance[worst * unknowns + worst]! <= size * size) return null;
  const column = covariance.slice(worst * unknowns, (worst + 1) * unknowns);
  const length = Math.hypot(...column);
  return column.map((x) => x / length);
}

function open(network: Network, coordinates: Float64Array, system: Linearised, flat?: Float64Array): NetworkResult {
  const directions = (flat ? [flat] : openDirections(system)).map((v) => {
    const shift = Float64Array.from(network.unknownOf, (unknown) => (unknown < 0 ? 0 : v[unknown]!));
    return toPoints(shift);
  });
  return {
    kind: 'open',
    points: toPoints(coordinates),
    directions,
    flat: flat !== undefined,
    misfits: [...system.misfits],
  };
}

/** No standstill: the points drift in a direction that is hardly held, or the observations cannot be met. */
function standstillMissed(network: Network, coordinates: Float64Array, system: Linearised): NetworkResult {
  const agrees = system.misfits.every((misfit) => Math.abs(misfit) <= AGREEMENT);
  if (system.chi2 < Infinity && (agrees || !hasFullRank(system))) return open(network, coordinates, system);
  return { kind: 'diverged', points: toPoints(coordinates), misfits: [...system.misfits] };
}
