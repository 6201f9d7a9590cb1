import { toDegrees } from '../core/angle';
import type { Prediction } from './network-statistics';
import type { NetworkQuantity } from './network';
import { inWords } from './relabel-room';
import { angleQuantity, cornerInput, networkMark, triangleQuantity, wallQuantity } from './room-frame';
import type { RoomFrame } from './room-frame';
import { tapeSdOf } from './room-observations';
import type { SolvedRoom } from './solved-room';
import type { NextMeasurement, RoomInput, WallMark } from './types';

/** Marks of a suggested triangle, inches from the corner on its left-hand and right-hand wall: 3-4-5 in feet. */
const LEFT_MARK = 36;
const RIGHT_MARK = 48;
/** Least share by which a reading has to tighten the worst corner to be worth taking. */
const WORTHWHILE = 0.01;
/** Two readings whose worth differs by less than this share are worth the same, and the first found is named. */
const SAME_WORTH = 1e-9;

type Candidate =
  | { readonly kind: 'triangle'; readonly corner: number; readonly a: number; readonly b: number }
  | { readonly kind: 'tie'; readonly from: number; readonly to: number };

/**
 * Of the corner triangles and diagonals not taken yet, the one that lowers the worst corner's standard deviation most,
 * by covariance alone. Null when nothing improves it by 1 %.
 */
export function nextMeasurement(input: RoomInput, solved: SolvedRoom): NextMeasurement | null {
  const { frame, adjustment } = solved;
  if (frame.corners.length === 0) return null;
  const angles = frame.corners.map((corner) => adjustment.predict(angleQuantity(frame, corner)));
  const now = Math.sqrt(Math.max(...angles.map((a) => a.variance)));
  let best: Candidate | null = null;
  let then = now;
  for (const candidate of candidates(input, solved)) {
    const reading = adjustment.predict(quantityOf(frame, candidate));
    const sd = tapeSdOf(input.tapeSd, reading.value);
    const worst = worstAfter(solved, angles, reading, sd);
    if (worst >= then * (1 - SAME_WORTH)) continue;
    best = candidate;
    then = worst;
  }
  if (!best || now - then < WORTHWHILE * now) return null;
  const loosest = angles.findIndex((a) => Math.sqrt(a.variance) === now);
  const figures = { worstCornerSdNowDeg: toDegrees(now), worstCornerSdThenDeg: toDegrees(then) };
  return describe(frame, best, { ...figures, why: reason(inWords(frame, input.labels), best, loosest, figures) });
}

/** Standard deviation of the worst corner once a reading of this quantity is in the fit, radians. */
function worstAfter(
  { adjustment }: SolvedRoom,
  angles: readonly Prediction[],
  reading: Prediction,
  sd: number,
): number {
  const spread = sd * sd + reading.variance;
  let worst = 0;
  for (const angle of angles) {
    const shared = adjustment.covarianceOf(angle, reading);
    worst = Math.max(worst, angle.variance - (shared * shared) / spread);
  }
  return Math.sqrt(Math.max(0, worst));
}

function candidates(input: RoomInput, solved: SolvedRoom): readonly Candidate[] {
  const { frame, adjustment } = solved;
  const wholeInches = (wall: number): number => Math.floor(adjustment.predict(wallQuantity(frame, wall)).value);
  const found: Candidate[] = [];
  frame.corners.forEach((corner, i) => {
    if (cornerInput(input, corner)?.triangle) return;
    const a = Math.min(LEFT_MARK, wholeInches(corner.left));
    const b = Math.min(RIGHT_MARK, wholeInches(corner.right));
    if (a > 0 && b > 0) found.push({ kind: 'triangle', corner: i, a, b });
  });
  const taken = new Set(input.ties.map((tie) => placesKey(frame, tie.from, tie.to)));
  for (let from = 0; from < frame.pointCount; from++) {
    for (let to = from + 2; to < frame.pointCount; to++) {
      const neighbours = frame.closed && from === 0 && to === frame.pointCount - 1;
      if (!neighbours && !taken.has(`${from}-${to}`)) found.push({ kind: 'tie', from, to });
    }
  }
  return found;
}

/** Lower and higher point of a tie between two corners; something else when a mark lies within a wall. */
function placesKey(frame: RoomFrame, from: WallMark, to: WallMark): string {
  const a = networkMark(frame, from);
  const b = networkMark(frame, to);
  if (a.toward !== undefined || b.toward !== undefined) return 'within a wall';
  return `${Math.min(a.point, b.point)}-${Math.max(a.point, b.point)}`;
}

function quantityOf(frame: RoomFrame, candidate: Candidate): NetworkQuantity {
  if (candidate.kind === 'triangle') {
    return triangleQuantity(frame, frame.corners[candidate.corner]!, candidate.a, candidate.b);
  }
  return { kind: 'distance', from: { point: candidate.from }, to: { point: candidate.to } };
}

/** A room corner as a wall mark: the right-hand end of the wall before it, for the very first the left-hand end. */
function markOf(frame: RoomFrame, point: number): WallMark {
  if (point === 0) return { wall: frame.wallIds[0]!, at: 0 };
  return { wall: frame.wallIds[point - 1]!, at: 'end' };
}

type Common = Pick<NextMeasurement, 'worstCornerSdNowDeg' | 'worstCornerSdThenDeg' | 'why'>;

function describe(frame: RoomFrame, candidate: Candidate, common: Common): NextMeasurement {
  if (candidate.kind === 'tie') {
    return { kind: 'tie', from: markOf(frame, candidate.from), to: markOf(frame, candidate.to), ...common };
  }
  const { between } = frame.corners[candidate.corner]!;
  return { kind: 'triangle', between, a: candidate.a, b: candidate.b, ...common };
}

function reason(frame: RoomFrame, candidate: Candidate, loosest: number, figures: Omit<Common, 'why'>): string {
  const { worstCornerSdNowDeg: now, worstCornerSdThenDeg: then } = figures;
  const corner = frame.corners[loosest]!.between.join('-');
  const gain = `Corner ${corner} is the loosest, within ${degrees(now)}; with it no corner is looser than ${degrees(then)}.`;
  if (candidate.kind === 'tie') {
    return `Tape from ${placeName(frame, candidate.from)} to ${placeName(frame, candidate.to)}. ${gain}`;
  }
  const { between } = frame.corners[candidate.corner]!;
  const marks = `mark ${candidate.a} in on wall ${between[0]} and ${candidate.b} in on wall ${between[1]}`;
  return `Check corner ${between.join('-')}: ${marks}, tape between the marks. ${gain}`;
}

const degrees = (value: number): string => `${value.toPrecision(2)} degrees`;

function placeName(frame: RoomFrame, point: number): string {
  const corner = frame.corners.find((c) => c.point === point);
  if (corner) return `corner ${corner.between.join('-')}`;
  return point === 0 ? `the left end of wall ${frame.wallIds[0]}` : `the right end of wall ${frame.wallIds[point - 1]}`;
}
