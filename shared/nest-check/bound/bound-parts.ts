import type { Point, Polygon } from '@/geometry/core/point';
import type { NestInstance, NestPart } from '@/geometry/nest/types';
import { areaOf, spanOf } from '../polygons';

/** A part, or a group's parts glued, as the class of plans sees it: a trapezoid, or an upright box in a deeper row. */
export interface BoundPart {
  /** Ids of the parts, joined. */
  readonly key: string;
  readonly depth: number;
  readonly box: number;
  readonly mid: number;
  /** Slopes dx/dy of the ends. */
  readonly left: number;
  readonly right: number;
  readonly turn: boolean;
  readonly over: boolean;
  readonly outlines: readonly Polygon[];
}

/** One way to settle every choice: how often each part or glued group is cut. */
export interface Settlement {
  /** By choice. */
  readonly picked: readonly number[];
  readonly needs: ReadonlyMap<string, number>;
}

const SAME = 1e-6;
const MOST_SETTLEMENTS = 20_000;

export const keyOf = (ids: readonly string[]): string => JSON.stringify(ids);

/** All ways to settle the choices with the parts they cut; null when there are too many, or a part is no trapezoid. */
export function readSettlements(
  instance: NestInstance,
): { readonly parts: ReadonlyMap<string, BoundPart>; readonly settlements: readonly Settlement[] } | null {
  const parts = new Map<string, BoundPart>();
  const choices = instance.choices ?? [];
  const optional = new Set(choices.flatMap((c) => c.options.flat()));
  const always = instance.parts.filter((p) => !optional.has(p.id)).map((p) => p.id);
  let ways: number[][] = [[]];
  for (const choice of choices) {
    ways = ways.flatMap((way) => choice.options.map((_, o) => [...way, o]));
    if (ways.length > MOST_SETTLEMENTS) return null;
  }
  const settlements: Settlement[] = [];
  for (const picked of ways) {
    const ids = [...always, ...picked.flatMap((o, c) => choices[c]!.options[o]!)];
    const needs = readNeeds(instance, new Set(ids), parts);
    if (!needs) return null;
    settlements.push({ picked, needs });
  }
  return { parts, settlements };
}

/** Groups among the parts cut first, then single parts; collects what is new in `parts`. */
function readNeeds(
  instance: NestInstance,
  ids: ReadonlySet<string>,
  parts: Map<string, BoundPart>,
): Map<string, number> | null {
  const byId = new Map(instance.parts.map((p) => [p.id, p]));
  const left = new Map([...ids].map((id) => [id, byId.get(id)!.count ?? 1]));
  const needs = new Map<string, number>();
  const add = (members: readonly NestPart[], count: number, over: boolean): boolean => {
    const key = keyOf(members.map((p) => p.id));
    if (!parts.has(key)) {
      const part = gluePart(key, members, instance.kerf, over);
      if (!part) return false;
      parts.set(key, part);
    }
    needs.set(key, (needs.get(key) ?? 0) + count);
    return true;
  };
  for (const group of instance.groups ?? []) {
    const members = group.parts.filter((id) => (left.get(id) ?? 0) > 0);
    if (members.length < 2) continue;
    members.forEach((id) => left.set(id, left.get(id)! - 1));
    if (
      !add(
        members.map((id) => byId.get(id)!),
        1,
        false,
      )
    )
      return null;
  }
  const grouped = new Set((instance.groups ?? []).flatMap((g) => g.parts));
  for (const [id, count] of left) {
    const part = byId.get(id)!;
    const whole = count === (part.count ?? 1);
    if (count > 0 && !add([part], count, part.turnOver !== false && !(grouped.has(id) && whole))) return null;
  }
  return needs;
}

interface Trapezoid {
  readonly depth: number;
  readonly length: number;
  readonly mid: number;
  readonly left: number;
  readonly right: number;
}

function gluePart(key: string, members: readonly NestPart[], kerf: number, over: boolean): BoundPart | null {
  const shapes: Trapezoid[] = [];
  for (const { outline } of members) {
    const shape = readTrapezoid(outline);
    if (!shape || Math.abs(shape.depth - (shapes[0]?.depth ?? shape.depth)) > SAME) return null;
    shapes.push(shape);
  }
  const first = shapes[0]!;
  const last = shapes[shapes.length - 1]!;
  const half = first.depth / 2;
  let mid = first.mid;
  for (let i = 1; i < shapes.length; i++)
    mid += gapBetween(shapes[i - 1]!.right, shapes[i]!.left, half, kerf) + shapes[i]!.mid;
  return {
    key,
    depth: first.depth,
    mid,
    box: Math.abs(first.left) * half + mid + Math.abs(last.right) * half,
    left: first.left,
    right: last.right,
    turn: members.every((p) => p.turn !== false),
    over,
    outlines: members.map((p) => p.outline),
  };
}

/** Front and back on two level lines, one straight end on either side; null for any other outline. */
function readTrapezoid(outline: Polygon): Trapezoid | null {
  const { minX, maxX, minY, maxY } = spanOf(outline);
  const depth = maxY - minY;
  const front = outline.filter((p) => Math.abs(p[1] - minY) < SAME).map((p) => p[0]);
  const back = outline.filter((p) => Math.abs(p[1] - maxY) < SAME).map((p) => p[0]);
  const corners: Point[] = [
    [Math.min(...front), minY],
    [Math.max(...front), minY],
    [Math.max(...back), maxY],
    [Math.min(...back), maxY],
  ];
  const [a, b, c, d] = corners as [Point, Point, Point, Point];
  if (Math.abs(areaOf(corners) - areaOf(outline)) > SAME * (maxX - minX + depth)) return null;
  return {
    depth,
    length: maxX - minX,
    mid: (b[0] + c[0] - a[0] - d[0]) / 2,
    left: (d[0] - a[0]) / depth,
    right: (c[0] - b[0]) / depth,
  };
}

/** Least distance at mid-depth between an end of slope `right` and one of slope `left`: a cut at some slope between them must fit. */
export function gapBetween(right: number, left: number, half: number, kerf: number): number {
  const low = Math.min(right, left);
  const high = Math.max(right, left);
  const slope = low > 0 ? low : high < 0 ? high : 0;
  return (high - low) * half + kerf * Math.hypot(1, slope);
}
