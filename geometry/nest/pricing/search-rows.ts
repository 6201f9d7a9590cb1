import type { Problem, Stock } from '../model/problem';
import { FIT } from '../model/tolerance';
import type { DepthRows } from '../row/depth-rows';
import { fitRoundDefects } from '../row/round-defects';
import type { RowSizes } from './row-sizes';
import type { RowTables } from './row-tables';
import type { SectionValues } from './section-values';

/** The full-depth items of a row, and what it may be worth with the best section beside them. */
export interface RowCandidate {
  readonly items: readonly number[];
  readonly value: number;
  /** Longest section that fits beside them. */
  readonly room: number;
}

export interface RowQuery {
  readonly value: readonly number[];
  /** Most copies of each item. */
  readonly demand: readonly number[];
  /** True when two items never belong to the same plan. */
  readonly conflict: (a: number, b: number) => boolean;
}

export interface RowLimits {
  /** Only rows worth more than this. */
  readonly above: number;
  /** At most so many, the best ones. */
  readonly keep: number;
  readonly nodes: number;
}

export interface RowSearch {
  /** Best first. */
  readonly found: readonly RowCandidate[];
  readonly nodes: number;
  /** False when the nodes did not suffice. */
  readonly complete: boolean;
}

/** All rows on a slab worth more than a limit, or the best of them, by depth-first search under the tables' bounds. */
export function searchRows(
  problem: Problem,
  stock: Stock,
  rows: DepthRows,
  sizes: RowSizes,
  sections: SectionValues,
  tables: RowTables,
  { value, demand, conflict }: RowQuery,
  { above, keep, nodes: nodeLimit }: RowLimits,
): RowSearch {
  const { usable } = stock;
  const { order } = tables;
  const hasDefects = (stock.slab.defects?.length ?? 0) > 0;
  const found: RowCandidate[] = [];
  const held: number[] = [];
  let nodes = 0;
  let least = above;

  const fits = (length: number): boolean =>
    length <= usable + FIT &&
    !(hasDefects && fitRoundDefects(problem, stock, rows, held, null).kind === 'does not fit');

  function clashes(item: number): boolean {
    for (const other of held) if (conflict(other, item)) return true;
    return false;
  }

  function offer(worth: number, room: number): void {
    if (worth + sections.most(room) <= least) return;
    const total = worth + sections.exact(room, least - worth);
    if (total <= least) return;
    const candidate = { items: [...held], value: total, room };
    if (keep === Infinity) {
      found.push(candidate);
      return;
    }
    const at = found.findIndex((f) => f.value < total);
    found.splice(at < 0 ? found.length : at, 0, candidate);
    if (found.length > keep) found.pop();
    if (found.length === keep) least = found[keep - 1]!.value;
  }

  function extend(j: number, worth: number, room: number, odd: boolean): void {
    if (++nodes > nodeLimit) return;
    for (let i = j; i < order.length; i++) {
      if (worth + tables.most(i, room, odd) <= least + 1e-9) return;
      const item = order[i]!;
      const size = sizes.size[item]!;
      const flips = sizes.odd[item]!;
      if (room - size < -FIT || clashes(item)) continue;
      // With this item the bound is its own worth and what the later ones can add.
      if (demand[item] === 1 && worth + value[item]! + tables.most(i + 1, room - size, odd !== flips) <= least + 1e-9)
        continue;
      const before = held.length;
      for (let n = 1; n <= demand[item]!; n++) {
        held.push(item);
        const length = rows.length(held);
        if (!fits(length)) break;
        const now = worth + n * value[item]!;
        offer(now, usable - length - problem.kerf);
        extend(i + 1, now, room - n * size, flips && n % 2 === 1 ? !odd : odd);
      }
      held.length = before;
    }
  }

  offer(0, usable);
  extend(0, 0, usable + FIT + sizes.ends, false);
  if (keep === Infinity) found.sort((a, b) => b.value - a.value);
  return { found, nodes, complete: nodes <= nodeLimit };
}
