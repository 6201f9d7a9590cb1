import type { Problem } from '../model/problem';
import { patternItems, type Pattern } from '../plan/pattern';
import type { DepthRows } from '../row/depth-rows';
import { fillSlab } from './fill-slab';

/** Share of a slab that a fair plan fills: prices what a candidate slab leaves for later ones. */
const FAIR_FILL = 0.9;

/**
 * A plan at once: slab after slab, each time the one that with its fill promises the lowest total, filled with the
 * longest parts first.
 *
 * @param demand - copies of each item to cut
 * @param slabs - how many there are, by stock entry
 * @returns null when this way runs out of slabs
 */
export function greedy(
  problem: Problem,
  rowsAt: (depth: number) => DepthRows,
  demand: readonly number[],
  slabs: readonly number[],
): Pattern[] | null {
  const left = [...demand];
  const counts = [...slabs];
  const rate = Math.min(...problem.stock.map((s) => s.price / Math.max(1, s.usable * s.depth))) / FAIR_FILL;
  const order = problem.items.map((i) => i.index).sort((a, b) => byDepthThenLength(problem, a, b));
  const patterns: Pattern[] = [];
  while (left.some((n) => n > 0)) {
    let best: { score: number; pattern: Pattern } | null = null;
    for (const stock of problem.stock) {
      if (counts[stock.index]! <= 0) continue;
      const pattern = fillSlab(problem, rowsAt, stock, order, left);
      if (!pattern) continue;
      const covered = patternItems(pattern).reduce((sum, i) => sum + problem.items[i]!.area, 0);
      const score = stock.price - rate * covered;
      if (!best || score < best.score) best = { score, pattern };
    }
    if (!best) return null;
    counts[best.pattern.stock]!--;
    patternItems(best.pattern).forEach((i) => left[i]!--);
    patterns.push(best.pattern);
  }
  return patterns;
}

function byDepthThenLength(problem: Problem, a: number, b: number): number {
  const p = problem.items[a]!;
  const q = problem.items[b]!;
  return q.depth - p.depth || q.box - p.box || a - b;
}
