import { z } from 'zod';

import { checkStructure } from '@/geometry/room/check-structure';
import { cornerName, roomFrame, tieName, wallName } from '@/geometry/room/room-frame';
import { DEFAULT_TAPE_SD } from '@/geometry/room/types';
import type { CornerInput, RoomInput, TieInput, WallInput } from '@/geometry/room/types';
import type { LengthUnit } from '@/geometry/tape/parse-length';

import { fileUnitsSchema, inchesOf } from './file-length';

/** Most walls, readings of one wall, ties and stations of a room that a file may hold. */
const MOST_WALLS = 60;
const MOST_READINGS = 12;
const MOST_TIES = 200;
const MOST_STATIONS = 100;

const id = z.string({ error: 'A name has to be a text.' }).min(1, 'A name is missing here.').max(40);
const names = z.array(z.string().max(100)).max(MOST_TIES);

const say =
  (what: string) =>
  (issue: { readonly input?: unknown }): string =>
    issue.input === undefined ? `${what} is missing.` : `${what} has to be a number or a text such as "96 1/4".`;

/** A length in a file of these units, inches; the message says what was wrong with the text. */
export function fileLength(units: LengthUnit, what = 'A length', signed = false) {
  return z.union([z.number(), z.string().max(60)], { error: say(what) }).transform((raw, context) => {
    const result = inchesOf(raw, units, signed);
    if ('value' in result) return result.value;
    context.addIssue({ code: 'custom', message: result.message });
    return z.NEVER;
  });
}

/** The readings of one wall: a length or a list of them; none when the wall was not taped. */
function fileReadings(units: LengthUnit) {
  const one = z.union([z.number(), z.string().max(60)]);
  const raw = z.union([one, z.array(one).max(MOST_READINGS)], { error: say('The length of a wall') });
  return raw.optional().transform((value, context): readonly number[] => {
    const list = value === undefined ? [] : Array.isArray(value) ? value : [value];
    return list.flatMap((reading, i) => {
      const result = inchesOf(reading, units, false);
      if ('value' in result) return [result.value];
      context.addIssue({ code: 'custom', message: result.message, path: Array.isArray(value) ? [i] : [] });
      return [];
    });
  });
}

const degrees = (what: string) =>
  z
    .number({ error: `${what} has to be a number of degrees.` })
    .gt(0, `${what} has to be over 0.`)
    .lt(360, `${what} has to be under 360.`);

/** The room of a file in these units; unknown keys are refused by name. */
export function roomFileSchema(units: LengthUnit) {
  const length = fileLength(units);
  const sd = fileLength(units, 'A standard deviation').optional();
  const at = z.union([z.number(), z.string().max(60)], { error: say('A mark') }).transform((raw, context) => {
    if (raw === 'end') return raw;
    const result = inchesOf(raw, units, false);
    if ('value' in result) return result.value;
    context.addIssue({ code: 'custom', message: result.message });
    return z.NEVER;
  });
  const mark = z.strictObject({ wall: id, at });
  const signed = fileLength(units, 'An offset', true);
  const triangle = z.strictObject({ a: length, b: length, c: length, sd });
  return z.strictObject({
    units: fileUnitsSchema.optional(),
    closed: z.boolean().default(false),
    tapeSd: z.strictObject({ fixed: length, perInch: z.number().min(0) }).optional(),
    walls: z
      .array(
        z.strictObject({
          id,
          length: fileReadings(units),
          sd,
          profile: z
            .array(z.strictObject({ at: length, off: signed }))
            .max(MOST_STATIONS)
            .optional(),
          outOfPlumb: signed.optional(),
        }),
      )
      .max(MOST_WALLS),
    corners: z
      .array(
        z.strictObject({
          between: z.tuple([id, id]),
          nominal: degrees('A nominal angle').optional(),
          triangle: triangle.optional(),
          angle: degrees('An angle').optional(),
          sd: z.union([z.number(), z.string()], { error: say('A standard deviation') }).optional(),
        }),
      )
      .max(MOST_WALLS)
      .default([]),
    ties: z
      .array(z.strictObject({ id, from: mark, to: mark, length, sd }))
      .max(MOST_TIES)
      .default([]),
    trust: names.default([]),
    ignore: names.default([]),
    sketch: z.array(z.tuple([signed, signed])).optional(),
  });
}

