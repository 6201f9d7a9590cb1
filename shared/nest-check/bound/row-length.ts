import { gapBetween, type BoundPart } from './bound-parts';

/** Inches by which a row of the class may be over its slab. */
export const CLASS_FIT = 1e-4;

/** A part as a row of one depth sees it. */
export interface RowPart {
  readonly key: string;
  readonly mid: number;
  /** Ends of every way it may lie. */
  readonly ways: readonly (readonly [left: number, right: number])[];
}

/** Null when the part is too deep; the upright box when it is shallower than the row. */
export function asRowPart(part: BoundPart, depth: number): RowPart | null {
  if (part.depth > depth + CLASS_FIT) return null;
  if (part.depth < depth - CLASS_FIT) return { key: part.key, mid: part.box, ways: [[0, 0]] };
  const { left, right } = part;
  const ways: [number, number][] = [[left, right]];
  if (part.turn) ways.push([right, left]);
  if (part.over) ways.push([-left, -right]);
  if (part.turn && part.over) ways.push([-right, -left]);
  return { key: part.key, mid: part.mid, ways };
}

/** Measures rows of one depth: shortest length of a set of parts from one square end to the other, remembered by the set. */
export function createRowMeasure(depth: number, kerf: number): (parts: readonly RowPart[]) => number {
  const half = depth / 2;
  const known = new Map<string, number>();

  function measure(parts: readonly RowPart[]): number {
    const lengths = parts.reduce((sum, p) => sum + p.mid, 0);
    const angled = parts.filter((p) => p.ways[0]![0] !== 0 || p.ways[0]![1] !== 0);
    if (angled.length === 0) return lengths + kerf * Math.max(0, parts.length - 1);
    const key = JSON.stringify(angled.map((p) => p.key).sort());
    let gaps = known.get(key);
    if (gaps === undefined) {
      gaps = Math.min(
        ...angled.flatMap((p, i) => p.ways.map(([l, r]) => Math.abs(l) * half + rest(angled, 1 << i, r, new Map()))),
      );
      known.set(key, gaps);
    }
    // A square part fits at either end of the row for one kerf, and no row with it can be shorter.
    return lengths + gaps + kerf * (parts.length - angled.length);
  }

  function rest(parts: readonly RowPart[], laid: number, end: number, memo: Map<string, number>): number {
    if (laid === (1 << parts.length) - 1) return Math.abs(end) * half;
    const key = `${laid}/${end}`;
    const before = memo.get(key);
    if (before !== undefined) return before;
    let least = Infinity;
    parts.forEach((p, i) => {
      if (laid & (1 << i)) return;
      for (const [l, r] of p.ways)
        least = Math.min(least, gapBetween(end, l, half, kerf) + rest(parts, laid | (1 << i), r, memo));
    });
    memo.set(key, least);
    return least;
  }
  return measure;
}
