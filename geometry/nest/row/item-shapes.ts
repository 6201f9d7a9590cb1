import type { Item } from '../model/problem';
import { FIT } from '../model/tolerance';
import type { RowShape } from './row-gaps';

/** An item in a row of its own depth is its trapezoid; in a deeper row it is its upright box, ripped afterwards. */
export const isFullDepth = (item: Item, depth: number): boolean => Math.abs(item.depth - depth) <= FIT;

/** The item as a row of this depth sees it, or null when it is too deep. */
export function rowShape(item: Item, depth: number): RowShape | null {
  if (item.depth > depth + FIT) return null;
  const { mid, left, right, turn, over } = item;
  return isFullDepth(item, depth) ? { mid, left, right, turn, over } : { mid: item.box, left: 0, right: 0, turn, over };
}
