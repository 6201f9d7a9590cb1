import type { NestDefect } from '../types';
import { FIT } from '../model/tolerance';
import { endGap } from './kerf';

/** A stretch of a row: mid-depth length and end slopes as laid. */
export interface Stretch {
  readonly mid: number;
  readonly left: number;
  readonly right: number;
}

export interface Band {
  /** First usable x, and the last. */
  readonly from: number;
  readonly to: number;
  readonly depth: number;
}

/**
 * x at mid-depth of each stretch's start when all lie as far left as order, kerf and defects allow.
 *
 * @param gap - `endGap` for the shortest row, `roomyGap` for one with fewer cuts
 * @returns null when the last one does not end within the band
 */
export function rowPositions(
  stretches: readonly Stretch[],
  band: Band,
  kerf: number,
  defects: readonly NestDefect[] = [],
  gap: typeof endGap = endGap,
): number[] | null {
  const half = band.depth / 2;
  const starts: number[] = [];
  let end: number | null = null;
  let slope = 0;
  for (const s of stretches) {
    const least: number = end === null ? band.from + Math.abs(s.left) * half : end + gap(slope, s.left, half, kerf);
    const start = passDefects(least, s, half, defects);
    starts.push(start);
    end = start + s.mid;
    slope = s.right;
  }
  return end !== null && end + Math.abs(slope) * half > band.to + FIT ? null : starts;
}

/** The least start, not under `start`, at which the stretch is clear of every defect. */
function passDefects(start: number, s: Stretch, half: number, defects: readonly NestDefect[]): number {
  let at = start;
  for (let moved = true; moved;) {
    moved = false;
    for (const zone of defects) {
      const low = Math.max(zone.y, 0) - half;
      const high = Math.min(zone.y + zone.h, 2 * half) - half;
      if (high <= low) continue;
      const endsBefore = at + s.mid + Math.max(s.right * low, s.right * high) <= zone.x + FIT;
      const clear = zone.x + zone.w - Math.min(s.left * low, s.left * high);
      if (endsBefore || at >= clear - FIT) continue;
      at = clear;
      moved = true;
    }
  }
  return at;
}
