import { z } from 'zod';

import type { Reading } from '@/geometry/core/layout';
import { lengthFromNumber, parseLength, parseSignedLength, type LengthUnit } from '@/geometry/tape/parse-length';

/** Units a file may be written in. */
export const fileUnitsSchema = z.enum(['in', 'ft', 'mm', 'cm', 'm']);

/** A length as a file may write it: a number in the file's units, or text as typed on a tape. */
export const rawLengthSchema = z.union([z.number(), z.string().max(60)]);
export type RawLength = z.infer<typeof rawLengthSchema>;

/** The length in inches, or the sentence that says what is wrong with it. Signed for offsets, overhangs and gaps. */
export function inchesOf(raw: RawLength, units: LengthUnit, signed: boolean): { value: number } | { message: string } {
  if (typeof raw === 'number') {
    if (signed && raw < 0) {
      const mirrored = lengthFromNumber(-raw, units);
      return mirrored.ok ? { value: -mirrored.value } : { message: mirrored.message };
    }
    if (raw === 0) return { value: 0 };
    const parsed = lengthFromNumber(raw, units);
    return parsed.ok ? { value: parsed.value } : { message: parsed.message };
  }
  const parsed = signed ? parseSignedLength(raw, units) : parseLength(raw, units);
  return parsed.ok ? { value: parsed.value } : { message: parsed.message };
}

/** The schema of a length in a file of these units; gives inches. */
export function lengthIn(units: LengthUnit, signed = false) {
  return rawLengthSchema.transform((raw, context) => {
    const result = inchesOf(raw, units, signed);
    if ('value' in result) return result.value;
    context.addIssue({ code: 'custom', message: result.message });
    return z.NEVER;
  });
}

/** A reading as stored: its text as the file wrote it beside its inches. */
export function readingIn(units: LengthUnit) {
  return rawLengthSchema.transform((raw, context): Reading => {
    const result = inchesOf(raw, units, false);
    if ('value' in result)
      return { text: typeof raw === 'string' ? raw.trim() : textOf(raw, units), value: result.value };
    context.addIssue({ code: 'custom', message: result.message });
    return z.NEVER;
  });
}

const textOf = (value: number, units: LengthUnit): string => (units === 'in' ? String(value) : `${value} ${units}`);
