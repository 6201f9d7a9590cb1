import type { SourcedConstant } from '../wood/sourced';
import { WOOD_CONSTANTS } from '../wood/where-from';
import { COOKTOP_ABOVE } from './cooktop-heat';
import { COOKTOP_CLEAR } from './cooktop-near-edge';
import { UNSURE_LIMIT } from './corner-unsure';
import { NEEDS_CONNECTORS } from './joint-no-connectors';
import { FRONT_REACH } from './scribe-eats-depth';
import { SEASON_NOTE, SEASON_WARN } from './season-limits';
import { CORNER_RADIUS } from './sharp-corner';
import { CABINET_SIDE } from './sink-wider-than-base';
import { YEAR_RANGE } from './unheated-winter';
import { PLUMB_LIMIT } from './wall-out-of-plumb';

/** Every constant that a number or a finding rests on, for the list of where each is from. */
export const WHERE_FROM: readonly SourcedConstant[] = [
  ...WOOD_CONSTANTS,
  SEASON_NOTE,
  SEASON_WARN,
  FRONT_REACH,
  PLUMB_LIMIT,
  COOKTOP_CLEAR,
  COOKTOP_ABOVE,
  CABINET_SIDE,
  CORNER_RADIUS,
  NEEDS_CONNECTORS,
  UNSURE_LIMIT,
  YEAR_RANGE,
];
