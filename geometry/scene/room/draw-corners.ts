import type { Corner } from '../../core/layout';
import type { Point } from '../../core/point';
import { add, scale, unit } from '../../core/vector';
import type { CornerFit } from '../../room/types';
import type { WallFrame } from '../../top/wall-frame';
import type { DrawItem } from '../display-list';
import { outward, WALL_THICKNESS } from './wall-bodies';

/** Within this of what was drawn a corner counts as true, degrees. */
const TRUE_WITHIN = 0.1;
/** px from the corner of the wall's body to the middle of the badge, sideways and up. */
const BADGE_OFF: Point = [52, 36];

/** The tag of a corner, outside the room: its angle, and how far it is open or tight. */
export function drawCorner(
  left: WallFrame,
  right: WallFrame,
  fit: CornerFit,
  drawn: Corner | undefined,
  retake: boolean,
): DrawItem {
  const out = unit([0, 0], add(outward(left), outward(right))) ?? outward(left);
  const reach = WALL_THICKNESS * Math.SQRT2;
  return {
    layer: 'readings',
    id: `corner ${left.id}-${right.id}`,
    kind: 'badge',
    at: add(left.end, scale(out, reach)),
    shift: [out[0] * BADGE_OFF[0], out[1] * BADGE_OFF[1]],
    ...badgeWords(fit, drawn?.nominal ?? 90, retake),
  };
}

function badgeWords(
  fit: CornerFit,
  nominal: number,
  retake: boolean,
): { readonly angleDeg: number | null; readonly word: string; readonly state: 'set' | 'unchecked' | 'retake' } {
  if (retake)
    return { angleDeg: fit.measured ? fit.angleDeg : null, word: fit.measured ? 're-take' : 'check', state: 'retake' };
  if (!fit.measured) return { angleDeg: null, word: 'check', state: 'unchecked' };
  return { angleDeg: fit.angleDeg, word: cornerWord(fit.angleDeg, nominal), state: 'set' };
}

/** "open 0.9", "tight 1.3", "square"; "true" where 90 was not what was drawn. */
export function cornerWord(angleDeg: number, nominal: number): string {
  const off = Math.round((angleDeg - nominal) * 10) / 10;
  if (Math.abs(off) <= TRUE_WITHIN) return nominal === 90 || nominal === 270 ? 'square' : 'true';
  return `${off > 0 ? 'open' : 'tight'} ${Math.abs(off).toFixed(1)}`;
}
