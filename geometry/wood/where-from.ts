import { CLIMATE_PRESETS } from './climate-presets';
import { CLEAT_CLEAR, CLEAT_LEAST, CLEAT_LENGTH } from './cleats';
import { CONNECTOR_SIZES } from './connector-sizes';
import { BOLT_SPACING, FIRST_BOLT } from './drawbolts';
import { LOAD_CONSTANT, LONG_PIECE, TEAM_FACTORS } from './hands';
import { BACKSPLASH_HEIGHT, LEDGER_MOST, LEVEL_LIMIT, SPAN_LIMIT } from './level-support';
import { DEFLECTION_SHARE, EDGE_LOAD, STRIP_WIDTH } from './overhang';
import { BETWEEN_GRIT, DISC_AREA, FIRST_GRIT, LAST_GRITS } from './sanding';
import { SETTING_SOURCES } from './setting-sources';
import type { Sourced, SourcedConstant, Standing } from './sourced';
import { SPECIES, type Species } from './species';
import { CHECK_MOISTURE, CLAMPS_APART, EFFORT, GLUE_OPEN_MINUTES, STOP_SHORT } from './work-effort';

const cell = (species: Species, name: string, unit: string, value: Sourced | null | undefined) =>
  value ? [{ ...value, name: `${species.key}: ${name}`, unit }] : [];

const speciesConstants = (species: Species): readonly SourcedConstant[] => [
  ...cell(species, 'change of width, radial', 'per 1 %', species.radial),
  ...cell(species, 'change of width, tangential', 'per 1 %', species.tangential),
  ...cell(species, 'specific gravity at 12 %', '', species.gravity12),
  ...cell(species, 'stiffness along the grain', 'psi', species.modulusPsi),
  ...cell(species, 'bending strength', 'psi', species.rupturePsi),
  ...cell(species, 'side hardness', 'lbf', species.hardnessLbf),
  ...cell(species, 'stiffness across over along, tangential', '', species.acrossRatio?.tangential),
  ...cell(species, 'stiffness across over along, radial', '', species.acrossRatio?.radial),
];

const presetConstants: readonly SourcedConstant[] = CLIMATE_PRESETS.flatMap(({ name, summer, winter, standing }) =>
  (
    [
      ['summer temperature', summer.tempF, 'F'],
      ['summer humidity', summer.rh, '%'],
      ['winter temperature', winter.tempF, 'F'],
      ['winter humidity', winter.rh, '%'],
    ] as const
  ).map(([what, value, unit]) => ({ name: `${name}: ${what}`, value, unit, standing, source: '' })),
);

const sizeConstants: readonly SourcedConstant[] = CONNECTOR_SIZES.flatMap(
  ({ name, width, depth, thickness, standing }) =>
    (
      [
        ['mortise width', width],
        ['mortise depth in each piece', depth],
        ['thickness', thickness],
      ] as const
    ).map(([what, value]) => ({ name: `${name}: ${what}`, value, unit: 'in', standing, source: '' })),
);

/** Every constant of wood and hardware with its standing and source. */
export const WOOD_CONSTANTS: readonly SourcedConstant[] = [
  ...SPECIES.flatMap(speciesConstants),
  LOAD_CONSTANT,
  ...TEAM_FACTORS,
  LONG_PIECE,
  EDGE_LOAD,
  STRIP_WIDTH,
  DEFLECTION_SHARE,
  FIRST_BOLT,
  BOLT_SPACING,
  CLEAT_LENGTH,
  CLEAT_LEAST,
  CLEAT_CLEAR,
  LEVEL_LIMIT,
  SPAN_LIMIT,
  LEDGER_MOST,
  BACKSPLASH_HEIGHT,
  FIRST_GRIT,
  ...LAST_GRITS,
  BETWEEN_GRIT,
  DISC_AREA,
  ...Object.values(EFFORT),
  GLUE_OPEN_MINUTES,
  CLAMPS_APART,
  STOP_SHORT,
  CHECK_MOISTURE,
  ...presetConstants,
  ...sizeConstants,
  ...SETTING_SOURCES,
];

/** How many constants have each standing. */
export function countByStanding(constants: readonly Sourced[]): Readonly<Record<Standing, number>> {
  const count: Record<Standing, number> = {
    published: 0,
    'second hand': 0,
    computed: 0,
    'from memory': 0,
    'common practice': 0,
    'our choice': 0,
  };
  for (const { standing } of constants) count[standing] += 1;
  return count;
}
