import { z } from 'zod';

import type { NestInstance, NestPlan } from '@/geometry/nest/types';
import type { LengthUnit } from '@/geometry/tape/parse-length';
import { fileUnitsSchema, lengthIn } from './file-length';
import { fileErrors, type FileError } from './parse-job-file';

const id = z.string().min(1).max(80);

/** A nest instance as a file writes it, lengths in the file's units; gives inches. */
function nestFileSchema(units: LengthUnit) {
  const length = lengthIn(units);
  const signed = lengthIn(units, true);
  const trim = length.optional();
  return z.strictObject({
    format: z.literal('nest-instance/1').optional(),
    id: id.optional(),
    units: fileUnitsSchema.optional(),
    kerf: length,
    trim,
    reuseMin: length.optional(),
    /** Longest search, milliseconds. */
    limitMs: z.number().positive().max(3_600_000).optional(),
    stock: z
      .array(
        z.strictObject({
          id,
          length,
          depth: length,
          price: z.number().int(),
          count: z.number().int().min(0).nullable().optional(),
          trim,
          defects: z.array(z.strictObject({ x: length, y: length, w: length, h: length })).optional(),
        }),
      )
      .max(2000),
    parts: z
      .array(
        z.strictObject({
          id,
          count: z.number().int().min(1).max(10_000).optional(),
          outline: z
            .array(z.tuple([signed, signed]))
            .min(3)
            .max(60),
          turn: z.boolean().optional(),
          turnOver: z.boolean().optional(),
        }),
      )
      .max(5000),
    choices: z.array(z.strictObject({ id, options: z.array(z.array(id).min(1)).min(1) })).optional(),
    groups: z.array(z.strictObject({ id, parts: z.array(id).min(1) })).optional(),
  });
}

export type ReadNest =
  | { readonly ok: true; readonly instance: NestInstance; readonly limitMs: number }
  | { readonly ok: false; readonly error: FileError };

/** Long enough for most kitchens to be proved, short enough to wait for. */
const USUAL_LIMIT_MS = 10_000;
const USUAL_TRIM = 0.5;
const USUAL_REUSE = 18;

/** Reads a nest instance; what is wrong first is named with its place. */
export function readNestFile(json: unknown): ReadNest {
  const head = z.object({ units: fileUnitsSchema.optional() }).safeParse(json);
  if (!head.success) return { ok: false, error: fileErrors(head.error)[0]! };
  const parsed = nestFileSchema(head.data.units ?? 'in').safeParse(json);
  if (!parsed.success) return { ok: false, error: fileErrors(parsed.error)[0]! };
  const { format: _format, units: _units, limitMs = USUAL_LIMIT_MS, ...file } = parsed.data;
  return {
    ok: true,
    limitMs,
    instance: {
      ...file,
      id: file.id ?? 'nest',
      trim: file.trim ?? USUAL_TRIM,
      reuseMin: file.reuseMin ?? USUAL_REUSE,
    },
  };
}

/** A plan in the words of the file format. */
export function toNestOutput(plan: NestPlan, ms: number) {
  return { format: 'nest-plan/1' as const, ...plan, ms };
}
