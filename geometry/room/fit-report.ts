import { formatLength, roundLength } from '../tape/format-length';
import type { DisplayStep } from '../tape/format-length';
import type { ReadingFit, RoomFit } from './types';

/** What the fit says to the person holding the tape. */
export interface FitReport {
  /** `retake` is the only kind that names a reading. */
  readonly kind: 'closes' | 'unchecked' | 'loose' | 'retake' | 'unclear' | 'corner';
  readonly title: string;
  readonly body: string;
  /** The reading to take again, or the corner to check. */
  readonly observation: string | null;
}

/** A fit in plain words; lengths rounded to the step. */
export function fitReport(fit: RoomFit, step: DisplayStep): FitReport {
  const readings = measuredReadings(fit);
  const [suspect] = fit.suspects;
  if (fit.checkCorner !== null) return cornerReport(fit.checkCorner);
  if (suspect && suspect.orElse.length === 0) return retakeReport(fit, step, readings.length);
  if (suspect) {
    const title = `Something is off by about ${offBy(fit, step)}.`;
    return { kind: 'unclear', title, body: 'Tape a cross to find out which.', observation: null };
  }
  const count = `${readings.length} ${readings.length === 1 ? 'reading' : 'readings'}`;
  if (fit.dof === 0) {
    const body = `${count}, none to spare. A slip of the tape cannot be noticed yet.`;
    return { kind: 'unchecked', title: 'Drawn as taped', body, observation: null };
  }
  const spare = `${count}, ${fit.dof} spare.`;
  if (fit.chi2Limit !== null && fit.chi2 > fit.chi2Limit) {
    const body = `${spare} They agree less well than the tape allows, and none stands out. Take another reading.`;
    return { kind: 'loose', title: 'The readings hardly agree', body, observation: null };
  }
  return {
    kind: 'closes',
    title: `Closes within ${within(fit, step)}`,
    body: `${spare} ${closing(fit)}`,
    observation: null,
  };
}

function cornerReport(corner: string): FitReport {
  const body = 'It is only assumed, and the tape says otherwise. Check it with a triangle.';
  return { kind: 'corner', title: `Check ${corner}.`, body, observation: corner };
}

function retakeReport(fit: RoomFit, step: DisplayStep, count: number): FitReport {
  const { observation, shouldRead } = fit.suspects[0]!;
  const reading = isProtractor(fit, observation)
    ? `${shouldRead.toFixed(1)} degrees`
    : withUnit(formatLength(shouldRead, step), step);
  const others = count - 1 === 1 ? 'The other reading agrees.' : `The other ${count - 1} readings agree.`;
  return {
    kind: 'retake',
    title: `Re-take ${observation}. Off by about ${offBy(fit, step)}.`,
    body: `It should read about ${reading}. ${others}`,
    observation,
  };
}

function closing(fit: RoomFit): string {
  const assumed = fit.corners.filter((c) => !c.measured).length;
  if (assumed === 0) return 'You can lay tops.';
  return assumed === 1 ? 'One corner is only assumed.' : `${assumed} corners are only assumed.`;
}

/** Largest residual of a tape reading, up to the next step. */
function within(fit: RoomFit, step: DisplayStep): string {
  const tapes = [
    ...fit.walls.flatMap((w) => w.readings),
    ...fit.ties,
    ...fit.corners.filter((c) => c.kind === 'triangle'),
  ];
  const largest = Math.max(0, ...tapes.filter(isInFit).map((r) => Math.abs(r.residual)));
  const one = step.endsWith('mm') ? Number.parseFloat(step) / 25.4 : 1 / Number(step.slice(2));
  return withUnit(formatLength(Math.max(one, Math.ceil(largest / one - 1e-9) * one), step), step);
}

function offBy(fit: RoomFit, step: DisplayStep): string {
  const { observation, shouldRead } = fit.suspects[0]!;
  const taped = tapedOf(fit, observation);
  const off = Math.abs(shouldRead - taped);
  return isProtractor(fit, observation)
    ? `${off.toFixed(1)} degrees`
    : withUnit(formatLength(roundLength(off, step), step), step);
}

/** The reading of that name that fits worst. */
function tapedOf(fit: RoomFit, observation: string): number {
  const wall = fit.walls.find((w) => `wall ${w.id}` === observation);
  const corner = fit.corners.find((c) => `corner ${c.between.join('-')}` === observation);
  const tie = fit.ties.find((t) => `tie ${t.id}` === observation);
  return wall?.taped ?? corner?.taped ?? tie!.taped;
}

function isProtractor(fit: RoomFit, observation: string): boolean {
  return fit.corners.some((c) => c.kind === 'angle' && `corner ${c.between.join('-')}` === observation);
}

const withUnit = (text: string, step: DisplayStep): string => (step.endsWith('mm') ? text : `${text} in`);

const isInFit = ({ redundancy }: ReadingFit | { redundancy: number | null }): boolean => redundancy !== null;

function measuredReadings(fit: RoomFit): readonly unknown[] {
  const corners = fit.corners.flatMap((c) => c.readings);
  return [...fit.walls.flatMap((w) => w.readings), ...corners, ...fit.ties].filter(isInFit);
}
