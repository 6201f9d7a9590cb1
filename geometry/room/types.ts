import type { Point } from '../core/point';

/** Standard deviation of a tape reading: `fixed` inches plus `perInch` for every inch read. */
export interface TapeSd {
  readonly fixed: number;
  readonly perInch: number;
}

/** Offset of the wall from a straight-edge, inches: plus is hollow, minus is a bump; `at` inches from the left end. */
export interface ProfileStation {
  readonly at: number;
  readonly off: number;
}

export interface WallInput {
  readonly id: string;
  /** Every tape reading of the wall, inches; none when the wall is unknown and fixed by others. */
  readonly lengths: readonly number[];
  /** Standard deviation of each reading, inches, when it is not the tape's. */
  readonly sd?: number;
  readonly profile?: readonly ProfileStation[];
}

/** Marks `a` inches from the corner on the left-hand wall and `b` on the right-hand wall, and the tape `c` between them. */
export interface TriangleReading {
  readonly a: number;
  readonly b: number;
  readonly c: number;
  /** Standard deviation of c, inches, when it is not the tape's. */
  readonly sd?: number;
}

export interface CornerInput {
  /** Left-hand wall, right-hand wall. */
  readonly between: readonly [string, string];
  /** Angle on the drawing, room side, degrees; left out when nobody said. */
  readonly nominalDeg?: number;
  readonly triangle?: TriangleReading;
  /** Protractor reading, room side, degrees. */
  readonly angleDeg?: number;
  readonly angleSdDeg?: number;
}

/** A place on a wall, inches from its left end; 'end' is its right-hand corner wherever that turns out to be. */
export interface WallMark {
  readonly wall: string;
  readonly at: number | 'end';
}

export interface TieInput {
  readonly id: string;
  readonly from: WallMark;
  readonly to: WallMark;
  readonly length: number;
  readonly sd?: number;
}

/** What was measured in one room. Walls go left to right as seen from the room, so the room is on their right-hand side. */
export interface RoomInput {
  /** True when the last wall ends where the first begins. */
  readonly closed: boolean;
  readonly walls: readonly WallInput[];
  /** Corners that are not listed are assumed at 90 degrees. */
  readonly corners: readonly CornerInput[];
  readonly ties: readonly TieInput[];
  readonly tapeSd: TapeSd;
  /** Observation names that stay in the fit and are never suspects. */
  readonly trust: readonly string[];
  /** Observation names that are left out of the fit. */
  readonly ignore: readonly string[];
  /** What people call each wall, by id, for sentences only; a wall that is not in it goes by its id. */
  readonly labels?: Readonly<Record<string, string>>;
  /** Rough corner points, inches, same axes as the result; one per point of the room. */
  readonly sketch?: readonly Point[];
}

/** The tape of a careful fitter: 1/32 in, and 1/64 in for every 5 ft. A shop setting. */
export const DEFAULT_TAPE_SD: TapeSd = { fixed: 1 / 32, perInch: 1 / 64 / 60 };

/** One reading against the fit. In inches, but in degrees for a protractor reading or an assumed corner. */
export interface ReadingFit {
  readonly taped: number;
  readonly adjusted: number;
  /** adjusted - taped */
  readonly residual: number;
  /** Share of the reading that the others check, 0 to 1; null when the reading is ignored. */
  readonly redundancy: number | null;
  /** residual / (sd x sqrt(redundancy)); null where redundancy is under 1e-6 or the reading is ignored. */
  readonly standardised: number | null;
}

export interface WallFit {
  readonly id: string;
  /** null for a wall that was not taped. Of several readings, the one that fits worst; all stand in `readings`. */
  readonly taped: number | null;
  readonly adjusted: number;
  /** Standard deviation of the adjusted length, inches. */
  readonly sd: number;
  /** Direction from its left to its right end, radians, counter-clockwise from wall 1. */
  readonly bearing: number;
  readonly residual: number | null;
  readonly redundancy: number | null;
  readonly standardised: number | null;
  readonly ignored: boolean;
  readonly readings: readonly ReadingFit[];
}

export interface CornerFit {
  readonly between: readonly [string, string];
  /** Interior angle, room side, degrees, and its standard deviation. */
  readonly angleDeg: number;
  readonly sdDeg: number;
  /** False when the corner is only assumed at its nominal angle. */
  readonly measured: boolean;
  readonly kind: 'triangle' | 'angle' | 'assumed';
  /** Inches for a triangle's c, degrees for an angle; null when only assumed. */
  readonly taped: number | null;
  readonly adjusted: number;
  readonly residual: number;
  readonly redundancy: number | null;
  readonly standardised: number | null;
  readonly ignored: boolean;
  readonly readings: readonly ReadingFit[];
}

export interface TieFit {
  readonly id: string;
  readonly taped: number;
  readonly adjusted: number;
  /** Standard deviation of the adjusted length, inches. */
  readonly sd: number;
  readonly residual: number;
  readonly redundancy: number | null;
  readonly standardised: number | null;
  readonly ignored: boolean;
}

export interface Suspect {
  /** `wall A`, `corner A-B` or `tie t1`. */
  readonly observation: string;
  /** What the fit without it predicts; inches, degrees for a protractor reading. */
  readonly shouldRead: number;
  readonly standardised: number;
  /** Readings that explain the disagreement as well. */
  readonly orElse: readonly string[];
}

export type NextMeasurement = {
  readonly worstCornerSdNowDeg: number;
  readonly worstCornerSdThenDeg: number;
  /** The same in plain words. */
  readonly why: string;
} & (
  | { readonly kind: 'triangle'; readonly between: readonly [string, string]; readonly a: number; readonly b: number }
  | { readonly kind: 'tie'; readonly from: WallMark; readonly to: WallMark }
);

export interface RoomFit {
  /** Corner points, inches: n + 1 for an open chain, n (clockwise) for a closed ring; wall 1 along +x from (0, 0). */
  readonly points: readonly Point[];
  readonly closed: boolean;
  readonly dof: number;
  readonly chi2: number;
  /** 95 % quantile; null when there is no spare reading. */
  readonly chi2Limit: number | null;
  readonly walls: readonly WallFit[];
  /** Along the walls; of a closed ring the corner between last and first wall comes last. */
  readonly corners: readonly CornerFit[];
  readonly ties: readonly TieFit[];
  readonly suspects: readonly Suspect[];
  /** Name of an assumed corner that explains the disagreement, or null. */
  readonly checkCorner: string | null;
  /** null when nothing helps by 1 %, or when it was not asked for. */
  readonly next: NextMeasurement | null;
}

export type RoomErrorCode =
  | 'bad_room'
  | 'bad_length'
  | 'zero_wall'
  | 'wall_too_long'
  | 'triangle_impossible'
  | 'tie_impossible'
  | 'cannot_close'
  | 'undetermined'
  | 'contradictory';

export interface RoomError {
  readonly code: RoomErrorCode;
  /** Names the measurement and says what is wrong with it. */
  readonly message: string;
  /** Place in the input, such as `walls[2].length`. */
  readonly path: string;
}

export type RoomFitResult =
  { readonly ok: true; readonly fit: RoomFit } | { readonly ok: false; readonly error: RoomError };
