import { endGap } from '../row/kerf';
import type { Item, Member } from './problem';
import type { PartShape } from './part-shape';
import { SAME_SIZE } from './tolerance';

export type PlainItem = Omit<Item, 'index'>;

/** One part as an item of its own. */
export function singleItem(part: number, shape: PartShape, turn: boolean, over: boolean): PlainItem {
  const { depth, start, mid, left, right, area, exact } = shape;
  return {
    depth,
    box: shape.length,
    start,
    mid,
    left,
    right,
    area,
    turn,
    over,
    exact,
    members: [{ part, shape, at: 0 }],
  };
}

/**
 * Parts of a group, left to right, as one item with the least gaps between neighbours. Parts of one depth meet along
 * their own slopes; where depths differ each takes its upright box, since it is ripped after it has been cut off square.
 */
export function groupItem(
  parts: readonly { readonly part: number; readonly shape: PartShape; readonly turn: boolean }[],
  kerf: number,
): PlainItem {
  const depth = Math.max(...parts.map((p) => p.shape.depth));
  const even = parts.every((p) => Math.abs(p.shape.depth - depth) <= SAME_SIZE);
  const members: Member[] = [];
  let at = 0;
  let end: number | null = null;
  for (const { part, shape } of parts) {
    const left = even ? shape.left : 0;
    if (end !== null) at += endGap(end, left, depth / 2, kerf);
    members.push({ part, shape, at: even ? at : at + shape.start });
    at += even ? shape.mid : shape.length;
    end = even ? shape.right : 0;
  }
  const left = even ? parts[0]!.shape.left : 0;
  const before = Math.abs(left) * (depth / 2);
  return {
    depth,
    box: before + at + Math.abs(end!) * (depth / 2),
    start: before,
    mid: at,
    left,
    right: end!,
    area: parts.reduce((sum, p) => sum + p.shape.area, 0),
    turn: parts.every((p) => p.turn),
    over: false,
    exact: even && parts.every((p) => p.shape.exact),
    members,
  };
}
