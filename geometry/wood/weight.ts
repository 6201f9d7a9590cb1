import { basicGravity, gravityAt } from './gravity';
import { SPECIES, speciesOf } from './species';

/** Pounds in a cubic foot of water (Wood Handbook chapter 4: 1000 kg/m3). */
export const WATER_LB_PER_CUBIC_FOOT = 62.43;
const CUBIC_INCHES_PER_CUBIC_FOOT = 1728;

/** Pounds in a cubic inch of wood of this gravity (volume at 12 %) at a moisture content in percent. */
export function densityLbPerCubicInch(gravity12: number, moisture: number): number {
  const gravity = gravityAt(basicGravity(gravity12), moisture);
  return (WATER_LB_PER_CUBIC_FOOT / CUBIC_INCHES_PER_CUBIC_FOOT) * gravity * (1 + moisture / 100);
}

/** Nothing is carried by fewer hands than it needs because its wood is not known. */
const HEAVIEST = Math.max(...SPECIES.map((s) => s.gravity12.value));

/**
 * Weight of a piece, pounds.
 *
 * @param netArea - square inches without cutouts; `thickness` - inches
 * @param species - key of the table; the heaviest wood is taken for one that is not in it
 * @param moisture - percent, as a rule that of making
 * @see Wood Handbook, chapter 4, density by equation 4-11
 */
export function pieceWeight(netArea: number, thickness: number, species: string, moisture: number): number {
  const gravity12 = speciesOf(species)?.gravity12.value ?? HEAVIEST;
  return netArea * thickness * densityLbPerCubicInch(gravity12, moisture);
}
