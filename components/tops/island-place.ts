import type { Layout } from '@/geometry/core/layout';
import type { Point } from '@/geometry/core/point';
import { add, rotate } from '@/geometry/core/vector';
import type { Plan } from '@/geometry/plan/types';
import type { EditDraft } from '@/shared/layout/apply-edit';

/**
 * Where an island stands, room axes: typed, or where it was laid beside the room. Null when it was not laid.
 *
 * @param plan - in room axes, not turned for drawing
 */
export function islandPlace(layout: Layout, plan: Plan, id: string): Point | null {
  const island = layout.islands.find((i) => i.id === id);
  if (!island) return null;
  if (island.at) return island.at;
  return plan.pieces.find((piece) => piece.on === id)?.origin ?? null;
}

/** To the sixteenth: an island stands where a tape says. */
const onTape = (inches: number): number => Math.round(inches * 16) / 16;

/**
 * The edit that moves an island.
 *
 * @param by - inches on the drawing, which is turned by `turn` against the room axes
 */
export function moveIsland(
  layout: Layout,
  plan: Plan,
  turn: number,
  id: string,
  by: Point,
): { readonly edit: EditDraft; readonly label: string } | null {
  const from = islandPlace(layout, plan, id);
  if (!from) return null;
  const [x, y] = add(from, rotate(by, -turn));
  return {
    edit: { kind: 'changeItem', section: 'islands', item: id, change: { at: [onTape(x), onTape(y)] } },
    label: `island ${id} moved`,
  };
}
