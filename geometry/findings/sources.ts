import { HANDBOOK } from '../wood/handbook';

/** Where rules that share a source have it from. */
export const MOVEMENT_SOURCE = `${HANDBOOK}, Table 13-5 and eq. 4-5`;
export const PRACTICE = 'common practice';
export const CHOICE = 'our choice: no published figure was found';
export const MAKER = "the appliance maker's instructions";
