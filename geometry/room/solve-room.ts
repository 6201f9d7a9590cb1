import type { Point } from '../core/point';
import { cross, subtract } from '../core/vector';
import { adjustNetwork } from './adjust-network';
import type { Adjustment, NetworkResult } from './adjust-network';
import { checkSolved, contradiction, SUSPICIOUS } from './check-solved';
import { chiSquareQuantile } from './chi-square';
import type { NetworkObservation, NetworkPoint } from './network';
import { assumedReading, roomObservations } from './room-observations';
import type { RoomObservation } from './room-observations';
import { wallEnd } from './room-frame';
import type { FrameCorner, RoomFrame } from './room-frame';
import type { SolvedRoom } from './solved-room';
import type { ExpectedAngle } from './expected-angles';
import { startShapes } from './start-shapes';
import { undeterminedError } from './undetermined';
import type { RoomError, RoomInput } from './types';

export type SolveResult =
  { readonly ok: true; readonly solved: SolvedRoom } | { readonly ok: false; readonly error: RoomError };

/** A first start is taken at its word when chi2 is no worse than once in 1,000 honest rooms. */
const GOOD_ENOUGH = 0.999;
/** Chi2 of a room without spare readings is rounding only. */
const EXACT = 1e-6;
/** A corner nearer to straight than this may end up on either side, radians. */
const NEARLY_STRAIGHT = (25 * Math.PI) / 180;
/** A later start replaces an earlier one only if it is better by more than rounding. */
const BETTER = 1e-6;
/** So many times smaller, chi2 overrules which way a rough sketch has a corner turn. */
const MUCH_BETTER = 10;

/** Fits the room from the start that serves it best. */
export function solveRoom(input: RoomInput, frame: RoomFrame, expected: readonly ExpectedAngle[]): SolveResult {
  const all = roomObservations(input, frame);
  const ignored = all.filter((o) => o.ignored);
  const active = all.filter((o) => !o.ignored);
  const first = fitBest(input, frame, expected, active);
  if (first.kind !== 'open') return toResult(input, first, { frame, active, ignored });
  const reduced = withForgottenCorners(input, frame, active);
  if (reduced.length > active.length) {
    const second = fitBest(input, frame, expected, reduced);
    if (second.kind !== 'open') return toResult(input, second, { frame, active: reduced, ignored });
  }
  const unmet = first.flat && first.misfits.some((misfit) => Math.abs(misfit) > SUSPICIOUS);
  const error = unmet
    ? contradiction(active, first.misfits)
    : undeterminedError(input, frame, first.points, first.directions);
  return { ok: false, error };
}

/** Points to start from, in room axes: the first is the origin, the second lies on +x. */
export function freePoints(points: readonly Point[]): readonly NetworkPoint[] {
  return points.map((start, i) => ({ start, freeX: i > 0, freeY: i > 1 }));
}

/**
 * When ignoring a corner's only reading leaves the room loose, that corner is one that nobody measured: it is assumed
 * at its nominal angle like any other.
 */
function withForgottenCorners(
  input: RoomInput,
  frame: RoomFrame,
  active: readonly RoomObservation[],
): readonly RoomObservation[] {
  const kept = new Set(active.filter((o) => o.kind !== 'wall' && o.kind !== 'tie').map((o) => o.subject));
  const forgotten = frame.corners.flatMap((_, i) => (kept.has(i) ? [] : [i]));
  const assumed = forgotten.map((i) => ({ ...assumedReading(input, frame, i), ignored: false, trusted: false }));
  const at = active.findIndex((o) => o.kind === 'tie');
  return at < 0 ? [...active, ...assumed] : [...active.slice(0, at), ...assumed, ...active.slice(at)];
}

function fitBest(
  input: RoomInput,
  frame: RoomFrame,
  expected: readonly ExpectedAngle[],
  active: readonly RoomObservation[],
): NetworkResult {
  const observations: readonly NetworkObservation[] = active.map((o) => o.observation);
  let best: NetworkResult | null = null;
  let bestScore = HOPELESS;
  for (const shape of startShapes(input, frame, expected)) {
    const result = adjustNetwork(freePoints(shape()), observations);
    const score = scoreOf(result, frame, expected);
    if (best === null || isBetter(score, bestScore)) {
      best = result;
      bestScore = score;
    }
    if (score.wrong === 0 && score.doubtful === 0 && score.good) break;
  }
  return best!;
}

interface Score {
  /** Corners on the side that a reading or the drawing rules out. */
  readonly wrong: number;
  readonly good: boolean;
  /** Corners on the other side than a rough sketch has them. */
  readonly doubtful: number;
  readonly chi2: number;
}

const HOPELESS: Score = { wrong: Infinity, good: false, doubtful: Infinity, chi2: Infinity };

function scoreOf(result: NetworkResult, frame: RoomFrame, expected: readonly ExpectedAngle[]): Score {
  if (result.kind === 'diverged') return HOPELESS;
  if (result.kind === 'open') return { ...HOPELESS, chi2: 0 };
  const { points, chi2 } = result.adjustment;
  const turned = frame.corners.flatMap((corner, i) => (isTurned(points, frame, corner, expected[i]!) ? [i] : []));
  const wrong = turned.filter((i) => expected[i]!.firm).length;
  return { wrong, good: isGood(result.adjustment), doubtful: turned.length - wrong, chi2 };
}

function isTurned(points: readonly Point[], frame: RoomFrame, corner: FrameCorner, { said }: ExpectedAngle): boolean {
  if (Math.abs(said - Math.PI) < NEARLY_STRAIGHT) return false;
  const into = subtract(points[corner.point]!, points[corner.left]!);
  const out = subtract(points[wallEnd(frame, corner.right)]!, points[corner.point]!);
  return cross(into, out) < 0 !== said < Math.PI;
}

function isBetter(score: Score, than: Score): boolean {
  if (score.wrong !== than.wrong) return score.wrong < than.wrong;
  if (score.good !== than.good) return score.good;
  if (!score.good && score.chi2 * MUCH_BETTER < than.chi2) return true;
  if (!score.good && than.chi2 * MUCH_BETTER < score.chi2) return false;
  if (score.doubtful !== than.doubtful) return score.doubtful < than.doubtful;
  return score.chi2 < than.chi2 - BETTER * (1 + than.chi2) || (than.chi2 === Infinity && score.chi2 < Infinity);
}

function isGood({ chi2, dof }: Adjustment): boolean {
  return dof > 0 ? chi2 <= chiSquareQuantile(GOOD_ENOUGH, dof) : chi2 < EXACT;
}

function toResult(
  input: RoomInput,
  result: Exclude<NetworkResult, { kind: 'open' }>,
  solved: Omit<SolvedRoom, 'adjustment'>,
): SolveResult {
  if (result.kind === 'diverged') return { ok: false, error: contradiction(solved.active, result.misfits) };
  const room = { ...solved, adjustment: result.adjustment };
  const error = checkSolved(input, room);
  return error ? { ok: false, error } : { ok: true, solved: room };
}
