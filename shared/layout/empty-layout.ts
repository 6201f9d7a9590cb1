import type { Layout } from '@/geometry/core/layout';
import { DEFAULT_SETTINGS } from '@/geometry/core/settings';

/** Tops are 25 in deep on 24 in cabinets, slabs 1 1/2 in thick: common practice. */
const DEFAULTS = {
  material: {
    species: 'hard maple',
    thickness: 1.5,
    slabDepth: 25,
    stave: 1.5,
    faces: 'both',
    grain: 'mixed',
  },
  climate: {
    make: { tempF: 68, rh: 45 },
    summer: { tempF: 75, rh: 65 },
    winter: { tempF: 68, rh: 25 },
    heated: true,
  },
  fixing: { rail: 1.5, backsplash: 0.5 },
  access: { doorWidth: 32, doorHeight: 80, corridor: null, clearLength: null, crew: 2 },
  edges: { profile: 'roundover', size: 0.125 },
  finish: { kind: 'oil' },
  stock: {
    slabs: [],
    rack: [],
    kerf: 0.125,
    trim: 0.5,
    reuseMin: 18,
    turn: true,
    turnOver: true,
    grainMatch: false,
  },
} as const satisfies Partial<Layout>;

/** A layout with nothing in it but the shop's usual choices. */
export function emptyLayout(overrides: Partial<Layout> = {}): Layout {
  return {
    format: 'offsquare-layout',
    version: 1,
    units: 'in',
    step: '1/16',
    room: {
      closed: false,
      tapeSd: DEFAULT_SETTINGS.tapeSd,
      walls: [],
      corners: [],
      ties: [],
      trust: [],
      ignore: [],
      sketch: [],
    },
    bases: [],
    runs: [],
    islands: [],
    strips: [],
    cutouts: [],
    joints: [],
    seams: [],
    ...DEFAULTS,
    site: {},
    notes: [],
    letters: {},
    accepted: {},
    ...overrides,
  };
}
