import type { Point } from '../core/point';
import type { NetworkObservation, NetworkPoint } from './network';
import type { WeightedSystem } from './normal-equations';
import { quantityEquation } from './quantity-equation';
import type { QuantityEquation } from './quantity-equation';

const MAX_HALVINGS = 12;

/** A network made ready for many evaluations; coordinates stand as x0, y0, x1, y1, ... */
export interface Network {
  readonly start: Float64Array;
  /** Index among the unknowns of every coordinate; -1 when it is fixed. */
  readonly unknownOf: Int32Array;
  readonly unknowns: number;
  readonly equations: readonly QuantityEquation[];
  readonly observations: readonly NetworkObservation[];
  /** Extent of the start, to measure standstill against. */
  readonly size: number;
}

export type Linearised = WeightedSystem & { readonly chi2: number };

/** @throws RangeError if no coordinate is free or a standard deviation is not positive */
export function prepareNetwork(points: readonly NetworkPoint[], observations: readonly NetworkObservation[]): Network {
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

/** Weighted rows and misfits at these coordinates. */
export function linearise(network: Network, coordinates: Float64Array): Linearised {
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

/** A quantity's value and its derivative by every unknown, times `weight`. */
export function gradientRow(
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

/** Weighted sum of squared misfits at these coordinates; infinite where they make no figure. */
export function chi2At({ equations, observations }: Network, coordinates: Float64Array): number {
  let sum = 0;
  for (let k = 0; k < equations.length; k++) {
    sum += misfit(equations[k]!, observations[k]!, equations[k]!.evaluate(coordinates)) ** 2;
  }
  return Number.isNaN(sum) ? Infinity : sum;
}

/** The longest of full, half, quarter ... step that does not raise chi2, or null. */
export function descend(
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

export function toPoints(coordinates: Float64Array): Point[] {
  const points: Point[] = [];
  for (let i = 0; i < coordinates.length; i += 2) points.push([coordinates[i]!, coordinates[i + 1]!]);
  return points;
}
