import { checkClosing } from './check-closing';
import { checkReadings } from './check-readings';
import { checkStructure } from './check-structure';
import { chiSquareQuantile } from './chi-square';
import { expectedAngles } from './expected-angles';
import { fitRows } from './fit-rows';
import { relabelRoom } from './relabel-room';
import { nextMeasurement } from './next-measurement';
import { roomFrame } from './room-frame';
import { solveRoom } from './solve-room';
import { findSuspects } from './suspects';
import type { RoomFitResult, RoomInput } from './types';

/** Share of honest rooms whose chi2 stays under the limit. */
const CHI2_PROBABILITY = 0.95;

export interface FitOptions {
  /** Also look for the reading to take next. */
  readonly next?: boolean;
}

/**
 * The true shape of a room from its tape readings, by weighted least squares with a-priori standard deviations.
 *
 * @param input - lengths in inches
 * @returns the fit, or the error that names the measurement at fault: structure that does not hang together
 *   (`bad_room`), lengths that are none (`bad_length`, `zero_wall`), figures that cannot close (`wall_too_long`,
 *   `triangle_impossible`, `tie_impossible`, `cannot_close`), something nothing fixes (`undetermined`), readings that no
 *   room fits (`contradictory`)
 */
export function fitRoom(input: RoomInput, options: FitOptions = {}): RoomFitResult {
  const result = fitById(input, options);
  if (result.ok || !input.labels) return result;
  // The same room under the names people use has the same fault, said in those names.
  const named = fitById(relabelRoom(input, input.labels), options);
  return named.ok || named.error.code !== result.error.code ? result : named;
}

function fitById(input: RoomInput, options: FitOptions): RoomFitResult {
  const structure = checkStructure(input) ?? checkReadings(input);
  if (structure) return { ok: false, error: structure };
  const frame = roomFrame(input);
  const expected = expectedAngles(input, frame);
  const closing = checkClosing(input, frame, expected);
  if (closing) return { ok: false, error: closing };
  const result = solveRoom(input, frame, expected);
  if (!result.ok) return result;
  const { solved } = result;
  const { points, dof, chi2 } = solved.adjustment;
  return {
    ok: true,
    fit: {
      points,
      closed: input.closed,
      dof,
      chi2,
      chi2Limit: dof > 0 ? chiSquareQuantile(CHI2_PROBABILITY, dof) : null,
      ...fitRows(input, solved),
      ...findSuspects(solved),
      next: options.next ? nextMeasurement(input, solved) : null,
    },
  };
}
