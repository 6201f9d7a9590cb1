import { endGap } from './kerf';

/** One way an angled part may lie: its class, its move and its ends as laid. */
export interface LaidEnds {
  readonly move: number;
  readonly left: number;
  readonly right: number;
}

/** More angled parts than this in one row are not considered: the class of plans ends there. */
export const MOST_ANGLED = 12;

/** Finds the order of angled parts in a row with the least total gap. */
export interface OrderFinder {
  /** Least total of all gaps, ends of the row included, for parts of these classes; Infinity for more than `MOST_ANGLED`. */
  total(classes: readonly number[]): number;
  /** An order with that total: places in `classes` and the move of each. */
  order(classes: readonly number[]): { readonly place: number; readonly move: number }[];
}

/**
 * Dynamic programming over the sets of parts laid so far and the way the last one lies (Held and Karp's method for the
 * travelling salesman), on gaps worked out once for each pair of ways.
 *
 * @param classes - by class, the ways its parts may lie
 */
export function createOrderFinder(classes: readonly (readonly LaidEnds[])[], half: number, kerf: number): OrderFinder {
  const firstWay: number[] = [];
  const ways: LaidEnds[] = [];
  for (const list of classes) {
    firstWay.push(ways.length);
    ways.push(...list);
  }
  const count = ways.length;
  const gaps = new Float64Array(count * count);
  for (let a = 0; a < count; a++)
    for (let b = 0; b < count; b++) gaps[a * count + b] = endGap(ways[a]!.right, ways[b]!.left, half, kerf);
  let table = new Float64Array(0);
  let from = new Int32Array(0);

  /** Fills the table for these classes; entry (mask, way of the last part) counted as mask x 4n + 4 place + way. */
  function fill(list: readonly number[]): void {
    const n = list.length;
    const size = (1 << n) * n * 4;
    if (table.length < size) {
      table = new Float64Array(size);
      from = new Int32Array(size);
    }
    table.fill(Infinity, 0, size);
    for (let p = 0; p < n; p++)
      classes[list[p]!]!.forEach((way, w) => (table[(1 << p) * n * 4 + p * 4 + w] = Math.abs(way.left) * half));
    for (let mask = 1; mask < 1 << n; mask++)
      for (let p = 0; p < n; p++) {
        if (!(mask & (1 << p))) continue;
        const waysHere = classes[list[p]!]!.length;
        for (let w = 0; w < waysHere; w++) {
          const at = (mask * n + p) * 4 + w;
          if (table[at]! < Infinity) extend(list, mask, at, (firstWay[list[p]!]! + w) * count);
        }
      }
  }

  function extend(list: readonly number[], mask: number, at: number, gapRow: number): void {
    const n = list.length;
    const sum = table[at]!;
    for (let q = 0; q < n; q++) {
      if (mask & (1 << q)) continue;
      const way = firstWay[list[q]!]!;
      const waysThere = classes[list[q]!]!.length;
      const to = ((mask | (1 << q)) * n + q) * 4;
      for (let v = 0; v < waysThere; v++) {
        const total = sum + gaps[gapRow + way + v]!;
        if (total < table[to + v]! - 1e-12) {
          table[to + v] = total;
          from[to + v] = at;
        }
      }
    }
  }

  /** Entry of the best finished row. */
  function bestEnd(list: readonly number[]): { at: number; total: number } {
    const n = list.length;
    let best = { at: -1, total: Infinity };
    for (let p = 0; p < n; p++)
      classes[list[p]!]!.forEach((way, w) => {
        const at = (((1 << n) - 1) * n + p) * 4 + w;
        const total = table[at]! + Math.abs(way.right) * half;
        if (total < best.total - 1e-12) best = { at, total };
      });
    return best;
  }

  function total(list: readonly number[]): number {
    if (list.length > MOST_ANGLED) return Infinity;
    fill(list);
    return bestEnd(list).total;
  }

  function order(list: readonly number[]): { place: number; move: number }[] {
    fill(list);
    const n = list.length;
    const row: { place: number; move: number }[] = [];
    for (let at = bestEnd(list).at, k = 0; k < n; k++, at = from[at]!) {
      const place = (at >> 2) % n;
      row.unshift({ place, move: classes[list[place]!]![at & 3]!.move });
    }
    return row;
  }

  return { total, order };
}
