import { z } from 'zod';

import type { Reading } from '@/geometry/core/layout';
import { lengthFromNumber, parseLength, parseSignedLength, type LengthUnit } from '@/geometry/tape/parse-length';

/** Units a file may be written in. */
export const fileUnitsSchema = z.enum(['in', 'ft', 'mm', 'cm', 'm']);

/** A length as a file may write it: a number in the file's units, or text as typed on a tape. */
const rawLength = (what: string) => z.union([z.number(), z.string().max(60)], { error: sayWhat(what) });
export type RawLength = number | string;

/** What stands in a file where a number or a text is expected. */
const sayWhat =
  (what: string) =>
  (issue: { readonly input?: unknown }): string =>
    issue.input === undefined ? `${what} is missing.` : `${what} has to be a number or a text such as "96 1/4".`;

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
export function lengthIn(units: LengthUnit, signed = false, what = 'A length') {
  return rawLength(what).transform((raw, context) => {
    const result = inchesOf(raw, units, signed);
    if ('value' in result) return result.value;
    context.addIssue({ code: 'custom', message: result.message });
    return z.NEVER;
  });
}

/** A reading as stored: its text as the file wrote it beside its inches. */
export function readingIn(units: LengthUnit) {
  return rawLength('A length').transform((raw, context): Reading => {
    const result = inchesOf(raw, units, false);
    if ('value' in result)
      return { text: typeof raw === 'string' ? raw.trim() : textOf(raw, units), value: result.value };
    context.addIssue({ code: 'custom', message: result.message });
    return z.NEVER;
  });
}

/** One reading of a wall or a list of them, always as a list. */
export function readingsIn(units: LengthUnit) {
  const what = 'The length of a wall';
  const one = rawLength(what);
  return z.union([one, z.array(one).max(12)], { error: sayWhat(what) }).transform((raw, context): Reading[] => {
    const reading = readingIn(units);
    const list = Array.isArray(raw) ? raw : [raw];
    return list.flatMap((item, i) => {
      const read = reading.safeParse(item);
      if (read.success) return [read.data];
      const path = Array.isArray(raw) ? [i] : [];
      context.addIssue({ code: 'custom', message: read.error.issues[0]!.message, path });
      return [];
    });
  });
}

/** A place along a wall: 'end' is its right-hand corner; gives inches. */
export function alongIn(units: LengthUnit) {
  return rawLength('A mark').transform((raw, context): number | 'end' => {
    if (raw === 'end') return raw;
    const result = inchesOf(raw, units, false);
    if ('value' in result) return result.value;
    context.addIssue({ code: 'custom', message: result.message });
    return z.NEVER;
  });
}

const textOf = (value: number, units: LengthUnit): string => (units === 'in' ? String(value) : `${value} ${units}`);
