import { formatLength } from '@/geometry/tape/format-length';
import type { StockSlab } from '@/shared/contracts/stock';

/** Depth that plans may use: as measured, less what straightening the edge takes, inches. */
export const usableDepth = ({ depth, measuredDepth, straightening }: StockSlab): number =>
  (measuredDepth ?? depth) - (straightening ?? 0);

/** "25 × 96 in", "635 × 2445 mm" */
export function sizeWords({ depth, length }: Pick<StockSlab, 'depth' | 'length'>, metric: boolean): string {
  const plain = (inches: number) => formatLength(inches, metric ? '1 mm' : '1/16').replace(' mm', '');
  return `${plain(depth)} × ${plain(length)} ${metric ? 'mm' : 'in'}`;
}

export const facesWords = (faces: StockSlab['faces']): string => (faces === 'both' ? 'Both good' : 'One good');

/** "6 in", "none in", "as many as wanted" */
export function countWords(count: number | null): string {
  if (count === null) return 'as many as wanted';
  return count === 0 ? 'none left' : `${count} left`;
}

export const named = (species: string): string => `${species.charAt(0).toUpperCase()}${species.slice(1)}`;

/** Slabs by wood, in the order they come. */
export function byWood(slabs: readonly StockSlab[]): readonly (readonly [string, readonly StockSlab[]])[] {
  const woods = new Map<string, StockSlab[]>();
  for (const slab of slabs) woods.set(slab.species, [...(woods.get(slab.species) ?? []), slab]);
  return [...woods];
}
