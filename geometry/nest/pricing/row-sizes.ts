import { endGap } from '../row/kerf';
import type { DepthRows } from '../row/depth-rows';
import { movedEnds, usefulMoves } from '../row/row-gaps';

/**
 * Sizes that add up to no more than a row's true length: a row of items fits only if their sizes sum to at most the slab's
 * usable length plus `ends`; less `oddCost` when an odd number of its ends is steep, since then a steep end lies beside a flat one.
 */
export interface RowSizes {
  /** By item; 0 where the item cannot lie in this row. */
  readonly size: readonly number[];
  /** By item: exactly one of its ends is steep. */
  readonly odd: readonly boolean[];
  readonly oddCost: number;
  /** What the two ends of the row may give back, since no kerf is lost there. */
  readonly ends: number;
}

/** An end is steep when it leans at least this share of the steepest one. */
const STEEP = 0.5;

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
  const all = [...slopes];
  const shares = new Map(all.map((s) => [s, Math.min(...all.map((other) => endGap(s, other, half, kerf))) / 2]));
  const back = Math.min(...all.map((s) => Math.abs(s) * half - shares.get(s)!));
  const steepest = Math.max(...all.map(Math.abs));
  const isSteep = (slope: number): boolean => steepest > 0 && Math.abs(slope) >= STEEP * steepest;
  const flat = all.filter((s) => !isSteep(s));
  const oddCosts = all
    .filter(isSteep)
    .flatMap((s) => [
      Math.abs(s) * half - shares.get(s)! - back,
      ...flat.map((other) => endGap(s, other, half, kerf) - shares.get(s)! - shares.get(other)!),
    ]);
  const size = rows.shapes.map(() => 0);
  const odd = rows.shapes.map(() => false);
  for (const i of items) {
    const shape = rows.shapes[i]!;
    const ends = usefulMoves(shape).map((move) => movedEnds(shape, move));
    size[i] = shape.mid + Math.min(...ends.map(([left, right]) => shares.get(left)! + shares.get(right)!));
    odd[i] = isSteep(shape.left) !== isSteep(shape.right);
  }
  return { size, odd, oddCost: oddCosts.length > 0 ? Math.max(0, Math.min(...oddCosts)) : 0, ends: -2 * back };
}
