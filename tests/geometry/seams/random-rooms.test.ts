import fc from 'fast-check';
import type { Run } from '@/geometry/core/layout';
import type { Polygon } from '@/geometry/core/point';
import { area, boundingBox, signedArea } from '@/geometry/core/polygon';
import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import { fitRoom } from '@/geometry/room/fit-room';
import { layTops } from '@/geometry/seams/lay-tops';
import type { SolvedRoom } from '@/geometry/top/solved-room';
import type { Piece, Tops } from '@/geometry/top/types';
import { sharedArea, unionArea, xorArea } from '../../helpers/clipper-area';
import { edgeCover, expectedDeck } from '../../helpers/expected-deck';
import { randomKitchen, randomRoom, withBows } from '../../helpers/random-kitchen';
import { seeded, type Random } from '../../helpers/random';
import { tapeRoom } from '../../helpers/taped-room';
import type { TrueRoom } from '../../helpers/true-rooms';

/** The clipper rounds corners to 1e-6 in; over some 2,000 in of edges that is 2e-3 square inches at most. */
const CLIPPER = 4e-3;

const ROOMS = 1000;
const count = {
  clean: 0,
  laid: 0,
  groupsChecked: 0,
  groupsNotLaid: 0,
  groupsOnThemselves: 0,
  groupsShort: 0,
  runs: 0,
  pieces: 0,
  joints: 0,
  seams: 0,
  parted: 0,
  bowed: 0,
  tied: 0,
};
const roomRefused: Record<string, number> = {};
const problems: Record<string, number> = {};
const jointKinds: Record<string, number> = {};

/** The room as taped and solved: a triangle or protractor at every corner, a tie across where there is one. */
function solve(room: TrueRoom, random: Random): SolvedRoom | null {
  const corners = room.nominalDeg.map(() => (random.below(2) === 0 ? 'triangle' : 'angle') as 'triangle' | 'angle');
  const last = room.points.length - 1;
  const ties = last > 2 && random.below(2) === 0 ? [[0, 2] as const] : [];
  const fit = fitRoom(tapeRoom(room, { corners, ties, noise: 0.5 }, random));
  if (!fit.ok) {
    roomRefused[fit.error.code] = (roomRefused[fit.error.code] ?? 0) + 1;
    return null;
  }
  if (ties.length > 0) count.tied++;
  const { walls, ...rest } = fit.fit;
  return {
    points: rest.points,
    closed: rest.closed,
    walls: walls.map((wall) => ({ id: wall.id, length: wall.adjusted, profile: [] })),
    corners: rest.corners.map((c) => ({ between: c.between, angle: c.angleDeg, sd: c.sdDeg })),
  };
}

function checkGroup(room: SolvedRoom, tops: Tops, group: readonly Run[]): void {
  const ids = new Set(group.map((run) => run.id));
  count.groupsChecked++;
  const pieces = tops.pieces.filter((piece) => ids.has(piece.on)).map((piece) => piece.outline);
  const deck = expectedDeck(room, group);
  const sum = pieces.reduce((total, outline) => total + area(outline), 0);
  const union = unionArea(pieces);
  expect(Math.abs(union - sum)).toBeLessThan(CLIPPER);
  expect(Math.abs(union - area(deck))).toBeLessThan(CLIPPER);
  expect(xorArea(pieces, [deck])).toBeLessThan(CLIPPER);
}

/** Good face up: the slab shape turned and moved, never mirrored, is the outline in the room. */
function checkShape({ shape, outline, origin, grain: [gx, gy], left, right }: Piece): void {
  const moved = shape.map(([x, y], i) =>
    Math.hypot(origin[0] + gx * x - gy * y - outline[i]![0], origin[1] + gy * x + gx * y - outline[i]![1]),
  );
  expect(Math.max(...moved)).toBeLessThan(1e-9);
  const smallest = [Math.min(...shape.map(([x]) => x)), Math.min(...shape.map(([, y]) => y))];
  expect(Math.abs(smallest[0]!) + Math.abs(smallest[1]!)).toBeLessThan(1e-12);
  expect(Math.min(signedArea(outline), left.angle, right.angle)).toBeGreaterThan(0);
}

function checkJoints(tops: Tops): void {
  for (const joint of tops.joints) {
    const faces = joint.between.map((id) => {
      const outlines = tops.pieces.filter((piece) => piece.on === id).map((piece) => piece.outline);
      return edgeCover(outlines, joint.from, joint.to);
    });
    expect(Math.abs(faces[0]! - faces[1]!)).toBeLessThan(1e-6);
    expect(Math.abs(faces[0]! - joint.length)).toBeLessThan(1e-6);
    count.joints++;
    jointKinds[joint.kind] = (jointKinds[joint.kind] ?? 0) + 1;
  }
}

