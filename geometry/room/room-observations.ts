import { DEGREE } from '../core/angle';
import type { NetworkObservation } from './network';
import {
  angleQuantity,
  cornerInput,
  cornerName,
  DEFAULT_NOMINAL_DEG,
  networkMark,
  tieName,
  triangleQuantity,
  wallName,
  wallQuantity,
} from './room-frame';
import type { FrameCorner, RoomFrame } from './room-frame';
import type { RoomInput, TapeSd } from './types';

/** Standard deviations of a protractor reading and of a corner that is only assumed, degrees. */
export const PROTRACTOR_SD_DEG = 0.2;
export const ASSUMED_SD_DEG = 1;

export interface RoomObservation {
  /** `wall A`, `corner A-B`, `tie t1`; two readings of one wall share it. */
  readonly name: string;
  readonly kind: 'wall' | 'triangle' | 'angle' | 'assumed' | 'tie';
  /** Index of the wall, of the corner in the frame, or of the tie. */
  readonly subject: number;
  readonly observation: NetworkObservation;
  readonly ignored: boolean;
  readonly trusted: boolean;
  /** Place in the input. */
  readonly path: string;
}

/** Standard deviation of a tape reading of `length` inches, inches. */
export const tapeSdOf = (tape: TapeSd, length: number): number => tape.fixed + tape.perInch * length;

/**
 * Every reading of a room as an observation, in the order walls, corners, ties. A corner with neither triangle nor angle
 * is an assumed observation of its nominal angle.
 */
export function roomObservations(input: RoomInput, frame: RoomFrame): readonly RoomObservation[] {
  const ignored = new Set(input.ignore);
  const trusted = new Set(input.trust);
  const marked = (o: Omit<RoomObservation, 'ignored' | 'trusted'>): RoomObservation => ({
    ...o,
    ignored: ignored.has(o.name),
    trusted: trusted.has(o.name),
  });
  return [
    ...wallReadings(input, frame),
    ...frame.corners.flatMap((corner, i) => cornerReadings(input, frame, corner, i)),
    ...tieReadings(input, frame),
  ].map(marked);
}

type Reading = Omit<RoomObservation, 'ignored' | 'trusted'>;

function wallReadings(input: RoomInput, frame: RoomFrame): Reading[] {
  return input.walls.flatMap((wall, subject) =>
    wall.lengths.map((value, reading): Reading => ({
      name: wallName(wall.id),
      kind: 'wall',
      subject,
      observation: { quantity: wallQuantity(frame, subject), value, sd: wall.sd ?? tapeSdOf(input.tapeSd, value) },
      path: `walls[${subject}].length${wall.lengths.length > 1 ? `[${reading}]` : ''}`,
    })),
  );
}

function cornerReadings(input: RoomInput, frame: RoomFrame, corner: FrameCorner, subject: number): Reading[] {
  const name = cornerName(corner.between);
  const path = corner.listed < 0 ? 'corners' : `corners[${corner.listed}]`;
  const said = cornerInput(input, corner);
  const readings: Reading[] = [];
  if (said?.triangle) {
    const { a, b, c, sd } = said.triangle;
    const observation = {
      quantity: triangleQuantity(frame, corner, a, b),
      value: c,
      sd: sd ?? tapeSdOf(input.tapeSd, c),
    };
    readings.push({ name, kind: 'triangle', subject, observation, path: `${path}.triangle.c` });
  }
  if (said?.angleDeg !== undefined) {
    const sd = (said.angleSdDeg ?? PROTRACTOR_SD_DEG) * DEGREE;
    const observation = { quantity: angleQuantity(frame, corner), value: said.angleDeg * DEGREE, sd };
    readings.push({ name, kind: 'angle', subject, observation, path: `${path}.angle` });
  }
  if (readings.length === 0) readings.push(assumedReading(input, frame, subject));
  return readings;
}

/** The observation that stands for a corner nobody measured. */
export function assumedReading(input: RoomInput, frame: RoomFrame, subject: number): Reading {
  const corner = frame.corners[subject]!;
  const nominal = cornerInput(input, corner)?.nominalDeg ?? DEFAULT_NOMINAL_DEG;
  return {
    name: cornerName(corner.between),
    kind: 'assumed',
    subject,
    observation: {
      quantity: angleQuantity(frame, corner),
      value: nominal * DEGREE,
      sd: ASSUMED_SD_DEG * DEGREE,
    },
    path: corner.listed < 0 ? 'corners' : `corners[${corner.listed}].nominal`,
  };
}

function tieReadings(input: RoomInput, frame: RoomFrame): Reading[] {
  return input.ties.map((tie, subject): Reading => ({
    name: tieName(tie.id),
    kind: 'tie',
    subject,
    observation: {
      quantity: { kind: 'distance', from: networkMark(frame, tie.from), to: networkMark(frame, tie.to) },
      value: tie.length,
      sd: tie.sd ?? tapeSdOf(input.tapeSd, tie.length),
    },
    path: `ties[${subject}].length`,
  }));
}
