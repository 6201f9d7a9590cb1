import type { Point, Polygon } from '@/geometry/core/point';
import type { NestInstance, NestPart, NestSlab } from '@/geometry/nest/types';
import { createRandom, type Random } from './random';

/**
 * Instances for the bench and the tests, made from a seed by these rules alone.
 *
 * Stock: slabs 25 in deep, 72, 96, 120 and 144 in long at about 395 cents an inch, each price within 4 % of that, whole
 * dollars; kerf 1/8, trim 1/2 in at each factory end, as many as wanted.
 * Runs: mid-depth length even between 18 and 88 in; each end is square (one in two) or at 45 degrees give or take 2, to either
 * side; all may be turned, seven in ten turned over too.
 * Strips: 4 in wide (two in three), else 3 or 6; length even between 12 and 84 in.
 * Offcuts: 22 to 60 in, 25 in deep, price 0, no trim, one of each; one in two has a defect of 2 to 4 in across one end.
 */

const DEPTH = 25;

export function stockSlabs(random: Random, lengths: readonly number[] = [72, 96, 120, 144], depth = DEPTH): NestSlab[] {
  return lengths.map((length) => ({
    id: `S${length}x${depth}`,
    length,
    depth,
    price: Math.round(length * depth * 0.158 * random.between(0.96, 1.04)) * 100,
    count: null,
  }));
}

export function run(random: Random, id: string, least = 18, most = 88, depth = DEPTH): NestPart {
  const mid = random.between(least, most);
  const left = slope(random);
  const right = slope(random);
  return { id, outline: trapezoid(mid, left, right, depth), turn: true, turnOver: random.chance(0.7) };
}

const slope = (random: Random): number =>
  random.chance(0.5) ? 0 : (random.chance(0.5) ? 1 : -1) * Math.tan(((45 + random.between(-2, 2)) * Math.PI) / 180);

/** A run by its mid-depth length and the slopes dx/dy of its ends, moved to x = 0; grown where its front or back would vanish. */
export function trapezoid(mid: number, left: number, right: number, depth: number): Polygon {
  const half = depth / 2;
  const safe = Math.max(mid, Math.abs(right - left) * half + 4);
  const points: Point[] = [
    [-left * half, 0],
    [safe - right * half, 0],
    [safe + right * half, depth],
    [left * half, depth],
  ];
  const minX = Math.min(...points.map((p) => p[0]));
  return points.map(([x, y]): Point => [x - minX, y]);
}

export function rectangle(length: number, depth: number): Polygon {
  return [
    [0, 0],
    [length, 0],
    [length, depth],
    [0, depth],
  ];
}

function strip(random: Random, id: string): NestPart {
  const width = random.chance(2 / 3) ? 4 : random.chance(0.5) ? 3 : 6;
  return { id, outline: rectangle(random.between(12, 84), width) };
}

function offcut(random: Random, id: string): NestSlab {
  const length = random.between(22, 60);
  const w = random.between(2, 4);
  const defects = random.chance(0.5) ? [{ x: random.chance(0.5) ? 0 : length - w, y: 0, w, h: DEPTH }] : [];
  return { id, length, depth: DEPTH, price: 0, count: 1, trim: 0, defects };
}

const settings = { kerf: 0.125, trim: 0.5, reuseMin: 18 };
const list = <T>(n: number, make: (i: number) => T): T[] => Array.from({ length: n }, (_, i) => make(i));

/** Runs, strips and offcuts in the numbers asked for. */
export function mixedInstance(seed: number, runs: number, strips: number, offcuts: number): NestInstance {
  const random = createRandom(seed);
  return {
    id: `runs${runs}-strips${strips}-offcuts${offcuts}-${seed}`,
    ...settings,
    stock: [...stockSlabs(random), ...list(offcuts, (i) => offcut(random, `R${i + 1}`))],
    parts: [...list(runs, (i) => run(random, `P${i + 1}`)), ...list(strips, (i) => strip(random, `s${i + 1}`))],
  };
}

/** A U of three runs: both corners mitered near 45 degrees, the outer ends square. */
export function uInstance(seed: number): NestInstance {
  const random = createRandom(seed);
  const miter = (): number => Math.tan(((45 + random.between(-1.5, 1.5)) * Math.PI) / 180);
  const [a, b] = [miter(), miter()];
  const parts: NestPart[] = [
    { id: 'P', outline: trapezoid(random.between(40, 90), 0, a, DEPTH) },
    { id: 'Q', outline: trapezoid(random.between(40, 90), -a, b, DEPTH) },
    { id: 'R', outline: trapezoid(random.between(40, 90), -b, 0, DEPTH) },
  ];
  return { id: `u-${seed}`, ...settings, stock: stockSlabs(random), parts };
}
