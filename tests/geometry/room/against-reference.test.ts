import { fitRoom } from '@/geometry/room/fit-room';
import type { RoomFit, RoomInput } from '@/geometry/room/types';
import { seeded } from '@/tests/helpers/random';
import type { Random } from '@/tests/helpers/random';
import { referenceFit } from '@/tests/helpers/reference-fit';
import type { ReferenceFit } from '@/tests/helpers/reference-fit';
import { tapeRoom } from '@/tests/helpers/taped-room';
import type { TapePlan } from '@/tests/helpers/taped-room';
import { DRAWINGS, trueRoom } from '@/tests/helpers/true-rooms';
import type { TrueRoom } from '@/tests/helpers/true-rooms';

/** Acceptance of the room engine: points, angles, standard deviations. */
const POINT_TOLERANCE = 0.002;
const ANGLE_TOLERANCE_DEG = 0.005;
const SD_SHARE = 0.03;

const MODES = ['exact', 'noisy', 'ties only', 'angles only', 'assumed corners', 'slipped'] as const;
type Mode = (typeof MODES)[number];

const ROOMS_PER_CASE = 4;

function diagonals(room: TrueRoom): (readonly [number, number])[] {
  const count = room.points.length;
  const all: (readonly [number, number])[] = [];
  for (let i = 0; i < count; i++) {
    for (let j = i + 2; j < count; j++) {
      if (!(room.closed && i === 0 && j === count - 1)) all.push([i, j]);
    }
  }
  return all;
}

function some<T>(items: readonly T[], count: number, random: Random): T[] {
  const left = [...items];
  const taken: T[] = [];
  while (taken.length < count && left.length > 0) taken.push(...left.splice(random.below(left.length), 1));
  return taken;
}

function planFor(mode: Mode, room: TrueRoom, random: Random): TapePlan {
  const corners = room.nominalDeg.length;
  const all = (how: TapePlan['corners'][number]): TapePlan['corners'] => room.nominalDeg.map(() => how);
  const ties = diagonals(room);
  const noise = mode === 'exact' ? 0 : 1;
  if (mode === 'ties only') return { corners: all('assumed'), ties: some(ties, corners + 2, random), noise };
  if (mode === 'angles only') return { corners: all('angle'), ties: [], noise };
  if (mode === 'assumed corners') {
    const half = room.nominalDeg.map((_, i): TapePlan['corners'][number] => (i % 2 === 0 ? 'triangle' : 'assumed'));
    return { corners: half, ties: some(ties, 1, random), noise };
  }
  const mixed = room.nominalDeg.map((_, i): TapePlan['corners'][number] => (i % 3 === 2 ? 'angle' : 'triangle'));
  return { corners: mixed, ties: some(ties, 1 + random.below(4), random), noise };
}

/** One reading wrong by half an inch to three inches, or a protractor by two to six degrees. */
function slip(input: RoomInput, random: Random): RoomInput {
  const by = (random.below(2) ? 1 : -1) * random.uniform(0.5, 3);
  const at = random.below(input.walls.length + input.corners.length + input.ties.length);
  if (at < input.walls.length) {
    return { ...input, walls: input.walls.map((w, i) => (i === at ? { ...w, lengths: [w.lengths[0]! + by] } : w)) };
  }
  const corner = at - input.walls.length;
  if (corner >= input.corners.length) {
    const tie = corner - input.corners.length;
    return { ...input, ties: input.ties.map((t, i) => (i === tie ? { ...t, length: t.length + by } : t)) };
  }
  const corners = input.corners.map((c, i) => {
    if (i !== corner) return c;
    if (c.angleDeg !== undefined) return { ...c, angleDeg: c.angleDeg + 2 * by };
    return c.triangle ? { ...c, triangle: { ...c.triangle, c: c.triangle.c * (1 + 0.02 * by) } } : c;
  });
  return { ...input, corners };
}

function fitted(input: RoomInput): RoomFit {
  const result = fitRoom(input);
  if (!result.ok) throw new Error(`${result.error.code}: ${result.error.message}`);
  return result.fit;
}

function expectSame(fit: RoomFit, reference: ReferenceFit): void {
  fit.points.forEach((p, i) => {
    expect(Math.hypot(p[0] - reference.points[i]![0], p[1] - reference.points[i]![1])).toBeLessThan(POINT_TOLERANCE);
  });
  fit.corners.forEach((corner, i) => {
    expect(Math.abs(corner.angleDeg - reference.anglesDeg[i]!)).toBeLessThan(ANGLE_TOLERANCE_DEG);
    expect(Math.abs(corner.sdDeg / reference.angleSdsDeg[i]! - 1)).toBeLessThan(SD_SHARE);
  });
  fit.walls.forEach((wall, i) => expect(Math.abs(wall.sd / reference.wallSds[i]! - 1)).toBeLessThan(SD_SHARE));
  expect(fit.dof).toBe(reference.dof);
  expect(Math.abs(fit.chi2 - reference.chi2)).toBeLessThan(1e-6 * (1 + reference.chi2));
  expect(fit.checkCorner).toBe(reference.checkCorner);
  const [suspect] = fit.suspects;
  expect(suspect ? { observation: suspect.observation, orElse: suspect.orElse } : null).toEqual(reference.suspect);
}

describe.each(Object.keys(DRAWINGS))('fitRoom of a %s against an independent least-squares fit', (name) => {
  it.each(MODES)('agrees on points, angles, sds, dof, chi2 and suspect with %s readings', (mode) => {
    const random = seeded(Object.keys(DRAWINGS).indexOf(name) * 100 + MODES.indexOf(mode));
    for (let k = 0; k < ROOMS_PER_CASE; k++) {
      const bends = Array.from({ length: 12 }, () => random.normal() * 0.8);
      const room = trueRoom(name, random, bends);
      const honest = tapeRoom(room, planFor(mode, room, random), random);
      const input = mode === 'slipped' ? slip(honest, random) : honest;
      expectSame(fitted(input), referenceFit(input, room.points));
    }
  });
});