/** A top is said to lie in a wall exactly when the clipper finds the wall's line inside it. */
function checkWalls(room: SolvedRoom, tops: Tops): void {
  const named = new Set(
    tops.problems.filter((problem) => problem.code === 'top-in-wall').map(({ at }) => `${at.run} ${at.wall}`),
  );
  for (const run of tops.runs) {
    const box = boundingBox(run.outline);
    room.walls.forEach((wall, i) => {
      const [a, b] = [room.points[i]!, room.points[(i + 1) % room.points.length]!];
      const [[x0, x1], [y0, y1]] = [[a[0], b[0]].sort((p, q) => p - q), [a[1], b[1]].sort((p, q) => p - q)];
      if (wall.id === run.wall || x0! > box.maxX || x1! < box.minX || y0! > box.maxY || y1! < box.minY) return;
      const half = 5e-4 / Math.hypot(b[0] - a[0], b[1] - a[1]);
      const [nx, ny] = [(b[1] - a[1]) * half, (a[0] - b[0]) * half];
      const line: Polygon = [
        [a[0] + nx, a[1] + ny],
        [b[0] + nx, b[1] + ny],
        [b[0] - nx, b[1] - ny],
        [a[0] - nx, a[1] - ny],
      ];
      const inside = sharedArea([run.outline], [line]) / 1e-3;
      if (named.has(`${run.id} ${wall.id}`)) expect(inside).toBeGreaterThan(1 / 64);
      else expect(inside).toBeLessThan(0.1);
    });
  }
}

/** Room and runs from one seed: laid, and checked against a deck drawn without the program. */
function layOne(seed: number): void {
  const random = seeded(seed);
  const solved = solve(randomRoom(random), random);
  if (!solved) return;
  const room = withBows(solved, random);
  if (room.walls.some((wall) => wall.profile.length > 0)) count.bowed++;
  const { layout, groups } = randomKitchen(room, random);
  const tops = layTops(layout, room, DEFAULT_SETTINGS);
  const laid = new Set(tops.runs.map((run) => run.id));
  const missing = layout.runs.filter((run) => !laid.has(run.id));
  // Whatever is not laid is named, and nothing else is missing.
  for (const run of missing) {
    const why = tops.problems.find((problem) => problem.at.run === run.id);
    expect(why?.code).toBe('run-too-short');
  }
  for (const { code } of tops.problems) problems[code] = (problems[code] ?? 0) + 1;
  if (layout.runs.some((run) => run.from > 0)) count.parted++;
  // A through run that is too short for the other's end leaves a corner of the deck bare: it has said so.
  const short = pairs(tops, 'joint-short-face');
  const clashes = pairs(tops, 'tops-overlap');
  for (const group of groups) {
    if (!group.every((run) => laid.has(run.id))) count.groupsNotLaid++;
    else if (among(group, clashes)) count.groupsOnThemselves++;
    else if (among(group, short)) count.groupsShort++;
    else checkGroup(room, tops, group);
  }
  if (short.length === 0) checkJoints(tops);
  const outlines = tops.pieces.map((piece) => piece.outline);
  const overlap = outlines.reduce((sum, outline) => sum + area(outline), 0) - unionArea(outlines);
  expect(overlap > CLIPPER).toBe(clashes.length > 0);
  checkWalls(room, tops);
  for (const piece of tops.pieces) checkShape(piece);
  expect(new Set(tops.pieces.map((piece) => piece.letter)).size).toBe(tops.pieces.length);
  if (missing.length === 0) count.laid++;
  if (tops.problems.every((problem) => problem.severity === 'warn')) count.clean++;
  count.runs += laid.size;
  count.pieces += tops.pieces.length;
  count.seams += tops.seams.length;
}

const pairs = (tops: Tops, code: string): readonly string[] =>
  tops.problems.filter((problem) => problem.code === code).map((problem) => problem.at.joint ?? '');

const among = (group: readonly Run[], found: readonly string[]): boolean => {
  const ids = new Set(group.map((run) => run.id));
  return found.some((pair) => pair.split('-').every((id) => ids.has(id)));
};

describe('layTops over 1,000 random rooms', () => {
  it('covers the deck once with pieces whose joint faces match to 1e-6 in', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 2 ** 31 - 1 }), (seed) => layOne(seed)),
      { seed: 40, numRuns: ROOMS, endOnFailure: true },
    );
  });

  it('refuses readings and runs only with a reason, this often', () => {
    expect(roomRefused).toEqual({ triangle_impossible: 34, undetermined: 6 });
    // 960 rooms solved; 'clean' ones have nothing that must be fixed, in 'laid' ones every run is laid.
    expect(count).toEqual({
      clean: 727,
      laid: 883,
      groupsChecked: 1765,
      groupsNotLaid: 94,
      groupsOnThemselves: 12,
      groupsShort: 20,
      runs: 3164,
      pieces: 5757,
      joints: 1158,
      seams: 2593,
      parted: 313,
      bowed: 765,
      tied: 386,
    });
    expect(problems).toEqual({
      'run-too-short': 96,
      'tops-overlap': 204,
      'top-in-wall': 145,
      'joint-short-face': 21,
      'end-touches-bump': 90,
      'seam-no-place': 14,
    });
    expect(jointKinds).toEqual({ miter: 787, butt: 313, step: 53, square: 5 });
  });
});
