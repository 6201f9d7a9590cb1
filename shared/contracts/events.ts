import { z } from 'zod';

import { uuid } from './fields';

/** Something changed in the shop; whoever shows it asks for it again. */
export const shopEventSchema = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('layout'), jobId: uuid, layoutId: uuid, seq: z.number().int() }),
  z.strictObject({ kind: z.literal('job'), jobId: uuid }),
  z.strictObject({ kind: z.literal('revision'), jobId: uuid, number: z.number().int() }),
  z.strictObject({ kind: z.literal('work'), jobId: uuid }),
  z.strictObject({ kind: z.literal('stock') }),
  z.strictObject({ kind: z.literal('rack') }),
  z.strictObject({ kind: z.literal('crew') }),
  z.strictObject({ kind: z.literal('shop') }),
]);

export type ShopEvent = z.infer<typeof shopEventSchema>;

/** GET: a stream of `shopEventSchema` as server-sent events named `change`; see docs/api.md. */
export const EVENTS_PATH = '/events';
