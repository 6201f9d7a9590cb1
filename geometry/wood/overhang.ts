import type { GrainCut } from '../core/layout';
import type { Species } from './species';
import { SPECIES } from './species';
import { constant } from './sourced';

const NO_LOAD_FOUND = 'no published load for a seated edge was found';
export const EDGE_LOAD = constant('Load on the edge of an overhang', 100, 'lb', 'our choice', NO_LOAD_FOUND);
export const STRIP_WIDTH = constant('Width of top that takes that load', 12, 'in', 'our choice', NO_LOAD_FOUND);
export const DEFLECTION_SHARE = constant('Overhang divided by its greatest sag', 180, '', 'our choice', NO_LOAD_FOUND);

/** Which way an overhang's free length runs against the grain. */
export type OverhangWay = 'along' | 'across';

/** Smallest ratio of the table: what is reckoned with for a wood that Table 5-1 does not list. */
const WEAKEST_ACROSS = Math.min(...SPECIES.map((s) => s.acrossRatio?.tangential.value ?? 1));

/** Stiffness, psi, along the grain or across it; mixed staves count as the weaker, tangential, ones. */
export function stiffnessPsi(species: Species, way: OverhangWay, grain: GrainCut): number {
  if (way === 'along') return species.modulusPsi.value;
  const ratio = species.acrossRatio;
  if (!ratio) return species.modulusPsi.value * WEAKEST_ACROSS;
  return species.modulusPsi.value * (grain === 'edge' ? ratio.radial.value : ratio.tangential.value);
}

/** Second moment of a rectangle, in^4. */
const secondMoment = (width: number, thickness: number): number => (width * thickness ** 3) / 12;

/** Sag of a cantilever's end under a load there, inches: P L^3 / 3 E I. */
export function endLoadSag(
  loadLb: number,
  overhang: number,
  modulusPsi: number,
  width: number,
  thickness: number,
): number {
  return (loadLb * overhang ** 3) / (3 * modulusPsi * secondMoment(width, thickness));
}

/** Sag of a cantilever's end under an even load, inches: w L^4 / 8 E I, w in pounds per inch of length. */
export function evenLoadSag(
  loadLbPerInch: number,
  overhang: number,
  modulusPsi: number,
  width: number,
  thickness: number,
): number {
  return (loadLbPerInch * overhang ** 4) / (8 * modulusPsi * secondMoment(width, thickness));
}

/** Bending stress at a cantilever's root under an end load, psi: P L / (b t^2 / 6). */
export function rootStressPsi(loadLb: number, overhang: number, width: number, thickness: number): number {
  return (loadLb * overhang) / ((width * thickness ** 2) / 6);
}

export interface OverhangCheck {
  /** Sag under the edge load, inches, and the most that is allowed. */
  readonly sag: number;
  readonly allowed: number;
  /** Longest overhang within the limit, inches. */
  readonly longest: number;
  readonly holds: boolean;
}

/** Checks an overhang that nothing carries: 100 lb on the edge of a 12 in strip, sag at most overhang / 180. Advice only. */
export function checkOverhang(
  species: Species,
  grain: GrainCut,
  way: OverhangWay,
  overhang: number,
  thickness: number,
): OverhangCheck {
  const modulus = stiffnessPsi(species, way, grain);
  const sag = endLoadSag(EDGE_LOAD.value, overhang, modulus, STRIP_WIDTH.value, thickness);
  const allowed = overhang / DEFLECTION_SHARE.value;
  const stiffness = 3 * modulus * secondMoment(STRIP_WIDTH.value, thickness);
  const longest = Math.sqrt(stiffness / (EDGE_LOAD.value * DEFLECTION_SHARE.value));
  return { sag, allowed, longest, holds: sag <= allowed };
}
