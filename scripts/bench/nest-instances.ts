import type { Point, Polygon } from '@/geometry/core/point';
import type { NestInstance, NestPart, NestSlab } from '@/geometry/nest/types';
import { createDraw, type Draw } from './draw';

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

export function stockSlabs(draw: Draw, lengths: readonly number[] = [72, 96, 120, 144], depth = DEPTH): NestSlab[] {
  return lengths.map((length) => ({
    id: `S${length}x${depth}`,
    length,
    depth,
    price: Math.round(length * depth * 0.158 * draw.between(0.96, 1.04)) * 100,
    count: null,
  }));
}

export function run(draw: Draw, id: string, least = 18, most = 88, depth = DEPTH): NestPart {
  const mid = draw.between(least, most);
  const left = slope(draw);
  const right = slope(draw);
  return { id, outline: trapezoid(mid, left, right, depth), turn: true, turnOver: draw.chance(0.7) };
}

const slope = (draw: Draw): number =>
  draw.chance(0.5) ? 0 : (draw.chance(0.5) ? 1 : -1) * Math.tan(((45 + draw.between(-2, 2)) * Math.PI) / 180);

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

function strip(draw: Draw, id: string): NestPart {
  const width = draw.chance(2 / 3) ? 4 : draw.chance(0.5) ? 3 : 6;
  return { id, outline: rectangle(draw.between(12, 84), width) };
}

function offcut(draw: Draw, id: string): NestSlab {
  const length = draw.between(22, 60);
  const w = draw.between(2, 4);
  const defects = draw.chance(0.5) ? [{ x: draw.chance(0.5) ? 0 : length - w, y: 0, w, h: DEPTH }] : [];
  return { id, length, depth: DEPTH, price: 0, count: 1, trim: 0, defects };
}

const settings = { kerf: 0.125, trim: 0.5, reuseMin: 18 };
const list = <T>(n: number, make: (i: number) => T): T[] => Array.from({ length: n }, (_, i) => make(i));

/** Runs, strips and offcuts in the numbers asked for. */
export function mixedInstance(seed: number, runs: number, strips: number, offcuts: number): NestInstance {
  const draw = createDraw(seed);
  return {
    id: `runs${runs}-strips${strips}-offcuts${offcuts}-${seed}`,
    ...settings,
    stock: [...stockSlabs(draw), ...list(offcuts, (i) => offcut(draw, `R${i + 1}`))],
    parts: [...list(runs, (i) => run(draw, `P${i + 1}`)), ...list(strips, (i) => strip(draw, `s${i + 1}`))],
  };
}

/** A U of three runs: both corners mitered near 45 degrees, the outer ends square. */
export function uInstance(seed: number): NestInstance {
  const draw = createDraw(seed);
  const miter = (): number => Math.tan(((45 + draw.between(-1.5, 1.5)) * Math.PI) / 180);
  const [a, b] = [miter(), miter()];
  const parts: NestPart[] = [
    { id: 'P', outline: trapezoid(draw.between(40, 90), 0, a, DEPTH) },
    { id: 'Q', outline: trapezoid(draw.between(40, 90), -a, b, DEPTH) },
    { id: 'R', outline: trapezoid(draw.between(40, 90), -b, 0, DEPTH) },
  ];
  return { id: `u-${seed}`, ...settings, stock: stockSlabs(draw), parts };
}

/**
 * Slabs taken apart by straight through-cuts, with the kerf lost at each: crosscuts square or leaning up to 45 degrees, and on
 * every other slab one section between square cuts ripped into lanes. The pieces are shuffled, turned and turned over, so
 * `slabs` slabs are enough by construction; their area shows that fewer are not.
 */
export function knownInstance(seed: number, slabs: number): NestInstance {
  const draw = createDraw(seed);
  const length = draw.whole(84, 144);
  const usable = length - 2 * settings.trim;
  const outlines = list(slabs, (i) => sawnSlab(draw, usable, i % 2 === 1)).flat();
  const parts = draw
    .shuffled(outlines)
    .map((outline, i): NestPart => ({ id: `k${i + 1}`, outline: moved(outline, draw.chance(0.5), draw.chance(0.5)) }));
  return {
    id: `known-${slabs}-${seed}`,
    ...settings,
    stock: [{ id: 'S', length, depth: DEPTH, price: 40_000, count: null }],
    parts,
  };
}

/** How many slabs a known instance was sawn from. */
export const knownSlabs = ({ id }: NestInstance): number => Number(id.split('-')[1]);

function sawnSlab(draw: Draw, usable: number, withSection: boolean): Polygon[] {
  const pieces: Polygon[] = [];
  let at = 0;
  let slope = 0;
  while (usable - at > 60) {
    const next = draw.chance(0.5) ? 0 : draw.between(-1, 1);
    const end = at + draw.between(Math.abs(next - slope) * (DEPTH / 2) + 8, 42);
    pieces.push(trapezoid(end - at, slope, next, DEPTH));
    at = end + settings.kerf * Math.hypot(1, next);
    slope = next;
  }
  if (!withSection) return [...pieces, trapezoid(usable - at, slope, 0, DEPTH)];
  const end = at + Math.abs(slope) * (DEPTH / 2) + draw.between(8, 20);
  pieces.push(trapezoid(end - at, slope, 0, DEPTH));
  return [...pieces, ...sawnSection(draw, usable - end - settings.kerf)];
}

/** Lanes that use up the depth, each cut once across. */
function sawnSection(draw: Draw, length: number): Polygon[] {
  const pieces: Polygon[] = [];
  for (let left = DEPTH; left > 0;) {
    const width = left < 10 ? left : draw.whole(4, Math.min(8, Math.floor(left) - 4));
    const first = draw.between(length * 0.3, length * 0.7);
    pieces.push(rectangle(first, width), rectangle(length - first - settings.kerf, width));
    left -= width + settings.kerf;
  }
  return pieces;
}

/** The outline as drawn by somebody who had the piece the other way round. */
function moved(outline: Polygon, turned: boolean, over: boolean): Polygon {
  const points = outline.map(([x, y]): Point => [turned ? -x : x, turned !== over ? -y : y]);
  const minX = Math.min(...points.map((p) => p[0]));
  const minY = Math.min(...points.map((p) => p[1]));
  const placed = points.map(([x, y]): Point => [x - minX, y - minY]);
  return over ? placed.reverse() : placed;
}
