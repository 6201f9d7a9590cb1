import { z } from 'zod';

import type { NestPlan } from '@/geometry/nest/types';

const inches = z.number();
const name = z.string().min(1).max(60);
const points = z
  .array(z.tuple([z.number(), z.number()]).readonly())
  .max(400)
  .readonly();

const cutBase = {
  n: z.number().int().min(1),
  pieces: z.array(name).readonly(),
  left: z.number().int().min(0).nullable(),
  right: z.number().int().min(0).nullable(),
  shared: z.boolean(),
  kerfSide: z.enum(['left', 'right']),
};

const crosscutSchema = z.strictObject({
  ...cutBase,
  kind: z.literal('crosscut'),
  front: inches,
  back: inches,
  frontFar: inches,
  backFar: inches,
  yFront: inches,
  yBack: inches,
  angle: z.number(),
});

const ripSchema = z.strictObject({
  ...cutBase,
  kind: z.literal('rip'),
  across: inches,
  acrossFar: inches,
  from: inches,
  to: inches,
  angle: z.literal(0),
});

const slabSchema = z.strictObject({
  stock: name,
  parts: z
    .array(z.strictObject({ id: name, x: inches, y: inches, turned: z.boolean(), turnedOver: z.boolean() }))
    .max(400)
    .readonly(),
  cuts: z
    .array(z.discriminatedUnion('kind', [crosscutSchema, ripSchema]))
    .max(2000)
    .readonly(),
  offcuts: z
    .array(
      z.strictObject({
        x: inches,
        y: inches,
        length: inches,
        depth: inches,
        keep: z.boolean(),
        outline: points,
      }),
    )
    .max(400)
    .readonly(),
});

const priceTags = z
  .array(z.strictObject({ id: name, cents: z.number() }))
  .max(2000)
  .readonly();

/** A nest result as a browser or the nest address hands it in; the words are those of geometry/nest/types.ts. */
export const nestPlanSchema = z.strictObject({
  instance: z.string().max(200),
  slabs: z.array(slabSchema).max(400).readonly(),
  choices: z
    .array(z.strictObject({ id: name, option: z.number().int().min(0) }))
    .max(400)
    .readonly(),
  cost: z.number().int().min(0),
  lowerBound: z.number().min(0),
  gap: z.number().min(0),
  proved: z.boolean(),
  provedScope: z.enum(['class', 'any']),
  certificate: z.discriminatedUnion('kind', [
    z.strictObject({ kind: z.literal('area') }),
    z.strictObject({ kind: z.literal('duals'), values: priceTags }),
  ]),
  priceTags,
  work: z.number().min(0),
}) satisfies z.ZodType<NestPlan>;
