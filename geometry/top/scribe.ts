import type { Run } from '../core/layout';
import { standoffOf } from './run-lines';
import type { LaidRun } from './types';
import type { WallFrame } from './wall-frame';
import { inOrder, offsetAt } from '../room/profile';

/** One place behind a top, inches along the wall from its left end. */
export interface ScribeStation {
  readonly at: number;
  /** Wall to back edge as laid. */
  readonly gap: number;
  /** To take off the back edge, so that the top can move back by `shift`. */
  readonly takeOff: number;
}

/** What a bowed wall means for one run. Inches. */
export interface Scribe {
  readonly run: string;
  /** Wall line to back edge as laid, before scribing. */
  readonly standoff: number;
  /** In order along the wall; straight between them, so they are the scribe line of the template. */
  readonly stations: readonly ScribeStation[];
  readonly largestGap: number;
  /** The backsplash hides every gap as laid. */
  readonly covered: boolean;
  /** How far the scribed top moves back, so that no gap is wider than the backsplash covers. */
  readonly shift: number;
  readonly takeOff: number;
  /** Depth left at the deepest scribe. */
  readonly depthLeft: number;
}

/**
 * Gap behind a run at every station of its wall, and what to take off its back edge so that the gap nowhere exceeds what
 * the backsplash covers. Where the top is scribed the back gap itself stays free for the wood to move.
 *
 * @param backsplash - thickness of what covers the gap, inches; 0 = nothing does, and the gap is brought down to the back gap
 */
export function scribeRun(run: Run, laid: LaidRun, wall: WallFrame, backsplash: number): Scribe {
  const sign = run.side === 'back' ? -1 : 1;
  const standoff = standoffOf(run, wall);
  const profile = inOrder(wall.profile);
  const gapAt = (at: number) => standoff + sign * offsetAt(profile, at);
  const from = Math.max(0, laid.backFrom);
  const to = Math.min(wall.length, laid.backTo);
  const between = profile.map((station) => station.at).filter((at) => at > from && at < to);
  const ats = [from, ...new Set(between), to];
  const largestGap = Math.max(...ats.map(gapAt));
  const allowed = Math.max(backsplash, run.backGap);
  const shift = Math.max(0, largestGap - allowed);
  const excess = (at: number) => run.backGap - (gapAt(at) - shift);
  const stations = withKinks(ats, excess).map((at) => ({ at, gap: gapAt(at), takeOff: Math.max(0, excess(at)) }));
  const takeOff = Math.max(...stations.map((station) => station.takeOff));
  return {
    run: run.id,
    standoff,
    stations,
    largestGap,
    covered: largestGap <= backsplash,
    shift,
    takeOff,
    depthLeft: laid.depth - takeOff,
  };
}

/** Most that is taken off the back edge between two places along the wall, inches. */
export function takeOffBetween({ stations }: Scribe, from: number, to: number): number {
  const line = stations.map(({ at, takeOff }) => ({ at, off: takeOff }));
  const inside = stations.filter(({ at }) => at > from && at < to).map(({ takeOff }) => takeOff);
  return Math.max(offsetAt(line, from), ...inside, offsetAt(line, to));
}

/** The places, and those between two of them where a straight line passes through nothing. */
function withKinks(ats: readonly number[], value: (at: number) => number): readonly number[] {
  const all: number[] = [];
  ats.forEach((at, i) => {
    const before = ats[i - 1];
    if (before !== undefined) {
      const [a, b] = [value(before), value(at)];
      if ((a > 0 && b < 0) || (a < 0 && b > 0)) all.push(before + ((at - before) * a) / (a - b));
    }
    all.push(at);
  });
  return all;
}
