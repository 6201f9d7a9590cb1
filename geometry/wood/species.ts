import { HANDBOOK, MEMORY, TABLE_5_3B } from './handbook';
import { fromGreenVolume } from './gravity';
import type { Sourced } from './sourced';
import { sourced } from './sourced';

/** What the tables say of one wood, clear and straight grained. */
export interface Species {
  /** As it stands in a layout's material. */
  readonly key: string;
  readonly handbookName: string;
  /** Fraction of width per 1 % of moisture, growth rings square to the face (radial) and along it (tangential). */
  readonly radial: Sourced;
  readonly tangential: Sourced;
  /** Ovendry weight over volume at 12 % moisture. */
  readonly gravity12: Sourced;
  /** Along the grain, psi, from centre-loaded bending. */
  readonly modulusPsi: Sourced;
  readonly rupturePsi: Sourced | null;
  readonly hardnessLbf: Sourced | null;
  /** Stiffness across the grain over stiffness along it; null where no table lists the wood. */
  readonly acrossRatio: { readonly tangential: Sourced; readonly radial: Sourced } | null;
}

const published = (value: number, source: string): Sourced => sourced(value, 'published', source);
const memory = (value: number, source: string): Sourced => sourced(value, 'from memory', source);

interface Row {
  readonly handbookName: string;
  readonly change: readonly [radial: number, tangential: number];
  readonly strength: readonly [gravity: number, rupturePsi: number, modulusMillionPsi: number, hardnessLbf: number];
  readonly ratio?: readonly [tangential: number, radial: number, standing?: 'published'];
}

/** Woods of the US tables: every cell but the ratios read in Tables 13-5 and 5-3b. */
const US_ROWS: Readonly<Record<string, Row>> = {
  'hard maple': {
    handbookName: 'maple, sugar',
    change: [0.00165, 0.00353],
    strength: [0.63, 15800, 1.83, 1450],
    ratio: [0.065, 0.132],
  },
  'soft maple': {
    handbookName: 'maple, red',
    change: [0.00137, 0.00289],
    strength: [0.54, 13400, 1.64, 950],
    ratio: [0.067, 0.14],
  },
  'black walnut': {
    handbookName: 'walnut, black',
    change: [0.0019, 0.00274],
    strength: [0.55, 14600, 1.68, 1010],
    ratio: [0.056, 0.106],
  },
  cherry: {
    handbookName: 'cherry, black',
    change: [0.00126, 0.00248],
    strength: [0.5, 12300, 1.49, 950],
    ratio: [0.086, 0.197],
  },
  'white oak': {
    handbookName: 'oak, white',
    change: [0.0018, 0.00365],
    strength: [0.68, 15200, 1.78, 1360],
    ratio: [0.072, 0.163],
  },
  'red oak': {
    handbookName: 'oak, northern red',
    change: [0.00158, 0.00369],
    strength: [0.63, 14300, 1.82, 1290],
    ratio: [0.082, 0.154],
  },
  beech: { handbookName: 'beech, American', change: [0.0019, 0.00431], strength: [0.64, 14900, 1.72, 1300] },
  birch: {
    handbookName: 'birch, yellow',
    change: [0.00256, 0.00338],
    strength: [0.62, 16600, 2.01, 1260],
    ratio: [0.05, 0.078],
  },
  ash: {
    handbookName: 'ash, white',
    change: [0.00169, 0.00274],
    strength: [0.6, 15400, 1.74, 1320],
    ratio: [0.08, 0.125, 'published'],
  },
  hickory: {
    handbookName: 'hickory, true (shagbark)',
    change: [0.00259, 0.00411],
    strength: [0.72, 20200, 2.16, 1880],
  },
  pecan: { handbookName: 'hickory, pecan', change: [0.00169, 0.00315], strength: [0.66, 13700, 1.73, 1820] },
};

const ratioOf = (ratio: Row['ratio']): Species['acrossRatio'] => {
  if (!ratio) return null;
  const cell = (value: number) => sourced(value, ratio[2] ?? 'from memory', `${HANDBOOK} Table 5-1`);
  return { tangential: cell(ratio[0]), radial: cell(ratio[1]) };
};

const usSpecies = (key: string, row: Row): Species => ({
  key,
  handbookName: row.handbookName,
  radial: published(row.change[0], `${HANDBOOK} Table 13-5`),
  tangential: published(row.change[1], `${HANDBOOK} Table 13-5`),
  gravity12: published(row.strength[0], TABLE_5_3B),
  rupturePsi: published(row.strength[1], TABLE_5_3B),
  modulusPsi: published(row.strength[2] * 1e6, TABLE_5_3B),
  hardnessLbf: published(row.strength[3], TABLE_5_3B),
  acrossRatio: ratioOf(row.ratio),
});

