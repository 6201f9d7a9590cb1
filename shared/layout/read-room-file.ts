import { z } from 'zod';

import { fileUnitsSchema } from './file-length';
import { fileErrors } from './parse-job-file';
import { roomBlockSchema, toRoomInput } from './room-schema';
import type { RoomInputResult } from './room-schema';

/**
 * Reads a room file (or the room block of a job file).
 *
 * @param json - as parsed from the file
 * @returns the input of `fitRoom`, or the first error with its place: `unknown_key`, `bad_length`, `bad_input`,
 *   `bad_room`
 */
export function readRoomFile(json: unknown): RoomInputResult {
  const head = z
    .object({ units: fileUnitsSchema.optional() }, { error: 'A room is an object with walls.' })
    .safeParse(json);
  if (!head.success) return { ok: false, error: firstError(head.error) };
  const units = head.data.units ?? 'in';
  const parsed = roomBlockSchema(units).safeParse(json);
  return parsed.success ? toRoomInput(parsed.data) : { ok: false, error: firstError(parsed.error) };
}

function firstError(error: z.ZodError): { code: string; message: string; path: string } {
  const issue = fileErrors(error)[0]!;
  const code =
    issue.code === 'unrecognized_keys' ? 'unknown_key' : issue.code === 'custom' ? 'bad_length' : 'bad_input';
  return { ...issue, code };
}
