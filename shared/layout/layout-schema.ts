import { z } from 'zod';

import type { Layout } from '@/geometry/core/layout';

/** Longest thing a tape in a kitchen reads: 100 ft, inches. */
const LONGEST = 1200;

const inches = z.number().min(-LONGEST).max(LONGEST);
const size = z.number().positive().max(LONGEST);
const notNegative = z.number().min(0).max(LONGEST);
const id = z.string().min(1).max(40);
const words = z.string().max(2000);
const point = z.tuple([z.number(), z.number()]).readonly();
const outline = z.array(point).min(3).max(400).readonly();
const cents = z.number().int().min(0).max(100_000_000);

export const readingSchema = z.strictObject({
  text: z.string().min(1).max(60),
  value: notNegative,
  sd: z.number().positive().max(12).optional(),
  by: z.string().max(80).optional(),
  at: z.string().max(40).optional(),
});

export const alongSchema = z.union([notNegative, z.literal('end')]);

export const stationSchema = z.strictObject({ at: notNegative, off: z.number().min(-24).max(24) });

export const wallSchema = z.strictObject({
  id,
  length: z.array(readingSchema).max(12).readonly(),
  profile: z.array(stationSchema).max(100).readonly(),
  outOfPlumb: z.number().min(-6).max(6).optional(),
});

export const triangleSchema = z.strictObject({ a: readingSchema, b: readingSchema, c: readingSchema });

export const betweenSchema = z.tuple([id, id]).readonly();

export const cornerSchema = z.strictObject({
  between: betweenSchema,
  nominal: z.number().min(5).max(355),
  triangle: triangleSchema.optional(),
  angle: z.number().min(1).max(359).optional(),
  sd: z.number().positive().max(20).optional(),
});

export const markSchema = z.strictObject({ wall: id, at: alongSchema });

export const tieSchema = z.strictObject({ id, from: markSchema, to: markSchema, length: readingSchema });

export const tapeSdSchema = z.strictObject({ fixed: z.number().min(0).max(2), perInch: z.number().min(0).max(0.05) });

export const roomReadingsSchema = z.strictObject({
  closed: z.boolean(),
  tapeSd: tapeSdSchema,
  walls: z.array(wallSchema).max(60).readonly(),
  corners: z.array(cornerSchema).max(60).readonly(),
  ties: z.array(tieSchema).max(200).readonly(),
  trust: z.array(z.string().max(100)).max(200).readonly(),
  ignore: z.array(z.string().max(100)).max(200).readonly(),
  sketch: z.array(point).max(61).readonly(),
});

export const baseSchema = z.strictObject({
  id,
  wall: id,
  from: notNegative,
  to: alongSchema,
  kind: z.enum(['cabinet', 'sink base', 'corner base', 'dishwasher', 'range', 'opening', 'window', 'pipe']),
  depth: notNegative,
  access: z.enum(['open', 'none']),
  shim: z.number().min(0).max(6).optional(),
  sill: notNegative.optional(),
  label: z.string().max(80).optional(),
});

export const runEndSchema = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('wall'), clearance: notNegative }),
  z.strictObject({ kind: z.literal('open'), overhang: inches, radius: notNegative }),
  z.strictObject({ kind: z.literal('appliance'), overhang: inches }),
  z.strictObject({ kind: z.literal('joint') }),
  z.strictObject({ kind: z.literal('waterfall'), overhang: inches, height: size }),
]);

export const runSchema = z.strictObject({
  id,
  wall: id,
  from: notNegative,
  to: alongSchema,
  depth: size,
  backGap: notNegative,
  left: runEndSchema,
  right: runEndSchema,
  side: z.enum(['front', 'back']).optional(),
});

export const islandSchema = z.strictObject({
  id,
  length: size,
  depth: size,
  at: point.optional(),
  bearing: z.number().optional(),
  shape: z.enum(['rectangle', 'clipped', 'rounded', 'free']).optional(),
  corner: notNegative.optional(),
  outline: outline.optional(),
  hangs: z
    .strictObject({ front: notNegative, back: notNegative, left: notNegative, right: notNegative })
    .partial()
    .optional(),
});

export const stripSchema = z.strictObject({
  id,
  label: z.string().max(80),
  length: size,
  width: size,
  thickness: size,
  count: z.number().int().min(1).max(200),
});

export const cutoutSchema = z.strictObject({
  id,
  on: id,
  kind: z.enum(['sink', 'cooktop', 'tap', 'notch', 'free']),
  mount: z.enum(['drop-in', 'undermount', 'apron']).optional(),
  centre: inches,
  setback: inches,
  width: size,
  depth: size,
  radius: notNegative,
  outline: outline.optional(),
  label: z.string().max(80).optional(),
});

export const jointChoiceSchema = z.strictObject({
  between: betweenSchema,
  kind: z.enum(['miter', 'butt', 'diagonal']),
  through: id.optional(),
  width: size.optional(),
  angle: z.number().min(1).max(179).optional(),
  assembled: z.enum(['shop', 'site']),
});

export const pinnedSeamSchema = z.strictObject({ on: id, at: notNegative });