export type RoomFile = z.output<ReturnType<typeof roomFileSchema>>;

export interface RoomFileError {
  readonly code: string;
  readonly message: string;
  /** Place in the file, such as `walls[2].length`. */
  readonly path: string;
}

export type RoomInputResult =
  { readonly ok: true; readonly input: RoomInput } | { readonly ok: false; readonly error: RoomFileError };

/**
 * A parsed room as the solver takes it.
 *
 * @param units - of the file; a corner's own `sd` is degrees beside a protractor reading, a length beside a triangle
 * @returns the first thing that does not hang together otherwise: `bad_room`, `bad_length`
 */
export function toRoomInput(file: RoomFile, units: LengthUnit): RoomInputResult {
  const corners: CornerInput[] = [];
  for (const [i, corner] of file.corners.entries()) {
    const read = toCorner(corner, units);
    if (typeof read === 'string') return refuse('bad_length', read, `corners[${i}].sd`);
    corners.push(read);
  }
  const input: RoomInput = {
    closed: file.closed,
    walls: file.walls.map(({ id: wall, length, sd, profile }): WallInput => ({
      id: wall,
      lengths: length,
      ...(sd !== undefined && { sd }),
      ...(profile && { profile }),
    })),
    corners,
    ties: file.ties.map(({ sd, ...tie }): TieInput => ({ ...tie, ...(sd !== undefined && { sd }) })),
    tapeSd: file.tapeSd ?? DEFAULT_TAPE_SD,
    trust: file.trust,
    ignore: file.ignore,
    ...(file.sketch && { sketch: file.sketch }),
  };
  const structure = checkStructure(input);
  if (structure) return { ok: false, error: structure };
  return unknownName(input) ?? { ok: true, input };
}

function refuse(code: string, message: string, path: string): RoomInputResult {
  return { ok: false, error: { code, message, path } };
}

/** The corner, or what is wrong with its standard deviation. */
function toCorner(corner: RoomFile['corners'][number], units: LengthUnit): CornerInput | string {
  const { between, nominal, triangle, angle, sd } = corner;
  const bySd = angle !== undefined ? readDegrees(sd) : readInches(sd, units);
  if (typeof bySd === 'string') return bySd;
  const triangleSd = triangle?.sd ?? (angle === undefined ? bySd : undefined);
  return {
    between,
    ...(nominal !== undefined && { nominalDeg: nominal }),
    ...(triangle && {
      triangle: { a: triangle.a, b: triangle.b, c: triangle.c, ...(triangleSd !== undefined && { sd: triangleSd }) },
    }),
    ...(angle !== undefined && { angleDeg: angle, ...(bySd !== undefined && { angleSdDeg: bySd }) }),
  };
}

function readDegrees(raw: string | number | undefined): number | string | undefined {
  if (raw === undefined || typeof raw === 'number') return raw;
  return 'The standard deviation of a protractor reading has to be a number of degrees.';
}

function readInches(raw: string | number | undefined, units: LengthUnit): number | string | undefined {
  if (raw === undefined) return undefined;
  const result = inchesOf(raw, units, false);
  return 'value' in result ? result.value : result.message;
}

/** A name in `trust` or `ignore` that no reading has: left standing, a misspelt one would change nothing and say nothing. */
function unknownName(input: RoomInput): RoomInputResult | null {
  const known = new Set([
    ...input.walls.map((w) => wallName(w.id)),
    ...roomFrame(input).corners.map((c) => cornerName(c.between)),
    ...input.ties.map((t) => tieName(t.id)),
  ]);
  for (const list of ['trust', 'ignore'] as const) {
    const i = input[list].findIndex((name) => !known.has(name));
    if (i >= 0) return refuse('bad_room', `There is no reading called "${input[list][i]}".`, `${list}[${i}]`);
  }
  return null;
}
