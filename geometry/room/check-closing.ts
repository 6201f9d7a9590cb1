import { toDegrees } from '../core/angle';
import type { ExpectedAngle } from './expected-angles';
import { cornerInput, cornerName } from './room-frame';
import type { RoomFrame } from './room-frame';
import type { RoomError, RoomInput } from './types';

/**
 * How far the corners of a ring may add up wrong, degrees. More than any protractor or triangle misses by, less than the
 * 90 that a bay taken for its mirror image makes; smaller misses go through the fit, which names them.
 */
const WORST_SUM_DEG = 60;

/**
 * Whether the corners of a closed ring add up to (n - 2) x 180 degrees, at least roughly. When they do not, the error
 * names the corner that is most likely on the wrong side, or else the one furthest from its drawing.
 */
export function checkClosing(input: RoomInput, frame: RoomFrame, expected: readonly ExpectedAngle[]): RoomError | null {
  if (!frame.closed) return null;
  const angles = expected.map((e) => toDegrees(e.measured));
  const needed = (frame.corners.length - 2) * 180;
  const sum = angles.reduce((a, b) => a + b, 0);
  if (Math.abs(sum - needed) <= WORST_SUM_DEG) return null;
  const flipped = angles.map((angle) => Math.abs(sum - angle + (360 - angle) - needed));
  const best = Math.min(...flipped);
  const sums = `The corners add up to ${Math.round(sum)} degrees, ${frame.corners.length} walls that close need ${needed}.`;
  if (best < WORST_SUM_DEG / 2) {
    const i = flipped.indexOf(best);
    const other = Math.round(360 - angles[i]!);
    return blame(
      input,
      frame,
      i,
      `${sums} ${title(frame, i)} looks like ${other} instead of ${Math.round(angles[i]!)}.`,
    );
  }
  const off = frame.corners.map((c, i) => Math.abs(angles[i]! - (cornerInput(input, c)?.nominalDeg ?? 90)));
  const i = off.indexOf(Math.max(...off));
  if (off[i]! > WORST_SUM_DEG / 2) {
    return blame(input, frame, i, `${sums} ${title(frame, i)} reads ${Math.round(angles[i]!)}, far from the drawing.`);
  }
  const listed = frame.corners.findIndex((c) => c.listed < 0);
  const which = Math.max(0, listed);
  return blame(
    input,
    frame,
    which,
    `${sums} Say which corners are not square, ${title(frame, which).toLowerCase()} first.`,
  );
}

function title(frame: RoomFrame, corner: number): string {
  const name = cornerName(frame.corners[corner]!.between);
  return name[0]!.toUpperCase() + name.slice(1);
}

function blame(input: RoomInput, frame: RoomFrame, corner: number, message: string): RoomError {
  const { listed } = frame.corners[corner]!;
  return { code: 'cannot_close', message, path: listed < 0 ? 'corners' : `corners[${listed}]` };
}
