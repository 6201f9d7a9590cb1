import { LIFTING, TEAM_LIFT } from './handbook';
import { constant } from './sourced';

export const LOAD_CONSTANT = constant('Load one person lifts at best', 51, 'lb', 'published', `${LIFTING}, p. 7`);

export const TEAM_FACTORS = [
  constant('Share of its strength one person has alone', 1, '', 'published', `${LIFTING}, p. 7`),
  constant('Share of their strengths two have together', 2 / 3, '', 'published', TEAM_LIFT),
  constant('Share of their strengths three have together', 1 / 2, '', 'published', TEAM_LIFT),
] as const;

export const LONG_PIECE = constant('Length from which two carry', 96, 'in', 'common practice', '');

export const LIFT_CAUTION =
  'The lifting equation is for lifting in one place, not for carrying; on stairs or a wet floor people manage less.';

/** Hands a load needs. */
export interface Hands {
  /** 1 to 3 by the equation; 4 stands for 'four people or a lifting aid, or join on site'. */
  readonly people: 1 | 2 | 3 | 4;
  /** What that many can lift together, pounds; null for 4, for which no figure is given. */
  readonly capacityLb: number | null;
  /** Equal share of the load over the recommended weight for a fair grip close to the body. Over 1 is heavy. */
  readonly liftingIndex: number;
}

/** Two people over 8 ft, whatever it weighs. */
const leastPeople = (length: number): number => (length > LONG_PIECE.value ? 2 : 1);

/** What `people` can lift together, pounds, by the lifting equation's load constant and the team factors. */
export const teamCapacityLb = (people: 1 | 2 | 3): number =>
  LOAD_CONSTANT.value * people * TEAM_FACTORS[people - 1]!.value;

/**
 * People to carry a piece: the fewest whose strength together covers it, two at least over 8 ft, four or a lifting aid
 * over what three can.
 *
 * @param length - longest measure, inches
 */
export function handsFor(weightLb: number, length: number): Hands {
  const least = leastPeople(length);
  const people = ([1, 2, 3] as const).find((n) => n >= least && teamCapacityLb(n) >= weightLb) ?? 4;
  return {
    people,
    capacityLb: people === 4 ? null : teamCapacityLb(people),
    liftingIndex: weightLb / people / CARRY_LIMIT_LB,
  };
}

export type Grip = 'good' | 'fair' | 'poor';

/** One lift. Inches and degrees; `perMinute` lifts for `hours` hours. */
export interface Lift {
  readonly horizontal: number;
  readonly vertical: number;
  readonly distance: number;
  readonly asymmetryDeg: number;
  readonly perMinute: number;
  readonly hours: 1 | 2 | 8;
  readonly grip: Grip;
}

/** Table 5: frequency, then the multiplier for work of up to 1, 2 and 8 hours, origin under 30 in where they differ. */
const FREQUENCY: readonly (readonly [perMinute: number, h1: number, h2: number, h8Low: number, h8High: number])[] = [
  [0.2, 1, 0.95, 0.85, 0.85],
  [0.5, 0.97, 0.92, 0.81, 0.81],
  [1, 0.94, 0.88, 0.75, 0.75],
  [2, 0.91, 0.84, 0.65, 0.65],
  [3, 0.88, 0.79, 0.55, 0.55],
  [4, 0.84, 0.72, 0.45, 0.45],
  [5, 0.8, 0.6, 0.35, 0.35],
  [6, 0.75, 0.5, 0.27, 0.27],
  [7, 0.7, 0.42, 0.22, 0.22],
  [8, 0.6, 0.35, 0.18, 0.18],
  [9, 0.52, 0.3, 0, 0.15],
  [10, 0.45, 0.26, 0, 0.13],
];

/** Multiplier of the first listed frequency at or above this one; 0 above the table, where the equation allows nothing. */
function frequencyMultiplier({ perMinute, hours, vertical }: Lift): number {
  const row = FREQUENCY.find(([f]) => f >= perMinute);
  if (!row) return 0;
  if (hours === 1) return row[1];
  if (hours === 2) return row[2];
  return vertical < 30 ? row[3] : row[4];
}

/** Table 7: a good, fair or poor grip, hands under 30 in and from there up. */
const GRIP: Readonly<Record<Grip, readonly [low: number, high: number]>> = {
  good: [1, 1],
  fair: [0.95, 1],
  poor: [0.9, 0.9],
};

/** The six multipliers of a lift, each 0 to 1. */
export interface LiftMultipliers {
  readonly horizontal: number;
  readonly vertical: number;
  readonly distance: number;
  readonly asymmetry: number;
  readonly frequency: number;
  readonly grip: number;
}

/**
 * Multipliers of the lifting equation. Under 10 in, H and D count as 10; past H 25, V 70, D 70 in or 135 degrees the
 * multiplier is 0.
 *
 * @see NIOSH 94-110, p. 7 and Tables 1 to 7
 */
export function liftMultipliers(lift: Lift): LiftMultipliers {
  return {
    horizontal: lift.horizontal > 25 ? 0 : 10 / Math.max(lift.horizontal, 10),
    vertical: lift.vertical > 70 ? 0 : 1 - 0.0075 * Math.abs(lift.vertical - 30),
    distance: lift.distance > 70 ? 0 : 0.82 + 1.8 / Math.max(lift.distance, 10),
    asymmetry: lift.asymmetryDeg > 135 ? 0 : 1 - 0.0032 * lift.asymmetryDeg,
    frequency: frequencyMultiplier(lift),
    grip: GRIP[lift.grip][lift.vertical < 30 ? 0 : 1],
  };
}

/** Recommended weight limit of one lift, pounds: 51 lb x six multipliers; 0 where nothing is recommended. */
export function recommendedLb(lift: Lift): number {
  return Object.values(liftMultipliers(lift)).reduce((weight, multiplier) => weight * multiplier, LOAD_CONSTANT.value);
}

/** Picking a top up from the cabinets' height: hands 15 in out, 30 in up, moved 25 in, fair grip, now and then. */
export const CARRY_LIFT: Lift = {
  horizontal: 15,
  vertical: 30,
  distance: 25,
  asymmetryDeg: 0,
  perMinute: 0.2,
  hours: 1,
  grip: 'fair',
};

/** Recommended weight for one pair of hands at such a carry, pounds. */
export const CARRY_LIMIT_LB = recommendedLb(CARRY_LIFT);
