import { z } from 'zod';

import type { LengthUnit } from '@/geometry/tape/parse-length';
import { alongIn, fileUnitsSchema, lengthIn } from './file-length';
import { acceptedFindingSchema, climateYearSchema, finishSchema, workPlanSchema } from './layout-schema';
import { roomBlockSchema } from './room-schema';

const id = z.string().min(1).max(40);
const between = z.tuple([id, id]);

/** The whole job file in these units; everything but `room` and `runs` may be left out. Unknown keys are refused by name. */
export function jobFileSchema(units: LengthUnit) {
  const length = lengthIn(units);
  const signed = lengthIn(units, true);
  const point = z.tuple([signed, signed]);
  const along = alongIn(units);
  const end = z.discriminatedUnion('kind', [
    z.strictObject({ kind: z.literal('wall'), clearance: length.optional() }),
    z.strictObject({ kind: z.literal('open'), overhang: signed.optional(), radius: length.optional() }),
    z.strictObject({ kind: z.literal('appliance'), overhang: signed.optional() }),
    z.strictObject({ kind: z.literal('joint') }),
    z.strictObject({ kind: z.literal('waterfall'), overhang: signed.optional(), height: length }),
  ]);
  const faces = z.enum(['both', 'one']);
  const defect = z.strictObject({ x: length, y: length, w: length, h: length });
  const slab = {
    id,
    length,
    depth: length,
    species: z.string().max(60).optional(),
    thickness: length.optional(),
    batch: z.string().max(80).optional(),
    faces: faces.optional(),
    defects: z.array(defect).optional(),
  };
  const cents = z.number().int();
  return z.strictObject({
    format: z.literal('offsquare-job').optional(),
    version: z.literal(1).optional(),
    name: z.string().max(200).optional(),
    units: fileUnitsSchema.optional(),
    step: z.enum(['1/16', '1/32', '1 mm', '0.5 mm']).optional(),
    room: roomBlockSchema(units),
    bases: z
      .array(
        z.strictObject({
          id,
          wall: id,
          from: length,
          to: along,
          kind: z.enum(['cabinet', 'sink base', 'corner base', 'dishwasher', 'range', 'opening', 'window', 'pipe']),
          depth: length.optional(),
          access: z.enum(['open', 'none']).optional(),
          shim: length.optional(),
          sill: length.optional(),
          label: z.string().max(80).optional(),
        }),
      )
      .optional(),
    runs: z.array(
      z.strictObject({
        id,
        wall: id,
        from: length.optional(),
        to: along.optional(),
        depth: length.optional(),
        backGap: length.optional(),
        left: end,
        right: end,
        side: z.enum(['front', 'back']).optional(),
      }),
    ),
    islands: z
      .array(
        z.strictObject({
          id,
          length,
          depth: length,
          at: point.optional(),
          bearing: z.number().optional(),
          shape: z.enum(['rectangle', 'clipped', 'rounded', 'free']).optional(),
          corner: length.optional(),
          outline: z.array(point).min(3).optional(),
          hangs: z.strictObject({ front: length, back: length, left: length, right: length }).partial().optional(),
        }),
      )
      .optional(),
    strips: z
      .array(
        z.strictObject({
          id,
          label: z.string().max(80).optional(),
          length,
          width: length,
          thickness: length,
          count: z.number().int().min(1).optional(),
        }),
      )
      .optional(),
    cutouts: z
      .array(
        z.strictObject({
          id,
          on: id,
          kind: z.enum(['sink', 'cooktop', 'tap', 'notch', 'free']),
          mount: z.enum(['drop-in', 'undermount', 'apron']).optional(),
          centre: signed,
          setback: signed.optional(),
          width: length,
          depth: length,
          radius: length.optional(),
          outline: z.array(point).min(3).optional(),
          label: z.string().max(80).optional(),
        }),
      )
      .optional(),
    joints: z
      .array(
        z.strictObject({
          between,
          kind: z.enum(['miter', 'butt', 'diagonal']),
          through: id.optional(),
          width: length.optional(),
          angle: z.number().min(1).max(179).optional(),
          assembled: z.enum(['shop', 'site']).optional(),
        }),
      )
      .optional(),
    seams: z.array(z.strictObject({ on: id, at: length })).optional(),
    material: z
      .strictObject({
        species: z.string().min(1).max(60),
        thickness: length,
        slabDepth: length,
        stave: length,
        faces,
        grain: z.enum(['mixed', 'flat', 'edge']),
      })
      .partial()
      .optional(),
    climate: climateYearSchema.partial().optional(),
    fixing: z
      .strictObject({ rail: length, backsplash: length, screw: length, connector: z.string().max(60) })
      .partial()
      .optional(),
    access: z
      .strictObject({
        doorWidth: length,
        doorHeight: length,
        corridor: z.tuple([length, length]).nullable(),
        clearLength: length.nullable(),
        crew: z.number().int().min(1).max(12),
      })
      .partial()
      .optional(),
    edges: z
      .strictObject({ profile: z.enum(['square', 'roundover', 'chamfer', 'bevel']), size: length })
      .partial()
      .optional(),
    finish: finishSchema.optional(),
    stock: z
      .strictObject({
        slabs: z.array(
          z.strictObject({ ...slab, price: cents, count: z.number().int().min(0).nullable(), trim: length.optional() }),
        ),
        rack: z.array(z.strictObject({ ...slab, price: cents.optional() })),
        kerf: length,
        trim: length,
        reuseMin: length,
        turn: z.boolean(),
        turnOver: z.boolean(),
        grainMatch: z.boolean(),
      })
      .partial()
      .optional(),
    site: z.strictObject({ cabinetsOutOfLevel: length, floorOutOfLevel: length }).partial().optional(),
    notes: z
      .array(z.strictObject({ id, text: z.string().max(2000), wall: id.optional(), at: point.optional() }))
      .optional(),
    letters: z.record(z.string().max(60), z.string().max(6)).optional(),
    accepted: z.record(z.string().max(200), acceptedFindingSchema).optional(),
    work: workPlanSchema.optional(),
  });
}

export type JobFile = z.output<ReturnType<typeof jobFileSchema>>;
