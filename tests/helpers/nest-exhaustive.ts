import type { Point, Polygon } from '@/geometry/core/point';
import type { NestInstance, NestPart, NestSlab } from '@/geometry/nest/types';

/**
 * The cheapest plan of a tiny instance by trying everything: every option of every choice, every set of slabs, every way to
 * share the parts out over them, every order and move in a row, every way to stack lanes. Written from the rules of nesting
 * (rows of full-depth parts between square factory ends, at most one ripped section a slab), not from the engine.
 */
export interface Exhaustive {
  /** Cents; null when nothing holds the parts. */
  readonly cost: number | null;
}

const FIT = 1e-4;

export function exhaustive(instance: NestInstance): Exhaustive {
  let best: number | null = null;
  for (const parts of settlements(instance)) {
    for (const slabs of purchases(instance, parts.length)) {
      const cost = slabs.reduce((sum, s) => sum + s.price, 0);
      if (best !== null && cost >= best) break;
      if (shareOut(instance, parts, slabs)) best = cost;
    }
  }
  return { cost: best };
}

/** The parts cut, copy by copy, under each way to settle the choices. */
export function settlements(instance: NestInstance): NestPart[][] {
  const byId = new Map(instance.parts.map((p) => [p.id, p]));
  const choices = instance.choices ?? [];
  const optional = new Set(choices.flatMap((c) => c.options.flat()));
  const always = instance.parts.filter((p) => !optional.has(p.id)).map((p) => p.id);
  let lists: string[][] = [always];
  for (const choice of choices) lists = lists.flatMap((list) => choice.options.map((o) => [...list, ...o]));
  return lists.map((ids) => ids.flatMap((id) => new Array<NestPart>(byId.get(id)!.count ?? 1).fill(byId.get(id)!)));
}

/** Sets of at most `most` slabs, the cheapest first. */
function purchases({ stock }: NestInstance, most: number): NestSlab[][] {
  let sets: NestSlab[][] = [[]];
  for (const slab of stock) {
    const limit = Math.min(slab.count ?? most, most);
    sets = sets.flatMap((set) =>
      Array.from({ length: Math.min(limit, most - set.length) + 1 }, (_, n) => [
        ...set,
        ...new Array<NestSlab>(n).fill(slab),
      ]),
    );
  }
  const cost = (set: readonly NestSlab[]): number => set.reduce((sum, s) => sum + s.price, 0);
  return sets.sort((a, b) => cost(a) - cost(b));
}

function shareOut(instance: NestInstance, parts: readonly NestPart[], slabs: readonly NestSlab[]): boolean {
  const held: NestPart[][] = slabs.map(() => []);
  const place = (next: number): boolean => {
    if (next === parts.length) return true;
    return slabs.some((slab, s) => {
      held[s]!.push(parts[next]!);
      const works = fitsOn(instance, slab, held[s]!) && place(next + 1);
      if (!works) held[s]!.pop();
      return works;
    });
  };
  return place(0);
}

/** Whether these parts fit on one slab, worked out once for each set. */
export function fitsOn(instance: NestInstance, slab: NestSlab, parts: readonly NestPart[]): boolean {
  const trim = slab.trim ?? instance.trim;
  const usable = slab.length - 2 * trim;
  const full: Ends[][] = [];
  const shallow: NestPart[] = [];
  for (const part of parts) {
    const shape = read(part.outline);
    if (shape.depth > slab.depth + FIT) return false;
    if (shape.depth > slab.depth - FIT) full.push(waysOf(part));
    else shallow.push(part);
  }
  const sections = shallow.length > 0 ? sectionLengths(instance, shallow, slab.depth) : [null];
  return sections.some((length) => {
    const row = length === null ? full : [...full, [{ mid: length, left: 0, right: 0 }]];
    return shortestRow(row, slab.depth, instance.kerf) <= usable + FIT;
  });
}

interface Ends {
  readonly mid: number;
  readonly left: number;
  readonly right: number;
}

function read(outline: Polygon): Ends & { readonly depth: number; readonly length: number } {
  const xs = outline.map((p) => p[0]);
  const ys = outline.map((p) => p[1]);
  const depth = Math.max(...ys) - Math.min(...ys);
  const at = (y: number): Point[] => outline.filter((p) => Math.abs(p[1] - y) < 1e-9);
  const front = at(Math.min(...ys)).map((p) => p[0]);
  const back = at(Math.max(...ys)).map((p) => p[0]);
  const left = (Math.min(...back) - Math.min(...front)) / depth;
  const right = (Math.max(...back) - Math.max(...front)) / depth;
  const mid = (Math.max(...front) + Math.max(...back) - Math.min(...front) - Math.min(...back)) / 2;
  return { depth, length: Math.max(...xs) - Math.min(...xs), mid, left, right };
}

/** As is (a, b), turned (b, a), over (-a, -b), both (-b, -a). */
function waysOf({ outline, turn = true, turnOver = true }: NestPart): Ends[] {
  const { mid, left, right } = read(outline);
  const ways = [{ mid, left, right }];
  if (turn) ways.push({ mid, left: right, right: left });
  if (turnOver) ways.push({ mid, left: -left, right: -right });
  if (turn && turnOver) ways.push({ mid, left: -right, right: -left });
  return ways;
}

/** Least length of a row between two square ends over all orders and moves. */
export function shortestRow(parts: readonly (readonly Ends[])[], depth: number, kerf: number): number {
  const half = depth / 2;
  const go = (left: readonly (readonly Ends[])[], end: Ends | null): number => {
    if (left.length === 0) return end ? Math.abs(end.right) * half : 0;
    let least = Infinity;
    left.forEach((ways, i) => {
      const others = left.filter((_, j) => j !== i);
      for (const way of ways) {
        const before = end ? gap(end.right, way.left, half, kerf) : Math.abs(way.left) * half;
        least = Math.min(least, before + way.mid + go(others, way));
      }
    });
    return least;
  };
  return go(parts, null);
}

/** A saw cut at the flattest slope between the two must fit between two ends. */
function gap(right: number, left: number, half: number, kerf: number): number {
  const flat = right * left <= 0 ? 0 : Math.min(Math.abs(right), Math.abs(left));
  return Math.abs(right - left) * half + kerf * Math.sqrt(1 + flat * flat);
}

/** Lengths of the sections that hold these parts: every way to put them in lanes that fit the depth. */
function sectionLengths(instance: NestInstance, parts: readonly NestPart[], depth: number): number[] {
  const lengths: number[] = [];
  const share = (next: number, lanes: readonly NestPart[][]): void => {
    if (next < parts.length) {
      lanes.forEach((_, l) =>
        share(
          next + 1,
          lanes.map((lane, i) => (i === l ? [...lane, parts[next]!] : lane)),
        ),
      );
      share(next + 1, [...lanes, [parts[next]!]]);
      return;
    }
    const deep = lanes.map((lane) => Math.max(...lane.map((p) => read(p.outline).depth)));
    if (deep.reduce((sum, d) => sum + d, 0) + instance.kerf * (lanes.length - 1) > depth + FIT) return;
    lengths.push(
      Math.max(
        ...lanes.map((lane, l) =>
          shortestRow(
            lane.map((p) => {
              const { depth: own, length } = read(p.outline);
              return own > deep[l]! - FIT ? waysOf(p) : [{ mid: length, left: 0, right: 0 }];
            }),
            deep[l]!,
            instance.kerf,
          ),
        ),
      ),
    );
  };
  share(0, []);
  return lengths;
}
