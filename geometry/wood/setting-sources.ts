import { DEFAULT_SETTINGS } from '../core/settings';
import type { SourcedConstant } from './sourced';
import { constant } from './sourced';

const { tapeSd, seams, screws, connectors, spread, times, finishes } = DEFAULT_SETTINGS;

const practice = (name: string, value: number, unit = 'in', source = '') =>
  constant(name, value, unit, 'common practice', source);
const memory = (name: string, value: number, unit: string, source = '') =>
  constant(name, value, unit, 'from memory', source);
const secondHand = (name: string, value: number, unit: string, source: string) =>
  constant(name, value, unit, 'second hand', source);

const FINISH_NAMES = ['oil', 'hard wax', 'film'] as const;

/** Spread and cure of the three finishes as makers' data sheets and trade custom have them. */
const finishSources = FINISH_NAMES.flatMap((kind): readonly SourcedConstant[] => {
  const setting = finishes[kind];
  if (!setting) return [];
  const sheet = "makers' data sheets";
  return [
    practice(`Coats of ${kind}`, setting.coats, ''),
    kind === 'hard wax'
      ? memory(`Spread of ${kind}, one coat`, setting.sqFtPerQuart, 'sq ft/qt')
      : secondHand(
          `Spread of ${kind}, one coat`,
          setting.sqFtPerQuart,
          'sq ft/qt',
          `${sheet}: 400 to 500 sq ft a gallon`,
        ),
    kind === 'hard wax'
      ? memory(`Recoat time of ${kind}`, setting.recoatHours, 'h')
      : secondHand(`Recoat time of ${kind}`, setting.recoatHours, 'h', `${sheet}: oil 24 h, water-based film 2 to 4 h`),
    kind === 'hard wax'
      ? memory(`Cure time of ${kind}`, setting.cureHours, 'h')
      : secondHand(
          `Cure time of ${kind}`,
          setting.cureHours,
          'h',
          `${sheet}: oil 30 days, water-based film 3 to 7 days`,
        ),
  ];
});

/** Where each of the shop's first settings is from. All of them can be changed by the shop. */
export const SETTING_SOURCES: readonly SourcedConstant[] = [
  practice('Tape error, fixed', tapeSd.fixed),
  practice('Tape error for each inch', tapeSd.perInch),
  practice('Back gap', DEFAULT_SETTINGS.backGap),
  practice('Clearance at a side wall', DEFAULT_SETTINGS.wallClearance),
  practice('Overhang at an open end', DEFAULT_SETTINGS.openOverhang),
  practice('Corner radius at an open end', DEFAULT_SETTINGS.openRadius),
  practice('Seam clear of a cutout corner, inside', seams.insideCutout),
  practice('Seam clear of a cutout corner, outside', seams.fromCutoutCorner),
  practice('Seam clear of a joint', seams.fromJoint),
  practice('Seam clear of an open end', seams.fromOpenEnd),
  practice('Shortest piece', seams.shortestPiece),
  practice('Support near a seam', seams.support),
  practice('Narrowest strip beside a cutout', seams.strip),
  practice('Wood above a screw point', screws.leftAbove),
  practice('Screw shank, #10', screws.shank),
  practice('Screws apart', screws.spacing),
  practice('Front screw line behind the front edge', screws.frontLine),
  practice('Rearmost screws before the back edge', screws.backLine),
  practice('Least bite of a screw', screws.leastBite),
  practice('Screw clear of ends, cutouts and joints', screws.edgeDistance),
  practice('Mortise width', connectors.width),
  practice('Mortise depth', connectors.depth),
  practice('Connectors apart', connectors.spacing),
  practice('First connector from the end', connectors.firstFromEnd),
  practice('Wood beside a mortise', connectors.cover),
  practice('Connector clear of screws and drawbolts', connectors.fromHardware),
  memory('Spread of glue, one face', spread.glueSqFtPerGallon, 'sq ft/gal'),
  practice('Spread of finish, one coat', spread.finishSqFtPerQuart, 'sq ft/qt'),
  practice('Settling of slabs', times.acclimatiseHours, 'h'),
  practice('Clamp time', times.clampHours, 'h'),
  practice('Glue cure before load or cut', times.cureHours, 'h'),
  practice('Recoat time, usual', times.recoatHours, 'h'),
  practice('Finish cure, usual', times.finishCureHours, 'h'),
  ...finishSources,
];
