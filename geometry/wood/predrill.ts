import type { ScrewSettings } from '../core/settings';
import type { Fastener } from './fasteners';
import type { ScrewChoice } from './types';
import { speciesOf } from './species';
import { pilotHole } from './withdrawal';

/** One hole in the underside of a piece. x from its left end as seen from the room, y from its front edge, inches. */
export interface PilotHole {
  readonly letter: string;
  readonly x: number;
  readonly y: number;
  /** Null where the wood is soft enough to do without. */
  readonly diameter: number | null;
  readonly depth: number;
}

/**
 * Where the underside is drilled before the top is set: the fixed front line only. The screws behind it go through slots
 * and find their place when the top lies, so that a hole never holds what has to travel.
 *
 * @param species - key of the table; for a wood that is not in it the hole is that of a hard one
 */
export function predrillMap(
  fasteners: readonly Fastener[],
  screw: ScrewChoice,
  species: string,
  settings: Pick<ScrewSettings, 'shank'>,
): readonly PilotHole[] {
  const gravity = speciesOf(species)?.gravity12.value ?? 0.6;
  const diameter = pilotHole(gravity, settings.shank);
  return fasteners
    .filter((fastener) => fastener.row === 'front')
    .map(({ letter, x, y }) => ({ letter, x, y, diameter, depth: screw.bite }));
}
