import { listNames } from './check-paths';
import { wallQuantity } from './room-frame';
import type { RoomObservation } from './room-observations';
import type { SolvedRoom } from './solved-room';
import type { RoomError, RoomInput } from './types';
import { isUnread, looseWalls } from './undetermined';

/** Chi2 of a room without spare readings is rounding, or else there is no room that meets them. */
const EXACT = 1e-4;
/** Misfit from which a reading counts as contradicted, standard deviations. */
export const SUSPICIOUS = 3.29;
/** Most readings a contradiction names. */
const MOST_NAMES = 4;

/**
 * What an adjustment cannot tell by itself: readings that no room meets although none is to spare, and walls nobody
 * taped whose length the others hardly hold. Null when the fit stands.
 */
export function checkSolved(input: RoomInput, { frame, active, adjustment }: SolvedRoom): RoomError | null {
  const unread = input.walls.flatMap((_, i) => (isUnread(input, i) ? [i] : []));
  const misfits = active.map((o, i) => adjustment.residuals[i]! / o.observation.sd);
  const unmet = adjustment.dof === 0 && adjustment.chi2 > EXACT;
  if (unmet && (unread.length === 0 || misfits.some((m) => Math.abs(m) > SUSPICIOUS))) {
    return contradiction(active, misfits);
  }
  const loose = unread.filter((i) => {
    const { value, variance } = adjustment.predict(wallQuantity(frame, i));
    return Math.sqrt(variance) > value;
  });
  if (loose.length > 0) return looseWalls(input, frame, loose);
  return unmet ? looseWalls(input, frame, unread) : null;
}

/**
 * Names the readings that miss by most.
 *
 * @param misfits - residuals in standard deviations
 */
export function contradiction(active: readonly RoomObservation[], misfits: readonly number[]): RoomError {
  const worst = active
    .map((o, i) => ({ o, size: Math.abs(misfits[i]!) }))
    .filter(({ size }) => !(size <= SUSPICIOUS))
    .sort((a, b) => b.size - a.size)
    .slice(0, MOST_NAMES)
    .map(({ o }) => o);
  const blamed = worst.length > 0 ? worst : active;
  const names = [...new Set(blamed.map((o) => o.name))];
  return {
    code: 'contradictory',
    message: `No room fits these readings together: ${listNames(names)}. Take them again.`,
    path: blamed[0]!.path,
  };
}
