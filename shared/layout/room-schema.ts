import { z } from 'zod';

import { checkStructure } from '@/geometry/room/check-structure';
import { cornerName, roomFrame, tieName, wallName } from '@/geometry/room/room-frame';
import { DEFAULT_TAPE_SD } from '@/geometry/room/types';
import type { CornerInput, RoomInput, TieInput, WallInput } from '@/geometry/room/types';
import type { LengthUnit } from '@/geometry/tape/parse-length';

import { alongIn, fileUnitsSchema, inchesOf, lengthIn, readingIn, readingsIn } from './file-length';

/** Most walls, ties and stations of a room that a file may hold. */
const MOST_WALLS = 60;
const MOST_TIES = 200;
const MOST_STATIONS = 100;

const id = z.string({ error: 'A name has to be a text.' }).min(1, 'A name is missing here.').max(40);
const names = z.array(z.string().max(100)).max(MOST_TIES);

const degrees = (what: string) =>
  z
    .number({ error: `${what} has to be a number of degrees.` })
    .gt(0, `${what} has to be over 0.`)
    .lt(360, `${what} has to be under 360.`);

/** The room of a file in these units, as it stands in a room file and in a job file; unknown keys are refused by name. */
export function roomBlockSchema(units: LengthUnit) {
  const length = lengthIn(units);
  const signed = lengthIn(units, true, 'An offset');
  const reading = readingIn(units);
  const sd = lengthIn(units, false, 'A standard deviation').optional();
  const mark = z.strictObject({ wall: id, at: alongIn(units) });
  const profile = z.array(z.strictObject({ at: length, off: signed })).max(MOST_STATIONS);
  return z.strictObject({
    units: fileUnitsSchema.optional(),
    closed: z.boolean().default(false),
    tapeSd: z.strictObject({ fixed: length, perInch: z.number().min(0) }).optional(),
    walls: z
      .array(
        z.strictObject({
          id,
          length: readingsIn(units).optional(),
          sd,
          profile: profile.optional(),
          outOfPlumb: signed.optional(),
        }),
      )
      .max(MOST_WALLS),
    corners: z.array(cornerSchema(units)).max(MOST_WALLS).default([]),
    ties: z
      .array(z.strictObject({ id, from: mark, to: mark, length: reading, sd }))
      .max(MOST_TIES)
      .default([]),
    trust: names.default([]),
    ignore: names.default([]),
    sketch: z.array(z.tuple([signed, signed])).optional(),
  });
}

/** A corner; its own `sd` is degrees beside a protractor reading, a length beside a triangle alone. */
function cornerSchema(units: LengthUnit) {
  const reading = readingIn(units);
  const sd = lengthIn(units, false, 'A standard deviation').optional();
  return z
    .strictObject({
      between: z.tuple([id, id]),
      nominal: degrees('A nominal angle').optional(),
      triangle: z.strictObject({ a: reading, b: reading, c: reading, sd }).optional(),
      angle: degrees('An angle').optional(),
      sd: z.union([z.number(), z.string()], { error: 'A standard deviation has to be a number.' }).optional(),
    })
    .transform(({ sd: raw, ...corner }, context): typeof corner & { sd?: number } => {
      if (raw === undefined) return corner;
      const read = corner.angle !== undefined ? degreesOf(raw) : inchesOf(raw, units, false);
      if ('value' in read) return { ...corner, sd: read.value };
      context.addIssue({ code: 'custom', message: read.message, path: ['sd'] });
      return z.NEVER;
    });
}

const degreesOf = (raw: string | number): { value: number } | { message: string } =>
  typeof raw === 'number'
    ? { value: raw }
    : { message: 'The standard deviation of a protractor reading has to be a number of degrees.' };

export type RoomFile = z.output<ReturnType<typeof roomBlockSchema>>;

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
 * @returns the first thing that does not hang together otherwise: `bad_room`
 */
export function toRoomInput(file: RoomFile): RoomInputResult {
  const input: RoomInput = {
    closed: file.closed,
    walls: file.walls.map(({ id: wall, length, sd, profile }): WallInput => ({
      id: wall,
      lengths: (length ?? []).map((reading) => reading.value),
      ...(sd !== undefined && { sd }),
      ...(profile && { profile }),
    })),
    corners: file.corners.map(toCorner),
    ties: file.ties.map(({ sd, length, ...tie }): TieInput => ({
      ...tie,
      length: length.value,
      ...(sd !== undefined && { sd }),
    })),
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

function toCorner({ between, nominal, triangle, angle, sd }: RoomFile['corners'][number]): CornerInput {
  const triangleSd = triangle?.sd ?? (angle === undefined ? sd : undefined);
  return {
    between,
    ...(nominal !== undefined && { nominalDeg: nominal }),
    ...(triangle && {
      triangle: {
        a: triangle.a.value,
        b: triangle.b.value,
        c: triangle.c.value,
        ...(triangleSd !== undefined && { sd: triangleSd }),
      },
    }),
    ...(angle !== undefined && { angleDeg: angle, ...(sd !== undefined && { angleSdDeg: sd }) }),
  };
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
