import type { Box } from '../core/polygon';

/**
 * Pairs of boxes that overlap, by index, each once: a sweep from left to right, so cost grows with n log n and with the
 * pairs that stand over the same x.
 */
export function boxPairs(boxes: readonly Box[]): readonly (readonly [number, number])[] {
  const order = boxes.map((_, i) => i).sort((a, b) => boxes[a]!.minX - boxes[b]!.minX);
  const pairs: (readonly [number, number])[] = [];
  let open: number[] = [];
  for (const i of order) {
    const box = boxes[i]!;
    open = open.filter((j) => boxes[j]!.maxX > box.minX);
    for (const j of open) {
      const other = boxes[j]!;
      if (other.minY < box.maxY && box.minY < other.maxY) pairs.push(i < j ? [i, j] : [j, i]);
    }
    open.push(i);
  }
  return pairs;
}
