import type { WorthRow } from './slab-worth';

export interface CoverQuestion {
  /** Rows by stock entry, each with how far it falls short of the entry's best. */
  readonly rows: readonly { readonly stock: number; readonly row: WorthRow; readonly short: number }[];
  readonly slabs: readonly number[];
  /** Copies of the parts that can lie in rows only. */
  readonly needs: ReadonlyMap<string, number>;
  /** By how much all rows may fall short together. */
  readonly slack: number;
}

const MOST_NODES = 500_000;

/** True when no choice of rows on these slabs takes in every part that must lie in a row; null when that is too large to tell. */
export function cannotCover({ rows, slabs, needs, slack }: CoverQuestion): boolean | null {
  const left = new Map(needs);
  const free = [...slabs];
  let nodes = 0;

  const usable = (r: (typeof rows)[number], spare: number): boolean => {
    if (r.short > spare || free[r.stock]! <= 0) return false;
    const used = new Map<string, number>();
    for (const key of r.row.keys) used.set(key, (used.get(key) ?? 0) + 1);
    return [...used].every(([key, n]) => !left.has(key) || left.get(key)! >= n);
  };

  const covers = (spare: number): boolean => {
    if (++nodes > MOST_NODES) return false;
    const open = [...left].filter(([, n]) => n > 0).map(([key]) => key);
    if (open.length === 0) return true;
    const choices = open.map((key) => rows.filter((r) => r.row.keys.includes(key) && usable(r, spare)));
    const fewest = choices.reduce((a, b) => (b.length < a.length ? b : a));
    for (const r of fewest) {
      const change = (by: number): void => {
        free[r.stock]! += by;
        for (const key of r.row.keys) if (left.has(key)) left.set(key, left.get(key)! + by);
      };
      change(-1);
      if (covers(spare - r.short)) return true;
      change(1);
    }
    return false;
  };

  const covered = covers(slack);
  if (nodes > MOST_NODES) return null;
  return !covered;
}
