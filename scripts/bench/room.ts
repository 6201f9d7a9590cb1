import { fitRoom } from '@/geometry/room/fit-room';
import type { RoomInput } from '@/geometry/room/types';
import { tapeRoom } from '@/tests/helpers/taped-room';
import { trueRoom } from '@/tests/helpers/true-rooms';
import { seeded } from '@/tests/helpers/random';
import type { BenchRow } from './bench-row';

/** One picture of a 60 Hz screen, milliseconds. */
const FRAME = 1000 / 60;
const ROUNDS = 300;
const WARM = 60;

/** Solving a galley of 12 walls, with and without what to measure next, against one frame of the screen. */
export async function rows(): Promise<BenchRow[]> {
  const inputs = galleys(20);
  return [
    row('room of 12 walls, solved', inputs, (input) => fitRoom(input)),
    row('room of 12 walls, solved, and what to measure next', inputs, (input) => fitRoom(input, { next: true })),
  ];
}

function row(
  name: string,
  inputs: readonly RoomInput[],
  work: (input: RoomInput) => { readonly ok: boolean },
): BenchRow {
  const times: number[] = [];
  for (let round = 0; round < ROUNDS + WARM; round++) {
    const start = performance.now();
    const result = work(inputs[round % inputs.length]!);
    const took = performance.now() - start;
    if (!result.ok) throw new Error(`${name}: the room was not solved`);
    if (round >= WARM) times.push(took);
  }
  const value = times.sort((a, b) => a - b)[Math.floor(times.length / 2)]!;
  return { name, value, unit: 'ms', against: { name: 'one 60 Hz frame', value: FRAME }, ratio: value / FRAME };
}

/** Noisy readings of crooked galleys: every corner by a triangle, four ties across. */
function galleys(count: number): RoomInput[] {
  const random = seeded(12);
  return Array.from({ length: count }, () => {
    const bend = Array.from({ length: 12 }, () => random.uniform(-2, 2));
    const room = trueRoom('galley', random, bend);
    const walls = room.closed ? room.points.length : room.points.length - 1;
    if (walls !== 12) throw new Error(`${walls} walls instead of 12`);
    const corners = room.nominalDeg.map(() => 'triangle' as const);
    return tapeRoom(room, { corners, ties: [[0, 6], [1, 8], [2, 10], [3, 7]], noise: 1 }, random); // prettier-ignore
  });
}
