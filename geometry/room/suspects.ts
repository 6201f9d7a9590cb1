import { toDegrees } from '../core/angle';
import { adjustNetwork } from './adjust-network';
import type { Adjustment } from './adjust-network';
import { cornerName } from './room-frame';
import type { RoomObservation } from './room-observations';
import { freePoints } from './solve-room';
import type { SolvedRoom } from './solved-room';
import type { Suspect } from './types';

/** Two-sided normal critical value at 0.001, which Baarda's data snooping commonly uses. */
export const SNOOPING_LIMIT = 3.29;
/** Standardised residuals this close are the same: with one spare reading all are. */
const SAME = 1e-6;
/** Residuals that go together more than this point at either reading. */
const TOGETHER = 0.95;

export interface Suspicion {
  readonly suspects: readonly Suspect[];
  /** Name of an assumed corner that explains the disagreement, or null. */
  readonly checkCorner: string | null;
}

const NONE: Suspicion = { suspects: [], checkCorner: null };

/**
 * Looks for one wrong reading. Nothing is named unless the largest standardised residual among measured readings that
 * are not trusted is over 3.29; then every reading that cannot be told apart from it is named with it, and nothing
 * measured is accused while an assumed corner explains it as well.
 *
 * @see W. Baarda, A testing procedure for use in geodetic networks (1968), for the test
 */
export function findSuspects(solved: SolvedRoom): Suspicion {
  const { active, adjustment } = solved;
  const worst = worstReading(active, adjustment);
  if (worst < 0) return NONE;
  const group = active.flatMap((o, i) => (i === worst || isAlike(adjustment, worst, i) ? [{ o, i }] : []));
  const assumed = group.find(({ o }) => o.kind === 'assumed');
  if (assumed) {
    return { suspects: [], checkCorner: cornerName(solved.frame.corners[assumed.o.subject]!.between) };
  }
  const accused = group.filter(({ o }) => !o.trusted);
  const first = accused[0]!;
  const others = new Set(accused.map(({ o }) => o.name));
  others.delete(first.o.name);
  const suspect: Suspect = {
    observation: first.o.name,
    shouldRead: predictWithout(solved, first.i),
    standardised: adjustment.standardised[first.i]!,
    orElse: [...others],
  };
  return { suspects: [suspect], checkCorner: null };
}

/** Index of the reading over the limit by most, or -1. */
function worstReading(active: readonly RoomObservation[], { standardised }: Adjustment): number {
  let worst = -1;
  let size = SNOOPING_LIMIT;
  active.forEach((o, i) => {
    const w = Math.abs(standardised[i] ?? 0);
    if (o.kind === 'assumed' || o.trusted || w <= size) return;
    worst = i;
    size = w;
  });
  return worst;
}

function isAlike(adjustment: Adjustment, worst: number, other: number): boolean {
  const w = adjustment.standardised[other];
  if (w === null || w === undefined) return false;
  if (Math.abs(Math.abs(w) - Math.abs(adjustment.standardised[worst]!)) <= SAME) return true;
  // The sign only says whether the two readings are wrong the same way or opposite ways.
  return Math.abs(adjustment.residualCorrelation(worst, other)) > TOGETHER;
}

/** What the fit without the reading says it is; inches, degrees for a protractor reading. */
function predictWithout({ active, adjustment }: SolvedRoom, index: number): number {
  const { kind, observation } = active[index]!;
  const others = active.filter((_, i) => i !== index).map((o) => o.observation);
  const refit = adjustNetwork(freePoints(adjustment.points), others);
  const value =
    refit.kind === 'adjusted'
      ? refit.adjustment.predict(observation.quantity).value
      : observation.value + adjustment.residuals[index]! / adjustment.redundancies[index]!;
  return kind === 'angle' ? toDegrees(value) : value;
}
