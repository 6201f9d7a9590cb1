import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import type { Layout } from '@/geometry/core/layout';
import { nest } from '@/geometry/nest/nest';
import { makePlan } from '@/geometry/plan/make-plan';
import type { SheetHead } from '@/geometry/scene/paper/sheet-head';
import type { Plan } from '@/geometry/plan/types';
import { parseJobFile } from '@/shared/layout/parse-job-file';

import { handNest, sharedMiterSlab } from './hand-nest';

/** A U of three walls in the port town of Carrow Quay, both corners off square, the middle wall longer than any slab. */
const ALDER = {
  format: 'offsquare-job',
  version: 1,
  name: 'Scullery at Alder Lane',
  units: 'in',
  step: '1/16',
  room: {
    closed: false,
    walls: [
      { id: 'A', length: '96 1/4' },
      { id: 'B', length: ['118 5/8', '118 9/16'], profile: [{ at: 0, off: 0 }, { at: 62, off: -0.3125 }, { at: 118, off: 0 }] }, // prettier-ignore
      { id: 'C', length: 84 },
    ],
    corners: [
      { between: ['A', 'B'], nominal: 90, triangle: { a: 36, b: 48, c: '60 1/2' } },
      { between: ['B', 'C'], nominal: 90, triangle: { a: 36, b: 48, c: '59 1/4' } },
    ],
    ties: [{ id: 't1', from: { wall: 'A', at: 0 }, to: { wall: 'C', at: 'end' }, length: '119 1/8' }],
  },
  bases: [
    { id: 'b1', wall: 'B', from: 43, to: 76, kind: 'sink base', depth: 24, access: 'open' },
    { id: 'b2', wall: 'A', from: 30, to: 60, kind: 'range', depth: 25, access: 'open' },
    { id: 'b3', wall: 'B', from: 0, to: 24, kind: 'corner base', depth: 24, access: 'none' },
    { id: 'b4', wall: 'B', from: 41, to: 77, kind: 'window', depth: 0, access: 'open', sill: 4 },
  ],
  runs: [
    { id: '1', wall: 'A', from: 0, to: 30, left: { kind: 'open', overhang: 0, radius: 0 }, right: { kind: 'appliance', overhang: 0 } },
    { id: '2', wall: 'A', from: 60, to: 'end', left: { kind: 'appliance', overhang: 0 }, right: { kind: 'joint' } },
    { id: '3', wall: 'B', from: 0, to: 'end', left: { kind: 'joint' }, right: { kind: 'joint' } },
    { id: '4', wall: 'C', from: 0, to: 'end', left: { kind: 'joint' }, right: { kind: 'open', overhang: 0, radius: 0 } },
  ], // prettier-ignore
  cutouts: [{ id: 'c1', on: '3', kind: 'sink', centre: 59.5, setback: 3, width: 31, depth: 17, radius: 0.75 }],
  joints: [
    { between: ['2', '3'], kind: 'miter', assembled: 'site' },
    { between: ['3', '4'], kind: 'miter', assembled: 'site' },
  ],
  material: { species: 'hard maple', thickness: 1.5, slabDepth: 25 },
  stock: {
    slabs: [
      { id: 'HM-120', length: 120, depth: 25, price: 61200, count: null },
      { id: 'HM-96', length: 96, depth: 25, price: 48900, count: null },
    ],
    rack: [{ id: '0207', length: 34, depth: 25 }],
  },
};

export interface Job {
  readonly layout: Layout;
  readonly plan: Plan;
}

/** Layout and plan of a job file, with the slabs that the search finds for it. */
export function planJob(file: unknown): Job {
  const parsed = parseJobFile(file);
  if (!parsed.ok) throw new Error(parsed.errors.map((e) => `${e.path}: ${e.message}`).join('\n'));
  return planLayout(parsed.layout);
}

export function planLayout(layout: Layout): Job {
  const without = makePlan({ layout, settings: DEFAULT_SETTINGS, nest: null });
  const found = nest(without.instance);
  if ('error' in found) throw new Error(found.error.message);
  return { layout, plan: makePlan({ layout, settings: DEFAULT_SETTINGS, nest: found }) };
}

export const alderJob = (): Job => planJob(ALDER);

/** The same with a seam at the sink, S and T cut from one slab with one pass for both sides of their miter. */
export function sharedMiterJob(): Job {
  const parsed = parseJobFile({ ...ALDER, seams: [{ on: '3', at: 59.5 }] });
  if (!parsed.ok) throw new Error('the job file is broken');
  const { layout } = parsed;
  const { pieces } = makePlan({ layout, settings: DEFAULT_SETTINGS, nest: null });
  const [, , , s, t] = pieces;
  const nestPlan = handNest(layout, pieces, [sharedMiterSlab('HM-120', layout, s!, t!)]);
  return { layout, plan: makePlan({ layout, settings: DEFAULT_SETTINGS, nest: nestPlan }) };
}

/** Twenty-four strips of the job's own thickness: sections that are ripped, and a table longer than a page. */
export const stripsJob = (): Job =>
  planJob({
    ...ALDER,
    strips: [
      { id: 's1', label: 'shelf', length: 40, width: 5.5, thickness: 1.5, count: 9 },
      { id: 's2', label: 'filler', length: 22, width: 3.25, thickness: 1.5, count: 15 },
    ],
  });

/** Only the piece beside the range, from a whole slab: most of it stays as an offcut for the rack. */
export const shortJob = (): Job =>
  planJob({
    ...ALDER,
    runs: ALDER.runs.slice(0, 1),
    cutouts: [],
    joints: [],
    stock: { ...ALDER.stock, rack: [] },
  });

export const HEAD: SheetHead = {
  jobNumber: '0142',
  jobName: 'Scullery at Alder Lane',
  revision: 2,
  revisionDate: '2031-05-12',
  drawnBy: 'Renn',
  signedBy: 'Sol',
  draft: false,
};
