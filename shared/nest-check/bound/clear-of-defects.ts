import type { NestSlab } from '@/geometry/nest/types';
import { gapBetween } from './bound-parts';
import { CLASS_FIT, type RowPart } from './row-length';

/** More parts than this on one slab with defects are taken to fit: the bound then only gets lower. */
const MOST_PARTS = 6;

/** Whether some order of full-depth parts lies clear of a slab's defects, each part as far left as it can go. */
export function clearOfDefects(parts: readonly RowPart[], slab: NestSlab, trim: number, kerf: number): boolean {
  const zones = (slab.defects ?? []).filter((z) => z.y < slab.depth && z.y + z.h > 0);
  if (zones.length === 0 || parts.length > MOST_PARTS) return true;
  const half = slab.depth / 2;

  /** First start at or after `least` at which a part of these ends touches no zone. */
  const firstClear = (least: number, mid: number, left: number, right: number): number => {
    let start = least;
    for (let again = true; again;) {
      again = false;
      for (const z of zones) {
        const ys = [Math.max(z.y, 0) - half, Math.min(z.y + z.h, slab.depth) - half];
        const passes = Math.max(...ys.map((y) => start + mid + right * y)) <= z.x + CLASS_FIT;
        const follows = Math.min(...ys.map((y) => start + left * y)) >= z.x + z.w - CLASS_FIT;
        if (passes || follows) continue;
        start = z.x + z.w - Math.min(...ys.map((y) => left * y));
        again = true;
      }
    }
    return start;
  };

  const lay = (left: readonly RowPart[], end: number | null, slope: number): boolean => {
    if (left.length === 0) return end === null || end + Math.abs(slope) * half <= slab.length - trim + CLASS_FIT;
    return left.some((part, i) =>
      part.ways.some(([l, r]) => {
        const least = end === null ? trim + Math.abs(l) * half : end + gapBetween(slope, l, half, kerf);
        const start = firstClear(least, part.mid, l, r);
        if (start + part.mid > slab.length) return false;
        return lay([...left.slice(0, i), ...left.slice(i + 1)], start + part.mid, r);
      }),
    );
  };
  return lay(parts, null, 0);
}
