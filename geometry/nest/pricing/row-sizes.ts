import { endGap } from '../row/kerf';
import type { DepthRows } from '../row/depth-rows';
import { movedEnds, usefulMoves } from '../row/row-gaps';

/** Sizes that add up to no more than a row's true length: a row of items fits only if their sizes sum to at most the slab's usable length plus `ends`. */
export interface RowSizes {
  /** By item; 0 where the item cannot lie in this row. */
  readonly size: readonly number[];
  /** What the two ends of the row may give back, since no kerf is lost there. */
  readonly ends: number;
}

/**
 * Splits every gap between two ends into two halves that each end can never do without: half the least gap that its slope
 * can have with any end there is (a square one always counted, for a section may lie beside it).
 */
export function rowSizes(rows: DepthRows, items: readonly number[], kerf: number): RowSizes {
  const half = rows.depth / 2;
  const slopes = new Set<number>([0]);
  for (const i of items) {
    const shape = rows.shapes[i]!;
    for (const move of usefulMoves(shape)) movedEnds(shape, move).forEach((slope) => slopes.add(slope));
  }
  const share = (slope: number): number => {
    let least = Infinity;
    for (const other of slopes) least = Math.min(least, endGap(slope, other, half, kerf));
    return least / 2;
  };
  const shares = new Map([...slopes].map((slope) => [slope, share(slope)]));
  let back = Infinity;
  for (const [slope, s] of shares) back = Math.min(back, Math.abs(slope) * half - s);
  const size = rows.shapes.map(() => 0);
  for (const i of items) {
    const shape = rows.shapes[i]!;
    const ends = usefulMoves(shape).map((move) => movedEnds(shape, move));
    size[i] = shape.mid + Math.min(...ends.map(([left, right]) => shares.get(left)! + shares.get(right)!));
  }
  return { size, ends: -2 * back };
}
