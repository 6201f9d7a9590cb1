import type { ClimateYear, GrainCut, Material } from '../core/layout';
import type { ShopSettings } from '../core/settings';
import { equilibriumMoisture } from './moisture';
import type { Species } from './species';
import { SPECIES, speciesOf } from './species';
import type { Movement } from './types';

/** Moisture range in which the change coefficients were measured, percent (Wood Handbook Table 13-5). */
export const MEASURED_MOISTURE: readonly [number, number] = [6, 14];

const SIXTEENTH = 1 / 16;

/** Keeps a size that is already a whole sixteenth from being pushed up by the last bit of a float. */
const UP_SLACK = 1e-9;

/** Next whole sixteenth of an inch at or above a size. */
export const upToSixteenth = (inches: number): number =>
  Math.max(0, Math.ceil(inches / SIXTEENTH - UP_SLACK)) * SIXTEENTH;

/** Change of width per 1 % of moisture: tangential for flat-sawn, radial for edge grain, their mean for mixed staves. */
export function changeCoefficient(species: Pick<Species, 'radial' | 'tangential'>, grain: GrainCut): number {
  if (grain === 'flat') return species.tangential.value;
  if (grain === 'edge') return species.radial.value;
  return (species.radial.value + species.tangential.value) / 2;
}

/** The liveliest wood of the table: what is reckoned with while the wood is not known. */
const liveliest = (grain: GrainCut): number => Math.max(...SPECIES.map((s) => changeCoefficient(s, grain)));

/** Change of a width across the grain, inches; plus grows. `fromMoisture` and `toMoisture` in percent. */
export function widthChange(width: number, coefficient: number, fromMoisture: number, toMoisture: number): number {
  return width * coefficient * (toMoisture - fromMoisture);
}

/** Moisture contents of making, summer and winter, percent. */
export function moistureYear(climate: ClimateYear): Movement['emc'] {
  return {
    make: equilibriumMoisture(climate.make),
    summer: equilibriumMoisture(climate.summer),
    winter: equilibriumMoisture(climate.winter),
  };
}

/**
 * What the seasons do across the grain of the deepest run.
 *
 * The screws at the front line are fixed, so the rearmost ones travel with the wood between the two lines. Outside 6 to
 * 14 % of moisture the coefficient is used all the same and the answer is marked `extrapolated`. A wood that is not in
 * the table is reckoned as the liveliest one that is.
 *
 * @param deepestRunDepth - inches, back edge to front edge
 * @returns lengths in inches, moisture in percent
 * @see Wood Handbook, chapter 13, Table 13-5
 */
export function movementOf(
  material: Pick<Material, 'species' | 'grain'>,
  climate: ClimateYear,
  deepestRunDepth: number,
  settings: Pick<ShopSettings, 'screws'>,
): Movement {
  const species = speciesOf(material.species);
  const coefficient = species ? changeCoefficient(species, material.grain) : liveliest(material.grain);
  const emc = moistureYear(climate);
  const wettest = Math.max(emc.make, emc.summer, emc.winter);
  const driest = Math.min(emc.make, emc.summer, emc.winter);
  const { shank, frontLine, backLine } = settings.screws;
  const betweenLines = Math.max(0, deepestRunDepth - frontLine - backLine);
  return {
    emc,
    acrossPerDepth: widthChange(deepestRunDepth, coefficient, driest, wettest),
    slot: upToSixteenth(shank + widthChange(betweenLines, coefficient, driest, wettest)),
    swelling: widthChange(deepestRunDepth, coefficient, emc.make, wettest),
    shrinkage: -widthChange(deepestRunDepth, coefficient, emc.make, driest),
    coefficient,
    grain: material.grain,
    extrapolated: driest < MEASURED_MOISTURE[0] || wettest > MEASURED_MOISTURE[1],
    assumedSpecies: species === null,
  };
}

/** Growth of a run of this depth from making to its wettest season, inches. */
export function swellingOf(depth: number, movement: Pick<Movement, 'emc' | 'coefficient'>): number {
  const { make, summer, winter } = movement.emc;
  return Math.max(0, widthChange(depth, movement.coefficient, make, Math.max(summer, winter)));
}

/** Shrinkage of a run of this depth from making to its driest season, inches. */
export function shrinkageOf(depth: number, movement: Pick<Movement, 'emc' | 'coefficient'>): number {
  const { make, summer, winter } = movement.emc;
  return Math.max(0, -widthChange(depth, movement.coefficient, make, Math.min(summer, winter)));
}

/** Smallest back gap that a run of this depth may have: its swelling, up to the next sixteenth. */
export const leastBackGap = (depth: number, movement: Pick<Movement, 'emc' | 'coefficient'>): number =>
  upToSixteenth(swellingOf(depth, movement));