/** Imported woods: the tables print only a green-volume gravity, and half of the movement figures could not be read again. */
const IMPORTED: readonly Species[] = [
  {
    key: 'teak',
    handbookName: 'teak',
    radial: memory(0.00101, `${HANDBOOK} Table 13-5`),
    tangential: sourced(0.00186, 'second hand', `${HANDBOOK} Table 13-5, as a flooring table quotes it`),
    gravity12: fromGreenVolume(0.55, `${HANDBOOK} Table 5-5b, green volume, by eq. 4-11`),
    rupturePsi: published(14600, `${HANDBOOK} Table 5-5b`),
    modulusPsi: published(1.55e6, `${HANDBOOK} Table 5-5b`),
    hardnessLbf: published(1000, `${HANDBOOK} Table 5-5b`),
    acrossRatio: null,
  },
  {
    key: 'mahogany',
    handbookName: 'mahogany, true',
    radial: memory(0.00172, `${HANDBOOK} Table 13-5`),
    tangential: memory(0.00238, `${HANDBOOK} Table 13-5`),
    gravity12: fromGreenVolume(0.45, `${HANDBOOK} Table 5-5a, green volume, by eq. 4-11`),
    rupturePsi: published(11500, `${HANDBOOK} Table 5-5a, 79.3 MPa`),
    modulusPsi: published(1.494e6, `${HANDBOOK} Table 5-5a, 10,300 MPa`),
    hardnessLbf: published(809, `${HANDBOOK} Table 5-5a, 3,600 N`),
    acrossRatio: { tangential: memory(0.064, `${HANDBOOK} Table 5-1`), radial: memory(0.107, `${HANDBOOK} Table 5-1`) },
  },
  {
    key: 'african mahogany',
    handbookName: 'mahogany, African (Khaya)',
    radial: memory(0.00141, `${HANDBOOK} Table 13-5`),
    tangential: memory(0.00201, `${HANDBOOK} Table 13-5`),
    gravity12: fromGreenVolume(0.42, `${HANDBOOK} Table 5-5a, green volume, by eq. 4-11`),
    rupturePsi: published(10700, `${HANDBOOK} Table 5-5a, 73.8 MPa`),
    modulusPsi: published(1.407e6, `${HANDBOOK} Table 5-5a, 9,700 MPa`),
    hardnessLbf: published(832, `${HANDBOOK} Table 5-5a, 3,700 N`),
    acrossRatio: null,
  },
  {
    key: 'sapele',
    handbookName: 'sapele',
    // No table lists a coefficient: C = S / (3000 - 20 S) with total shrinkage 4.6 % and 7.4 % remembered from Table 4-4.
    radial: memory(4.6 / (3000 - 20 * 4.6), `${MEMORY} shrinkage 4.6 %, ${HANDBOOK} Table 4-4`),
    tangential: memory(7.4 / (3000 - 20 * 7.4), `${MEMORY} shrinkage 7.4 %, ${HANDBOOK} Table 4-4`),
    gravity12: fromGreenVolume(0.55, `${HANDBOOK} Table 5-5b, green volume, by eq. 4-11`),
    rupturePsi: published(15300, `${HANDBOOK} Table 5-5b`),
    modulusPsi: published(1.82e6, `${HANDBOOK} Table 5-5b`),
    hardnessLbf: published(1510, `${HANDBOOK} Table 5-5b`),
    acrossRatio: null,
  },
];

/** Every wood a layout can name. */
export const SPECIES: readonly Species[] = [
  ...Object.entries(US_ROWS).map(([key, row]) => usSpecies(key, row)),
  ...IMPORTED,
];

const ALIASES: Readonly<Record<string, string>> = {
  maple: 'hard maple',
  'sugar maple': 'hard maple',
  'red maple': 'soft maple',
  walnut: 'black walnut',
  'black cherry': 'cherry',
  'american beech': 'beech',
  'yellow birch': 'birch',
  'white ash': 'ash',
  'true hickory': 'hickory',
  'pecan hickory': 'pecan',
  'honduras mahogany': 'mahogany',
  khaya: 'african mahogany',
};

const BY_KEY: ReadonlyMap<string, Species> = new Map(SPECIES.map((s) => [s.key, s]));

/** The wood by its key or a common other name, in any case; null when the table does not have it. */
export function speciesOf(name: string): Species | null {
  const key = name.trim().toLowerCase();
  return BY_KEY.get(key) ?? BY_KEY.get(ALIASES[key] ?? '') ?? null;
}