export const materialSchema = z.strictObject({
  species: z.string().min(1).max(60),
  thickness: size,
  slabDepth: size,
  stave: size,
  faces: z.enum(['both', 'one']),
  grain: z.enum(['mixed', 'flat', 'edge']),
});

const climateSchema = z.strictObject({ tempF: z.number().min(-40).max(130), rh: z.number().min(0).max(99) });

export const climateYearSchema = z.strictObject({
  make: climateSchema,
  summer: climateSchema,
  winter: climateSchema,
  heated: z.boolean(),
});

export const fixingSchema = z.strictObject({
  rail: notNegative,
  backsplash: notNegative,
  screw: notNegative.optional(),
  connector: z.string().max(60).optional(),
});

export const siteAccessSchema = z.strictObject({
  doorWidth: size,
  doorHeight: size,
  corridor: z.tuple([size, size]).readonly().nullable(),
  clearLength: size.nullable(),
  crew: z.number().int().min(1).max(12),
});

export const edgeProfileSchema = z.strictObject({
  profile: z.enum(['square', 'roundover', 'chamfer', 'bevel']),
  size: notNegative,
});

export const finishSchema = z.strictObject({
  kind: z.enum(['oil', 'hard wax', 'film', 'none']),
  coats: z.number().int().min(0).max(12).optional(),
  foodPrep: z.boolean().optional(),
});

const defectSchema = z.strictObject({ x: notNegative, y: notNegative, w: size, h: size });
const slabPart = {
  length: size,
  depth: size,
  species: z.string().max(60).optional(),
  thickness: size.optional(),
  batch: z.string().max(80).optional(),
  faces: z.enum(['both', 'one']).optional(),
  defects: z.array(defectSchema).max(60).readonly().optional(),
};

export const stockSlabSchema = z.strictObject({
  id,
  ...slabPart,
  price: cents,
  count: z.number().int().min(0).max(10_000).nullable(),
  trim: notNegative.optional(),
});

export const rackPieceSchema = z.strictObject({ id, ...slabPart, price: cents.optional() });

export const stockSchema = z.strictObject({
  slabs: z.array(stockSlabSchema).max(300).readonly(),
  rack: z.array(rackPieceSchema).max(500).readonly(),
  kerf: notNegative,
  trim: notNegative,
  reuseMin: notNegative,
  turn: z.boolean(),
  turnOver: z.boolean(),
  grainMatch: z.boolean(),
});

export const siteNotesSchema = z.strictObject({
  cabinetsOutOfLevel: notNegative.optional(),
  floorOutOfLevel: notNegative.optional(),
});

export const placedNoteSchema = z.strictObject({
  id,
  text: words,
  wall: id.optional(),
  at: point.optional(),
  photo: z.string().max(80).optional(),
});

export const acceptedFindingSchema = z.strictObject({
  reason: z.string().min(1).max(2000),
  by: z.string().max(80),
  at: z.string().max(40),
  text: z.string().max(1000).optional(),
});

const stepName = z.string().min(1).max(200);
const stepText = z.string().trim().min(1).max(200);
const caution = z.string().trim().max(1000);
const workHours = z.number().min(0).max(500);

export const stepChangeSchema = z.strictObject({
  id: stepName,
  text: stepText.optional(),
  caution: caution.optional(),
  hours: workHours.optional(),
  skipped: z.string().trim().min(1).max(500).optional(),
});

export const addedStepSchema = z.strictObject({
  id,
  text: stepText,
  part: z.enum(['shop', 'site']),
  hours: workHours,
  caution: caution.optional(),
  before: stepName.optional(),
});

export const workPlanSchema = z.strictObject({
  start: z.iso.date().optional(),
  workDays: z.array(z.number().int().min(0).max(6)).min(1).max(7).readonly().optional(),
  hoursPerDay: z.number().min(1).max(16).optional(),
  changes: z.array(stepChangeSchema).max(300).readonly(),
  added: z.array(addedStepSchema).max(100).readonly(),
  order: z.array(stepName).max(400).readonly(),
});

/** The stored document. Unknown keys are refused by name. */
export const layoutSchema = z.strictObject({
  format: z.literal('offsquare-layout'),
  version: z.literal(1),
  units: z.enum(['in', 'mm']),
  step: z.enum(['1/16', '1/32', '1 mm', '0.5 mm']),
  room: roomReadingsSchema,
  bases: z.array(baseSchema).max(200).readonly(),
  runs: z.array(runSchema).max(100).readonly(),
  islands: z.array(islandSchema).max(40).readonly(),
  strips: z.array(stripSchema).max(100).readonly(),
  cutouts: z.array(cutoutSchema).max(100).readonly(),
  joints: z.array(jointChoiceSchema).max(100).readonly(),
  seams: z.array(pinnedSeamSchema).max(100).readonly(),
  material: materialSchema,
  climate: climateYearSchema,
  fixing: fixingSchema,
  access: siteAccessSchema,
  edges: edgeProfileSchema,
  finish: finishSchema,
  stock: stockSchema,
  site: siteNotesSchema,
  notes: z.array(placedNoteSchema).max(300).readonly(),
  letters: z.record(z.string().max(60), z.string().max(6)),
  accepted: z.record(z.string().max(200), acceptedFindingSchema),
  work: workPlanSchema.optional(),
}) satisfies z.ZodType<Layout>;
