import type { Problem } from '../model/problem';
import type { PricedRow } from '../pricing/priced-row';

export interface CoverGoal {
  /** Copies of each item to be cut. */
  readonly demand: readonly number[];
  /** Slabs to be used at most, by stock entry. */
  readonly slabs: readonly number[];
  /** By stock entry: price plus rent, the worth of a perfect pattern; and by how much all patterns may fall short of it. */
  readonly perfect: readonly number[];
  readonly slack: number;
}

export type Cover =
  | { readonly kind: 'found'; readonly rows: readonly PricedRow[] }
  /** No choice of rows covers the items within the slack. */
  | { readonly kind: 'none' }
  | { readonly kind: 'unknown' };

/** Rows looked at for one unit of work. */
const LOOKS_PER_UNIT = 32;

/** What to do when every item that must lie in a row lies in one: pack the rest beside them, or say why not. */
export type Finish = (
  rows: readonly PricedRow[],
  left: readonly number[],
  slabs: readonly number[],
) => 'packed' | 'impossible' | 'unknown';

/**
 * Chooses rows so that each item that can lie only in a row is cut exactly as often as asked, by branching on the item
 * with the fewest rows left.
 */
export function coverExactly(
  problem: Problem,
  rows: readonly PricedRow[],
  goal: CoverGoal,
  onlyInRows: readonly number[],
  finish: Finish,
  spend: (units: number) => boolean,
): Cover {
  const { perfect } = goal;
  const left = [...goal.demand];
  const slabs = [...goal.slabs];
  const counts = rows.map((row) => countItems(row.items));
  const rowsOf = problem.items.map((_, i) => rows.flatMap((__, r) => (counts[r]!.has(i) ? [r] : [])));
  const short = rows.map((row) => Math.max(0, perfect[row.stock.index]! - row.value));
  const chosen: PricedRow[] = [];
  let looks = 0;
  let out = false;
  let open = false;

  const fits = (r: number, slack: number): boolean => {
    if (short[r]! > slack || slabs[rows[r]!.stock.index]! <= 0) return false;
    for (const [i, n] of counts[r]!) if (left[i]! < n) return false;
    return true;
  };

  /** The item with the fewest rows left; an item whose rows outnumber the best so far is not looked at to the end. */
  function scarcest(slack: number): { item: number; options: number[] } | null {
    let best: { item: number; options: number[] } | null = null;
    for (const item of onlyInRows) {
      if (left[item]! <= 0) continue;
      const options: number[] = [];
      for (const r of rowsOf[item]!) {
        looks++;
        if (fits(r, slack)) options.push(r);
        if (best && options.length >= best.options.length) break;
      }
      if (!best || options.length < best.options.length) best = { item, options };
      if (options.length === 0) break;
    }
    return best;
  }

  /** Work is counted by rows looked at. */
  function isOver(): boolean {
    if (looks >= LOOKS_PER_UNIT * 64) {
      out ||= spend(looks / LOOKS_PER_UNIT);
      looks = 0;
    }
    return out;
  }

  function branch(slack: number): boolean {
    if (isOver()) {
      open = true;
      return false;
    }
    const next = scarcest(slack);
    if (!next) {
      const end = finish(chosen, left, slabs);
      if (end === 'unknown') open = true;
      out ||= spend(0);
      return end === 'packed';
    }
    for (const r of next.options) {
      const row = rows[r]!;
      for (const [i, n] of counts[r]!) left[i]! -= n;
      slabs[row.stock.index]!--;
      chosen.push(row);
      if (branch(slack - short[r]!)) return true;
      chosen.pop();
      slabs[row.stock.index]!++;
      for (const [i, n] of counts[r]!) left[i]! += n;
      if (out) return false;
    }
    return false;
  }

  if (branch(goal.slack)) return { kind: 'found', rows: [...chosen] };
  return { kind: open ? 'unknown' : 'none' };
}

function countItems(items: readonly number[]): Map<number, number> {
  const counts = new Map<number, number>();
  for (const i of items) counts.set(i, (counts.get(i) ?? 0) + 1);
  return counts;
}
