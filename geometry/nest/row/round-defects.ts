import type { Problem, Stock } from '../model/problem';
import { stretchOf } from '../plan/cut-tree';
import type { Section, Slot } from '../plan/pattern';
import type { DepthRows } from './depth-rows';
import { usefulMoves } from './row-gaps';
import { rowPositions } from './row-positions';

/** Orders tried before the search for a place between defects gives up. */
const MOST_TRIES = 3000;

export type DefectFit =
  | { readonly kind: 'fits'; readonly slots: readonly Slot[] }
  | { readonly kind: 'does not fit' }
  | { readonly kind: 'unknown' };

/** Looks for an order and moves in which the items, and the section if there is one, lie clear of the slab's defects. */
export function fitRoundDefects(
  problem: Problem,
  stock: Stock,
  rows: DepthRows,
  items: readonly number[],
  section: Section | null,
): DefectFit {
  const band = { from: stock.trim, to: stock.trim + stock.usable, depth: stock.depth };
  const waiting = new Map<number, number>();
  for (const i of items) waiting.set(i, (waiting.get(i) ?? 0) + 1);
  let tries = 0;

  function place(slots: readonly Slot[], withSection: boolean): readonly Slot[] | null {
    if (slots.length === items.length + (section ? 1 : 0)) return slots;
    for (const next of [...waiting.entries()].flatMap(([item, n]) =>
      n > 0 ? usefulMoves(rows.shapes[item]!).map((move): Slot => ({ item, move })) : [],
    )) {
      const answer = attempt(slots, next, withSection);
      if (answer) return answer;
    }
    return section && !withSection ? attempt(slots, section, true) : null;
  }

  function attempt(slots: readonly Slot[], next: Slot, withSection: boolean): readonly Slot[] | null {
    if (++tries > MOST_TRIES) return null;
    const row = [...slots, next];
    const stretches = row.map((slot) => stretchOf(problem, slot, stock.depth));
    if (!rowPositions(stretches, band, problem.kerf, stock.slab.defects)) return null;
    if (!('item' in next)) return place(row, true);
    waiting.set(next.item, waiting.get(next.item)! - 1);
    const answer = place(row, withSection);
    waiting.set(next.item, waiting.get(next.item)! + 1);
    return answer;
  }

  const slots = place([], false);
  if (slots) return { kind: 'fits', slots };
  return { kind: tries > MOST_TRIES ? 'unknown' : 'does not fit' };
}
