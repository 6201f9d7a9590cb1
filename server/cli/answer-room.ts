import { fitRoom } from '@/geometry/room/fit-room';
import { readRoomFile } from '@/shared/layout/read-room-file';
import { toRoomOutput } from '@/shared/layout/room-output';

import type { Answer } from './batch';

/** Solves the room of one input of the `room` command. */
export function answerRoom(json: unknown): Answer {
  const read = readRoomFile(json);
  if (!read.ok) return read;
  const result = fitRoom(read.input, { next: true });
  return result.ok ? { ok: true, output: toRoomOutput(result.fit) } : result;
}
