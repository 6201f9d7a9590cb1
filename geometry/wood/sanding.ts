import type { Finish } from '../core/layout';
import { constant } from './sourced';

export const FIRST_GRIT = constant('First sanding grit', 100, '', 'common practice', '');
export const LAST_GRITS = [
  constant('Last sanding grit under a film', 180, '', 'common practice', ''),
  constant('Last sanding grit under oil', 220, '', 'common practice', ''),
] as const;
export const BETWEEN_GRIT = constant('Sanding grit between coats of oil', 320, '', 'common practice', '');

/** Grits in order, each used once over the whole top, along the grain, after cutting and glue-up. */
export function sandingGrits(finish: Finish): readonly number[] {
  const last = finish.kind === 'film' ? LAST_GRITS[0].value : LAST_GRITS[1].value;
  return [FIRST_GRIT.value, 120, 150, 180, 220].filter((grit) => grit <= last);
}

export const DISC_AREA = constant('Surface one 6 in sanding disc does with one grit', 10, 'sq ft', 'from memory', '');

/** Discs of one grit for a surface, square feet; never none. */
export const discsFor = (sqFt: number): number => Math.max(1, Math.ceil(sqFt / DISC_AREA.value - 1e-9));
