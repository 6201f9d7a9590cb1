import { z } from 'zod';

export const uuid = z.uuid();
export const moment = z.iso.datetime();
export const day = z.iso.date();

/** A line somebody types: no control characters, no blanks at the ends. */
export const line = (longest: number) =>
  z
    .string()
    .trim()
    .max(longest)
    .regex(/^[^\p{Cc}]*$/u, 'one line of text, please');

export const given = (longest: number) => line(longest).min(1, 'something has to be typed here');

/** Several lines somebody types. */
export const paragraph = (longest: number) => z.string().trim().max(longest);

export const email = z
  .string()
  .trim()
  .toLowerCase()
  .pipe(z.email('an e-mail address, such as ada@example.com').max(254));

/** bcrypt reads 72 bytes and no more; a longer password would be cut without a word. */
const PASSWORD_MAX_BYTES = 72;

export const newPassword = z
  .string()
  .min(10, 'ten characters or more')
  .refine((text) => new TextEncoder().encode(text).length <= PASSWORD_MAX_BYTES, 'at most 72 characters');

export const token = z.string().min(20).max(200);

export const cents = z.number().int().min(0).max(100_000_000);

/** Inches. */
export const size = z.number().positive().max(1200);
export const notNegative = z.number().min(0).max(1200);
