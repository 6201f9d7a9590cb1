import { HANDBOOK, LIFTING, TEAM_LIFT } from '../wood/handbook';
import type { Standing } from '../wood/sourced';

/** A formula that figures are worked out by, for the list of where each is from. */
export interface SourcedFormula {
  readonly name: string;
  readonly text: string;
  readonly standing: Standing;
  readonly source: string;
}

/** Every formula of wood and hardware that a screen shows a result of. */
export const FORMULAS: readonly SourcedFormula[] = [
  {
    name: 'Moisture that wood settles to',
    text: 'Hailwood-Horrobin form of temperature and relative humidity; humidity held to 99 %.',
    standing: 'published',
    source: `${HANDBOOK} eq. 4-5; FPL-RN-0268`,
  },
  {
    name: 'Change of width across the grain',
    text: 'width x coefficient x change of moisture; the coefficients hold from 6 to 14 %.',
    standing: 'published',
    source: `${HANDBOOK} chapter 13`,
  },
  {
    name: 'Coefficient of mixed staves',
    text: 'mean of the radial and the tangential coefficient.',
    standing: 'our choice',
    source: 'the handbook gives the two, not the mean',
  },
  {
    name: 'Seasonal opening of a joint',
    text: 'strain / 2 x (sin 2f + sin 2g) x length, f and g the angles of the two pieces at the joint.',
    standing: 'computed',
    source: 'geometry of two pieces that swell across the grain only',
  },
  {
    name: 'Month by month',
    text: 'temperature and humidity swing evenly between winter and summer; a finished top follows weeks behind and less far.',
    standing: 'our choice',
    source: '',
  },
  {
    name: 'Weight of a piece',
    text: 'volume x gravity at its moisture x (1 + moisture) x 62.43 lb a cubic foot.',
    standing: 'published',
    source: `${HANDBOOK} chapter 4, eq. 4-11`,
  },
  {
    name: 'People to carry',
    text: 'the fewest whose strength together covers it: 51 lb each, two thirds of the sum for two, half for three.',
    standing: 'published',
    source: `${LIFTING}; ${TEAM_LIFT}`,
  },
  {
    name: 'Lifting index',
    text: 'equal share of the weight over the recommended limit at H 15, V 30, D 25 in, fair grip. For lifting, not for carrying.',
    standing: 'published',
    source: `${LIFTING}, p. 7`,
  },
  {
    name: 'Longest round a corner',
    text: 'least of a / cos t + b / sin t - w / (sin t cos t) over t; planar, without tilting.',
    standing: 'published',
    source: 'Moretti, College Math. J. 33(3), 2002, 196-200',
  },
  {
    name: 'Screw hold in side grain',
    text: '15,700 x gravity squared x shank x thread, the mean of tests; a fixing carries a small share of it.',
    standing: 'published',
    source: `${HANDBOOK} eq. 8-10a`,
  },
  {
    name: 'Pilot hole',
    text: '90 % of the root from gravity 0.60 up, 70 % from 0.50, none below; root two thirds of the shank.',
    standing: 'second hand',
    source: 'NDS commentary 11.1.2 and a code copy',
  },
  {
    name: 'Wood left beside a mortise',
    text: '(distance from the point - half the width) x sin f - depth x cos f.',
    standing: 'computed',
    source: 'geometry of a rectangle in a wedge',
  },
  {
    name: 'Sag of an overhang',
    text: 'load x overhang cubed / (3 x stiffness x second moment of the strip).',
    standing: 'published',
    source: `cantilever beam; stiffness from ${HANDBOOK} Tables 5-1 and 5-3b`,
  },
];
