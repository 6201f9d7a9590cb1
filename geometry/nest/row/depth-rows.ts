import type { Problem } from '../model/problem';
import { isFullDepth, rowShape } from './item-shapes';
import { createRowGaps, type RowGaps, type RowShape } from './row-gaps';

/** Everything about rows of one depth: a slab's or a lane's. */
export interface DepthRows extends RowGaps {
  readonly depth: number;
  /** By item; null when the item is too deep for the row. */
  readonly shapes: readonly (RowShape | null)[];
  /** Items that fill the depth, and those that do not. */
  readonly full: readonly number[];
  readonly shallow: readonly number[];
  /** Length at mid-depth with all gaps, from one square end to the other. */
  length(items: readonly number[]): number;
}

/** Gives the rows of a depth, made once for each. */
export function createDepthRows(problem: Problem): (depth: number) => DepthRows {
  const made = new Map<number, DepthRows>();
  return (depth) => {
    let rows = made.get(depth);
    if (!rows) made.set(depth, (rows = makeRows(problem, depth)));
    return rows;
  };
}

function makeRows(problem: Problem, depth: number): DepthRows {
  const shapes = problem.items.map((item) => rowShape(item, depth));
  const gaps = createRowGaps(shapes, depth, problem.kerf);
  const held = problem.items.filter((item) => shapes[item.index]);
  return {
    ...gaps,
    depth,
    shapes,
    full: held.filter((i) => isFullDepth(i, depth)).map((i) => i.index),
    shallow: held.filter((i) => !isFullDepth(i, depth)).map((i) => i.index),
    length(items) {
      let sum = gaps.gap(items);
      for (const i of items) sum += shapes[i]!.mid;
      return sum;
    },
  };
}
