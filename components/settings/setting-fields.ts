import type { ShopSettings } from '@/geometry/core/settings';

/** How it is typed: a length, a length that may be under zero, or a plain number of a unit. */
export type SettingKind = 'length' | 'signed' | 'decimal' | 'hours' | 'coats' | 'glue rate' | 'finish rate';

export interface SettingField {
  /** Where the value stands in the settings. */
  readonly path: readonly [string, ...string[]];
  /** The name that the list of sources gives the constant. */
  readonly label: string;
  readonly kind: SettingKind;
}

export interface SettingGroup {
  readonly title: string;
  /** What these numbers do to a top. */
  readonly does: string;
  readonly fields: readonly SettingField[];
}

const field = (path: string, label: string, kind: SettingKind): SettingField => ({
  path: path.split('.') as [string, ...string[]],
  label,
  kind,
});

const finish = (kind: 'oil' | 'hard wax' | 'film'): readonly SettingField[] => [
  field(`finishes.${kind}.coats`, `Coats of ${kind}`, 'coats'),
  field(`finishes.${kind}.sqFtPerQuart`, `Spread of ${kind}, one coat`, 'finish rate'),
  field(`finishes.${kind}.recoatHours`, `Recoat time of ${kind}`, 'hours'),
  field(`finishes.${kind}.cureHours`, `Cure time of ${kind}`, 'hours'),
];

/** Every number of the shop's settings, in the order of the work. */
export const SETTING_GROUPS: readonly SettingGroup[] = [
  {
    title: 'Tape',
    does: 'How far a reading may be off: the room is fitted with it, and a slip stands out against it.',
    fields: [
      field('tapeSd.fixed', 'Tape error, fixed', 'length'),
      field('tapeSd.perInch', 'Tape error for each inch', 'decimal'),
    ],
  },
  {
    title: 'Gaps and ends',
    does: 'What a new run starts with.',
    fields: [
      field('backGap', 'Back gap', 'length'),
      field('wallClearance', 'Clearance at a side wall', 'length'),
      field('openOverhang', 'Overhang at an open end', 'signed'),
      field('openRadius', 'Corner radius at an open end', 'length'),
    ],
  },
  {
    title: 'Seams',
    does: 'Where a seam may not be.',
    fields: [
      field('seams.insideCutout', 'Seam clear of a cutout corner, inside', 'length'),
      field('seams.fromCutoutCorner', 'Seam clear of a cutout corner, outside', 'length'),
      field('seams.fromJoint', 'Seam clear of a joint', 'length'),
      field('seams.fromOpenEnd', 'Seam clear of an open end', 'length'),
      field('seams.shortestPiece', 'Shortest piece', 'length'),
      field('seams.support', 'Support near a seam', 'length'),
      field('seams.strip', 'Narrowest strip beside a cutout', 'length'),
    ],
  },
  {
    title: 'Screws',
    does: 'How the top is held on the cabinets.',
    fields: [
      field('screws.leftAbove', 'Wood above a screw point', 'length'),
      field('screws.shank', 'Screw shank, #10', 'decimal'),
      field('screws.spacing', 'Screws apart', 'length'),
      field('screws.frontLine', 'Front screw line behind the front edge', 'length'),
      field('screws.backLine', 'Rearmost screws before the back edge', 'length'),
      field('screws.leastBite', 'Least bite of a screw', 'length'),
      field('screws.edgeDistance', 'Screw clear of ends, cutouts and joints', 'length'),
    ],
  },
  {
    title: 'Connectors',
    does: 'What lines two pieces up in a joint.',
    fields: [
      field('connectors.width', 'Mortise width', 'length'),
      field('connectors.depth', 'Mortise depth', 'length'),
      field('connectors.spacing', 'Connectors apart', 'length'),
      field('connectors.firstFromEnd', 'First connector from the end', 'length'),
      field('connectors.cover', 'Wood beside a mortise', 'length'),
      field('connectors.fromHardware', 'Connector clear of screws and drawbolts', 'length'),
    ],
  },
  {
    title: 'Glue and time',
    does: "Quantities of the order sheet, and the dates of the work. The glue maker's sheet goes first.",
    fields: [
      field('spread.glueSqFtPerGallon', 'Spread of glue, one face', 'glue rate'),
      field('spread.finishSqFtPerQuart', 'Spread of finish, one coat', 'finish rate'),
      field('times.acclimatiseHours', 'Settling of slabs', 'hours'),
      field('times.clampHours', 'Clamp time', 'hours'),
      field('times.cureHours', 'Glue cure before load or cut', 'hours'),
      field('times.recoatHours', 'Recoat time, usual', 'hours'),
      field('times.finishCureHours', 'Finish cure, usual', 'hours'),
    ],
  },
  {
    title: 'Finishes',
    does: "Coats, spread and times of each finish. The finish maker's sheet goes first.",
    fields: [...finish('oil'), ...finish('hard wax'), ...finish('film')],
  },
];

type Group = Readonly<Record<string, unknown>>;

/** The number at this place. */
export function settingAt(settings: ShopSettings, { path }: SettingField): number {
  return path.reduce<unknown>((at, key) => (at as Group)[key], settings) as number;
}

/** The settings with another number at this place. */
export function withSetting(settings: ShopSettings, { path }: SettingField, value: number): ShopSettings {
  const put = (at: Group, [key, ...rest]: readonly string[]): Group => ({
    ...at,
    [key!]: rest.length === 0 ? value : put(at[key!] as Group, rest),
  });
  return put(settings as unknown as Group, path) as unknown as ShopSettings;
}
