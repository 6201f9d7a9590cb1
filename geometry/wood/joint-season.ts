import { toRadians } from '../core/angle';
import type { TopJoint } from '../top/types';
import type { Movement } from './types';

/** What the seasons do to one corner joint. Lengths inches, angles radians. */
export interface JointSeason {
  /** Opening at the worst season of a joint that is not glued. */
  readonly seasonal: number;
  /** Sideways travel of the longer leg's end when the joint is glued, at the worst season. */
  readonly swing: number;
  /** Growth of the corner at the wettest season, 0 or more: the legs press towards their walls. */
  readonly turnWet: number;
  /** Shrinkage of the corner at the driest season, 0 or more: the legs draw away from their walls. */
  readonly turnDry: number;
}

/** What of a joint the seasons work on. */
export type SeasonJoint = Pick<TopJoint, 'angles' | 'length' | 'kind'>;

/**
 * Change of the corner's angle for one unit of strain across the grain: half of sin 2f of either piece, added up. The run
 * that goes through a butt joint meets it along its own edge, which swelling does not turn.
 */
export function turnPerStrain({ angles, kind }: Pick<SeasonJoint, 'angles' | 'kind'>): number {
  const both = (Math.sin(2 * toRadians(angles[0])) + Math.sin(2 * toRadians(angles[1]))) / 2;
  return kind === 'butt' ? both / 2 : both;
}

/**
 * Seasonal opening of a joint, and the swing of its legs when it is glued.
 *
 * A piece that swells across the grain turns the line of its joint by strain / 2 x sin 2f, f being the angle between its
 * back edge and the joint. Closed at making, the joint opens by the sum of both turns x its length.
 *
 * @param joint - angles in degrees, length in inches
 * @param legs - lengths of the two runs from the corner to their far ends, inches
 */
export function jointSeason(
  joint: SeasonJoint,
  legs: readonly [number, number],
  movement: Pick<Movement, 'emc' | 'coefficient'>,
): JointSeason {
  const { make, summer, winter } = movement.emc;
  const perStrain = turnPerStrain(joint);
  const wetStrain = movement.coefficient * Math.max(0, Math.max(summer, winter) - make);
  const dryStrain = movement.coefficient * Math.max(0, make - Math.min(summer, winter));
  const worst = Math.abs(perStrain) * Math.max(wetStrain, dryStrain);
  // Past 90 degrees of f the corner closes when the wood swells, so wet and dry change places.
  const [growing, shrinking] = perStrain >= 0 ? [wetStrain, dryStrain] : [dryStrain, wetStrain];
  return {
    seasonal: worst * joint.length,
    swing: worst * Math.max(...legs),
    turnWet: Math.abs(perStrain) * growing,
    turnDry: Math.abs(perStrain) * shrinking,
  };
}

/** What makes a joint open less with the seasons, best first; each line with the opening it would leave, inches. */
export interface SeasonRemedy {
  readonly text: string;
  readonly seasonal: number;
}

/**
 * Ways to make a miter open less: edge-grain staves, and making it at the middle of the year's moistures.
 *
 * @param edgeCoefficient - radial coefficient of the wood, per 1 %
 * @returns only ways that help by at least a tenth, best first
 */
export function seasonRemedies(
  joint: SeasonJoint,
  movement: Pick<Movement, 'emc' | 'coefficient'>,
  edgeCoefficient: number,
): readonly SeasonRemedy[] {
  const { summer, winter } = movement.emc;
  const now = jointSeason(joint, [0, 0], movement).seasonal;
  const middle = (summer + winter) / 2;
  const ways: readonly SeasonRemedy[] = [
    {
      text: `Bring the wood to ${middle.toFixed(1)} % before cutting, half way between summer and winter`,
      seasonal: jointSeason(joint, [0, 0], { ...movement, emc: { make: middle, summer, winter } }).seasonal,
    },
    {
      text: 'Take edge-grain staves',
      seasonal: jointSeason(joint, [0, 0], { ...movement, coefficient: edgeCoefficient }).seasonal,
    },
  ];
  return ways.filter((way) => way.seasonal <= 0.9 * now).sort((a, b) => a.seasonal - b.seasonal);
}
