import { constant } from './sourced';

const GUESS = "a first guess; the shop's own times replace it";
const hours = (name: string, value: number) => constant(name, value, 'h', 'our choice', GUESS);

/** Hours of work the order of work reckons with. */
export const EFFORT = {
  receivePerSlab: hours('Receive and check one slab', 0.25),
  cutPerPiece: hours('Cut one piece', 0.5),
  mortisePerConnector: hours('Mortise for one connector, both sides', 0.1),
  dryFitPerJoint: hours('Dry fit one joint', 0.5),
  gluePerJoint: hours('Glue up one joint', 0.75),
  edgePerFoot: hours('Profile a foot of edge', 0.05),
  sandPerSqFt: hours('Sand a square foot of face through all grits', 0.08),
  coatPerSqFt: hours('One coat on a square foot', 0.02),
  load: hours('Load and drive', 1.5),
  clearPerBase: hours('Take drawers and doors out of one cabinet', 0.15),
  levelPerBase: hours('Level and shim one cabinet', 0.2),
  setPerSection: hours('Carry in and set one section', 0.75),
  scribePerRun: hours('Scribe one run', 0.75),
  fastenPerRun: hours('Fasten one run', 0.5),
  siteJoint: hours('Pull one site joint or seam together', 1),
  cutoutEach: hours('Cut one opening', 1),
  handOver: hours('Clean up and hand over', 0.5),
} as const;

export const GLUE_OPEN_MINUTES = constant(
  'Glue stays open',
  10,
  'min',
  'from memory',
  'yellow wood glue at room temperature',
);
export const CLAMPS_APART = constant(
  'Clamps apart at most',
  10,
  'in',
  'second hand',
  "two glue makers' guides: 8 to 12 in",
);
export const STOP_SHORT = constant('Edge profile stops short of a site seam', 2, 'in', 'common practice', '');
export const CHECK_MOISTURE = constant(
  "Moisture reading within this of the shop's own",
  1.5,
  '%',
  'common practice',
  '',
);
