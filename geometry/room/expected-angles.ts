import { DEGREE } from '../core/angle';
import type { Point } from '../core/point';
import { cornerInput, DEFAULT_NOMINAL_DEG, wallEnd } from './room-frame';
import type { FrameCorner, RoomFrame } from './room-frame';
import type { RoomInput } from './types';

/** What is known of a corner before the fit. */
export interface ExpectedAngle {
  /** Interior angle said or drawn, radians. */
  readonly said: number;
  /** Interior angle by its own reading, on the side of `said`; the same as `said` without one. */
  readonly measured: number;
  /** False when only a sketch says on which side of straight it lies. */
  readonly firm: boolean;
}

/** How far the corners of a ring may add up wrong before a sketched corner is taken for its mirror image, radians. */
const WRONG_SUM = 60 * DEGREE;

/**
 * Every corner's angle before the fit: its protractor reading, else the nominal angle when one was given, else that of
 * the sketch when a triangle was taped, else square. A tape triangle cannot tell an inside from an outside corner; when
 * only a rough sketch can, the sum of the angles of a ring corrects one that was drawn on the wrong side.
 */
export function expectedAngles(input: RoomInput, frame: RoomFrame): readonly ExpectedAngle[] {
  const angles = frame.corners.map((corner) => expectedAngle(input, frame, corner));
  const needed = (angles.length - 2) * Math.PI;
  const excess = angles.reduce((sum, a) => sum + a.measured, 0) - needed;
  if (!frame.closed || Math.abs(excess) <= WRONG_SUM) return angles;
  const missAfter = angles.map((a) => (a.firm ? Infinity : Math.abs(excess + 2 * Math.PI - 2 * a.measured)));
  const best = Math.min(...missAfter);
  if (best > WRONG_SUM / 2) return angles;
  return angles.map((a, i) => (missAfter[i] === best ? mirrored(a) : a));
}

/** The same corner on the other side of straight. */
export function mirrored({ said, measured, firm }: ExpectedAngle): ExpectedAngle {
  return { said: 2 * Math.PI - said, measured: 2 * Math.PI - measured, firm };
}

function expectedAngle(input: RoomInput, frame: RoomFrame, corner: FrameCorner): ExpectedAngle {
  const listed = cornerInput(input, corner);
  if (listed?.angleDeg !== undefined) {
    return { said: listed.angleDeg * DEGREE, measured: listed.angleDeg * DEGREE, firm: true };
  }
  const sketched = listed?.triangle && listed.nominalDeg === undefined && input.sketch;
  const said = sketched ? sketchAngle(sketched, frame, corner) : (listed?.nominalDeg ?? DEFAULT_NOMINAL_DEG) * DEGREE;
  if (!listed?.triangle) return { said, measured: said, firm: true };
  const { a, b, c } = listed.triangle;
  const cosine = (a * a + b * b - c * c) / (2 * a * b);
  const inside = Math.acos(Math.min(1, Math.max(-1, cosine)));
  return { said, measured: said > Math.PI ? 2 * Math.PI - inside : inside, firm: !sketched };
}

function sketchAngle(sketch: readonly Point[], frame: RoomFrame, corner: FrameCorner): number {
  const [x, y] = sketch[corner.point]!;
  const [bx, by] = sketch[corner.left]!;
  const [fx, fy] = sketch[wallEnd(frame, corner.right)]!;
  const angle = Math.atan2(fy - y, fx - x) - Math.atan2(by - y, bx - x);
  return angle < 0 ? angle + 2 * Math.PI : angle;
}
