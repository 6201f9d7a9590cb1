import type { Fixing } from '../core/layout';
import type { ScrewSettings } from '../core/settings';
import type { ScrewChoice } from './types';

/** Why no stock screw can be used. */
export interface NoScrew {
  readonly problem: 'shortest too long' | 'longest too short';
  /** Stock length nearest to being right, inches; 0 when the stock list is empty. */
  readonly length: number;
  readonly bite: number;
  readonly left: number;
}

const fit = (length: number, rail: number, thickness: number): ScrewChoice => ({
  length,
  bite: length - rail,
  left: rail + thickness - length,
});

/**
 * Longest stock screw that leaves enough wood above its point, or why there is none.
 *
 * @param rail - thickness the screw passes before it bites, inches; `thickness` - of the top
 */
export function screwFor(rail: number, thickness: number, settings: ScrewSettings): ScrewChoice | NoScrew {
  const stock = [...settings.lengths].sort((a, b) => a - b).map((length) => fit(length, rail, thickness));
  const safe = stock.filter((screw) => screw.left >= settings.leftAbove);
  const best = safe[safe.length - 1];
  if (best && best.bite > 0) return best;
  const nearest = best ?? stock[0] ?? fit(0, rail, thickness);
  return { problem: best ? 'longest too short' : 'shortest too long', ...nearest };
}

/**
 * The screw for a layout's rail: longest stock length that leaves the shop's least wood above the point (3/8 in).
 *
 * @returns lengths in inches; null when no stock length both bites and leaves enough
 */
export function chooseScrew(
  fixing: Pick<Fixing, 'rail'>,
  thickness: number,
  settings: { readonly screws: ScrewSettings },
): ScrewChoice | null {
  const screw = screwFor(fixing.rail, thickness, settings.screws);
  return 'problem' in screw ? null : screw;
}
