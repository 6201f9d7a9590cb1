import { buttCrossGrain } from './butt-cross-grain';
import { cabinetsOutOfLevel } from './cabinets-out-of-level';
import { cannotLay } from './cannot-lay';
import { checkCorner } from './check-corner';
import { connectorComesThrough } from './connector-comes-through';
import { connectorNearPoint } from './connector-near-point';
import type { FindingContext } from './context';
import { cooktopHeat } from './cooktop-heat';
import { cooktopNearEdge } from './cooktop-near-edge';
import { cornerNotMeasured } from './corner-not-measured';
import { cornerSwings } from './corner-swings';
import { cornerUnsure } from './corner-unsure';
import { cutoutOutsideCabinet } from './cutout-outside-cabinet';
import { cutoutsTooClose } from './cutouts-too-close';
import { dishwasherSteam } from './dishwasher-steam';
import { endUnfinished } from './end-unfinished';
import { faceDown } from './face-down';
import { factsOf, type Rule } from './facts';
import { finishFoodPrep } from './finish-food-prep';
import { finishNone } from './finish-none';
import { gapNotCovered } from './gap-not-covered';
import { gapOpensInWinter } from './gap-opens-in-winter';
import { gapUnderSwelling } from './gap-under-swelling';
import { grainBreaksAtSeam } from './grain-breaks-at-seam';
import { heavySection } from './heavy-section';
import { jointNoAccess } from './joint-no-access';
import { jointNoConnectors } from './joint-no-connectors';
import { lowerFromAbove } from './lower-from-above';
import { madeOutOfRange } from './made-out-of-range';
import { miterOpens } from './miter-opens';
import { moistureOutOfRange } from './moisture-out-of-range';
import { narrowStrip } from './narrow-strip';
import { noSlabListed } from './no-slab-listed';
import { noSpareReading } from './no-spare-reading';
import { oilyRags } from './oily-rags';
import { overhangUnsupported } from './overhang-unsupported';
import { pieceOverSlab } from './piece-over-slab';
import { readingSuspect } from './reading-suspect';
import { readingsLoose } from './readings-loose';
import { screwLength } from './screw-length';
import { seamNearCutout } from './seam-near-cutout';
import { seamNearEnd } from './seam-near-end';
import { seamNoCleats } from './seam-no-cleats';
import { seamUnsupported } from './seam-unsupported';
import { scribeEatsDepth } from './scribe-eats-depth';
import { sectionWontGoIn } from './section-wont-go-in';
import { sharpCorner } from './sharp-corner';
import { shortPiece } from './short-piece';
import { sinkWiderThanBase } from './sink-wider-than-base';
import { slabNoNeighbours } from './slab-no-neighbours';
import { slabsShort } from './slabs-short';
import { speciesUnsure } from './species-unsure';
import { stockDiffers } from './stock-differs';
import { supportMissing } from './support-missing';
import type { Finding, Severity } from './types';
import { undermountEndGrain } from './undermount-end-grain';
import { unheatedWinter } from './unheated-winter';
import { wallOutOfPlumb } from './wall-out-of-plumb';

/** Every rule, in the order in which a job goes: the room, the tops, the wood, the slabs, the fitting. */
export const RULES: readonly Rule[] = [
  readingSuspect,
  checkCorner,
  readingsLoose,
  noSpareReading,
  cornerNotMeasured,
  cornerUnsure,
  cannotLay,
  gapUnderSwelling,
  gapNotCovered,
  gapOpensInWinter,
  scribeEatsDepth,
  wallOutOfPlumb,
  seamUnsupported,
  seamNearCutout,
  seamNearEnd,
  seamNoCleats,
  shortPiece,
  narrowStrip,
  cutoutsTooClose,
  sinkWiderThanBase,
  cutoutOutsideCabinet,
  cooktopNearEdge,
  undermountEndGrain,
  overhangUnsupported,
  supportMissing,
  cabinetsOutOfLevel,
  jointNoAccess,
  connectorComesThrough,
  jointNoConnectors,
  connectorNearPoint,
  screwLength,
  miterOpens,
  cornerSwings,
  buttCrossGrain,
  madeOutOfRange,
  unheatedWinter,
  moistureOutOfRange,
  speciesUnsure,
  noSlabListed,
  pieceOverSlab,
  slabsShort,
  faceDown,
  grainBreaksAtSeam,
  slabNoNeighbours,
  stockDiffers,
  sectionWontGoIn,
  lowerFromAbove,
  heavySection,
  endUnfinished,
  sharpCorner,
  finishNone,
  finishFoodPrep,
  oilyRags,
  cooktopHeat,
  dishwasherSteam,
];

const RANK: Readonly<Record<Severity, number>> = { stop: 0, warn: 1, note: 2 };

/**
 * Everything a person has to fix, look at or know about a layout: 'stop' first, then 'warn', then 'note', each in the
 * order of the rules. Pure; every key stands for one fact at one place and stays the same while that fact does.
 */
export function findingsOf(context: FindingContext): readonly Finding[] {
  const facts = factsOf(context);
  const found = RULES.flatMap((rule) => rule(facts)).sort((a, b) => RANK[a.severity] - RANK[b.severity]);
  const seen = new Map<string, number>();
  return found.map((one) => {
    const count = (seen.get(one.key) ?? 0) + 1;
    seen.set(one.key, count);
    // Two facts of one kind at one place, such as two bad pins on a run, are told apart by their order.
    return count === 1 ? one : { ...one, key: `${one.key} #${count}` };
  });
}
