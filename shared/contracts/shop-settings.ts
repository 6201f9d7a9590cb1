import { z } from 'zod';

import { DEFAULT_SETTINGS, type ShopSettings } from '@/geometry/core/settings';
import { notNegative, size } from './fields';

const hours = z.number().min(0).max(2000);

const finishSettingSchema = z.strictObject({
  coats: z.number().int().min(0).max(20),
  sqFtPerQuart: z.number().positive().max(10_000),
  recoatHours: hours,
  cureHours: hours,
});

/** Lengths inches, times hours. */
export const shopSettingsSchema = z.strictObject({
  tapeSd: z.strictObject({ fixed: z.number().min(0).max(2), perInch: z.number().min(0).max(0.05) }),
  backGap: notNegative,
  wallClearance: notNegative,
  openOverhang: z.number().min(-12).max(24),
  openRadius: notNegative,
  seams: z.strictObject({
    insideCutout: notNegative,
    fromCutoutCorner: notNegative,
    fromJoint: notNegative,
    fromOpenEnd: notNegative,
    shortestPiece: size,
    support: notNegative,
    strip: notNegative,
  }),
  screws: z.strictObject({
    lengths: z.array(size).min(1).max(40).readonly(),
    shank: size,
    leftAbove: notNegative,
    spacing: size,
    frontLine: notNegative,
    backLine: notNegative,
    leastBite: notNegative,
    edgeDistance: notNegative,
  }),
  connectors: z.strictObject({
    kind: z.enum(['loose tenon', 'dowel', 'biscuit']),
    width: size,
    depth: size,
    spacing: size,
    firstFromEnd: notNegative,
    cover: notNegative,
    fromHardware: notNegative,
  }),
  spread: z.strictObject({
    glueSqFtPerGallon: z.number().positive().max(10_000),
    finishSqFtPerQuart: z.number().positive().max(10_000),
  }),
  times: z.strictObject({
    acclimatiseHours: hours,
    clampHours: hours,
    cureHours: hours,
    recoatHours: hours,
    finishCureHours: hours,
  }),
  finishes: z.partialRecord(z.enum(['oil', 'hard wax', 'film']), finishSettingSchema),
}) satisfies z.ZodType<ShopSettings>;

/** Settings as a shop stored them once, with everything that has come since at its default. */
export function completeSettings(stored: Readonly<Record<string, unknown>>): ShopSettings {
  const complete = Object.fromEntries(
    Object.entries(DEFAULT_SETTINGS).map(([name, usual]) => [name, filledIn(usual, stored[name])]),
  );
  return shopSettingsSchema.parse(complete);
}

function filledIn(usual: unknown, stored: unknown): unknown {
  if (stored === undefined) return usual;
  const group = (value: unknown): value is object => typeof value === 'object' && !Array.isArray(value);
  return group(usual) && group(stored) ? { ...usual, ...stored } : stored;
}
