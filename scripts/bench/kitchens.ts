import type { Layout } from '@/geometry/core/layout';
import { parseJobFile } from '@/shared/layout/parse-job-file';
import { createDraw, type Draw } from './draw';

/**
 * Kitchens for the bench, made from a seed by these rules alone.
 *
 * Room: a closed ring of walls. One long straight wall at the left has the doors; the wall opposite goes in and out in
 * teeth 72 in deep, so that inside and outside corners alternate in pairs. Every corner stands up to 1 1/2 in off its
 * drawing in both directions, then all is taped: each wall, the triangle of each corner (marks at 36 and 48 in), and one
 * tie for every four walls; each reading is rounded to 1/16 in and reads up to 1/16 in wrong.
 * Tops: a run 25 in deep on every wall but the one with the doors, mitered at every corner between two runs; walls of
 * more than 143 in take a seam. A sink in every third run that is long enough, with its base below, and a cooktop in the
 * run after it. From six walls on an island for every twelve walls begun, and backsplash strips until the pieces wanted
 * are complete.
 */
export interface KitchenSize {
  readonly pieces: number;
  /** Walls of the ring: an even number. */
  readonly walls: number;
}

/** Pieces grow with the walls; the third is the kitchen that has to fit into one frame. */
export const KITCHENS: readonly KitchenSize[] = [
  { pieces: 5, walls: 4 },
  { pieces: 10, walls: 6 },
  { pieces: 20, walls: 12 },
  { pieces: 40, walls: 24 },
];

const TOOTH = 72;
const ACROSS = 156;
const SHORT = 80;
const LONG = 152;
/** Usable length of the longest slab, inches: what is longer has a seam. */
const ONE_PIECE = 142;

/** The job file of a kitchen of this size. */
export function kitchenFile(seed: number, { pieces, walls }: KitchenSize): Record<string, unknown> {
  const random = createDraw(seed);
  const drawn = drawnRing(walls);
  const stands = drawn.map(([x, y], i): Point => (i === 0 ? [x, y] : [x + off(random), y + off(random)]));
  const ids = drawn.map((_, i) => `w${i + 1}`);
  const lengths = stands.map((point, i) => distance(point, stands[(i + 1) % walls]!));
  const runs = ids.slice(0, -1);
  const seams = lengths.slice(0, -1).filter((length) => length - 0.5 > ONE_PIECE).length;
  const islands = walls < 6 ? 0 : Math.ceil(walls / 12);
  const strips = pieces - runs.length - seams - islands;
  const cut = cutoutsOf(lengths);
  return {
    format: 'offsquare-job',
    version: 1,
    name: `Kitchen of ${walls} walls and ${pieces} pieces`,
    room: { closed: true, ...readings(random, stands, drawn, ids), sketch: drawn },
    bases: cut.map(({ run, kind, centre }) => ({
      id: `b${run}`,
      wall: `w${run}`,
      from: centre - 18,
      to: centre + 18,
      kind: kind === 'sink' ? 'sink base' : 'range',
    })),
    runs: runs.map((wall, i) => ({
      id: String(i + 1),
      wall,
      left: i === 0 ? { kind: 'wall' } : { kind: 'joint' },
      right: i === runs.length - 1 ? { kind: 'wall' } : { kind: 'joint' },
    })),
    joints: runs.slice(1).map((_, i) => ({
      between: [String(i + 1), String(i + 2)],
      kind: 'miter',
      assembled: 'site',
    })),
    cutouts: cut.map(({ run, kind, centre }) => ({
      id: `c${run}`,
      on: String(run),
      kind,
      centre,
      setback: 3,
      width: 30,
      depth: 18,
      radius: 0.75,
    })),
    islands: Array.from({ length: islands }, (_, i) => ({ id: `I${i + 1}`, length: 72, depth: 25 })),
    strips: Array.from({ length: strips }, (_, i) => ({
      id: `s${i + 1}`,
      label: 'backsplash',
      length: 36 + 4 * i,
      width: 4,
      thickness: 0.75,
    })),
    stock: {
      slabs: [72, 96, 120, 144].map((length) => ({
        id: `S${length}`,
        length,
        depth: 25,
        price: length * 395,
        count: null,
      })),
    },
  };
}

/** The same as a layout, read by the door every job file comes through. */
export function kitchen(seed: number, size: KitchenSize): Layout {
  const parsed = parseJobFile(kitchenFile(seed, size));
  if (!parsed.ok) throw new Error(parsed.errors.map((error) => `${error.path}: ${error.message}`).join('\n'));
  return parsed.layout;
}

type Point = readonly [number, number];

/** Top wall to the right, then down in teeth, back along the bottom; the last wall closes the ring. */
function drawnRing(walls: number): Point[] {
  const points: Point[] = [
    [0, 0],
    [ACROSS, 0],
  ];
  let [x, y] = [ACROSS, 0];
  const down = walls / 2 - 1;
  for (let i = 0; i < down; i++) {
    y -= i % 3 === 1 ? LONG : SHORT;
    points.push([x, y]);
    if (i === down - 1) break;
    x = x === ACROSS ? ACROSS - TOOTH : ACROSS;
    points.push([x, y]);
  }
  points.push([0, y]);
  return points;
}

function cutoutsOf(lengths: readonly number[]): { run: number; kind: 'sink' | 'cooktop'; centre: number }[] {
  return lengths.slice(0, -1).flatMap((length, i) => {
    if (i % 3 === 2 || length < 80) return [];
    return [{ run: i + 1, kind: i % 3 === 0 ? ('sink' as const) : ('cooktop' as const), centre: length / 2 }];
  });
}

function readings(random: Draw, stands: readonly Point[], drawn: readonly Point[], ids: readonly string[]) {
  const n = ids.length;
  const at = (points: readonly Point[], i: number): Point => points[(i + n) % n]!;
  const taped = (length: number) => Math.round((length + random.between(-1 / 16, 1 / 16)) * 16) / 16;
  const walls = ids.map((id, i) => ({ id, length: taped(distance(at(stands, i), at(stands, i + 1))) }));
  const corners = ids.map((id, i) => {
    const angle = interior(at(stands, i), at(stands, i + 1), at(stands, i + 2));
    const nominal = Math.round((interior(at(drawn, i), at(drawn, i + 1), at(drawn, i + 2)) * 180) / Math.PI);
    const c = Math.sqrt(36 ** 2 + 48 ** 2 - 2 * 36 * 48 * Math.cos(angle));
    return { between: [id, ids[(i + 1) % n]], nominal, triangle: { a: 36, b: 48, c: taped(c) } };
  });
  const ties = Array.from({ length: Math.floor(n / 4) }, (_, i) => {
    const [from, to] = [2 * i, (2 * i + Math.floor(n / 2)) % n];
    const length = taped(distance(at(stands, from + 1), at(stands, to + 1)));
    return { id: `t${i + 1}`, from: { wall: ids[from], at: 'end' }, to: { wall: ids[to], at: 'end' }, length };
  });
  return { walls, corners, ties };
}

const off = (random: Draw): number => random.between(-1.5, 1.5);
const distance = (p: Point, q: Point): number => Math.hypot(q[0] - p[0], q[1] - p[1]);

/** Interior angle at q of a ring walked with the room on the right-hand side, radians. */
function interior(p: Point, q: Point, r: Point): number {
  const turn = Math.atan2(r[1] - q[1], r[0] - q[0]) - Math.atan2(q[1] - p[1], q[0] - p[0]);
  const within = Math.atan2(Math.sin(turn), Math.cos(turn));
  return Math.PI + within;
}
