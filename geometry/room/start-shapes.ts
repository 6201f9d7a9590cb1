import { Matrix, solve } from 'ml-matrix';

import { DEGREE } from '../core/angle';
import type { Point } from '../core/point';
import { distance, rotate, subtract } from '../core/vector';
import { closeTraverse, walk } from './close-traverse';
import type { Leg } from './close-traverse';
import { cornerInput, DEFAULT_NOMINAL_DEG, wallEnd } from './room-frame';
import type { FrameCorner, RoomFrame } from './room-frame';
import type { RoomInput } from './types';

/** Weight of a guessed wall length beside closing the ring: enough to settle walls that closure leaves open. */
const GUESS_WEIGHT = 0.01;
/** A wall that closure would make shorter than this share of its guess keeps the guess. */
const SHORTEST_SHARE = 0.05;
/** Other guesses for walls nobody taped, as shares of the first one. */
const OTHER_GUESSES = [0.4, 2.5] as const;

/**
 * Shapes from which the adjustment may start, the most likely first; each is worked out when it is called. A tape
 * triangle cannot tell an inside from an outside corner, so its side is that of `expectedAngle`.
 */
export function startShapes(input: RoomInput, frame: RoomFrame): readonly (() => readonly Point[])[] {
  const measured = frame.corners.map((_, i) => measuredAngle(input, frame, i));
  const expected = frame.corners.map((_, i) => expectedAngle(input, frame, i));
  const shapes = [
    () => walkShape(input, frame, turnsToBearings(frame, measured), 1),
    () => walkShape(input, frame, turnsToBearings(frame, expected), 1),
  ];
  const { sketch } = input;
  if (sketch) {
    const bearings = frame.wallIds.map((_, i) => bearingOf(sketch[i]!, sketch[wallEnd(frame, i)]!));
    shapes.push(() => walkShape(input, frame, bearings, 1));
    shapes.push(() => toRoomAxes(scaleSketch(input, frame, sketch)));
  }
  if (input.walls.some((w) => w.lengths.length === 0)) {
    for (const guess of OTHER_GUESSES) {
      shapes.push(() => walkShape(input, frame, turnsToBearings(frame, measured), guess, false));
    }
  }
  return shapes;
}

/**
 * Interior angle that a corner should have, radians: its protractor reading, else the nominal angle when one was given,
 * else that of the sketch when a triangle was taped, else square.
 */
export function expectedAngle(input: RoomInput, frame: RoomFrame, corner: number): number {
  const said = cornerInput(input, frame.corners[corner]!);
  if (said?.angleDeg !== undefined) return said.angleDeg * DEGREE;
  if (said?.nominalDeg !== undefined) return said.nominalDeg * DEGREE;
  if (said?.triangle && input.sketch) return sketchAngle(input.sketch, frame, frame.corners[corner]!);
  return DEFAULT_NOMINAL_DEG * DEGREE;
}

/** The points turned and moved so that the first is the origin and the second lies on +x. */
export function toRoomAxes(points: readonly Point[]): readonly Point[] {
  const first = points[0]!;
  const turn = -bearingOf(first, points[1]!);
  return points.map((p) => rotate(subtract(p, first), turn));
}

/**
 * Interior angle from the corner's own reading, radians: by the law of cosines for a triangle, on the side of the
 * expected angle; the expected angle when there is no reading.
 */
export function measuredAngle(input: RoomInput, frame: RoomFrame, corner: number): number {
  const said = cornerInput(input, frame.corners[corner]!);
  const expected = expectedAngle(input, frame, corner);
  if (said?.angleDeg !== undefined || !said?.triangle) return expected;
  const { a, b, c } = said.triangle;
  const cosine = (a * a + b * b - c * c) / (2 * a * b);
  const inside = Math.acos(Math.min(1, Math.max(-1, cosine)));
  return expected > Math.PI ? 2 * Math.PI - inside : inside;
}

function sketchAngle(sketch: readonly Point[], frame: RoomFrame, corner: FrameCorner): number {
  const at = sketch[corner.point]!;
  const back = bearingOf(at, sketch[corner.left]!);
  const fore = bearingOf(at, sketch[wallEnd(frame, corner.right)]!);
  const angle = fore - back;
  return angle < 0 ? angle + 2 * Math.PI : angle;
}

const bearingOf = (from: Point, to: Point): number => Math.atan2(to[1] - from[1], to[0] - from[0]);

function turnsToBearings(frame: RoomFrame, interior: readonly number[]): readonly number[] {
  const bearings = [0];
  for (let wall = 1; wall < frame.wallIds.length; wall++) {
    bearings.push(bearings[wall - 1]! + interior[wall - 1]! - Math.PI);
  }
  return bearings;
}

function walkShape(
  input: RoomInput,
  frame: RoomFrame,
  bearings: readonly number[],
  guessShare: number,
  closeGuesses = true,
): readonly Point[] {
  const guesses = lengthGuesses(input, frame).map((g) => g * guessShare);
  const taped = input.walls.map((w) => (w.lengths.length ? mean(w.lengths) : null));
  const lengths =
    frame.closed && closeGuesses
      ? closingLengths(bearings, taped, guesses)
      : taped.map((length, i) => length ?? guesses[i]!);
  const legs = lengths.map((length, i): Leg => ({ bearing: bearings[i]!, length }));
  const { points } = frame.closed ? closeTraverse(legs) : walk(legs);
  return toRoomAxes(points.slice(0, frame.pointCount));
}

const mean = (values: readonly number[]): number => values.reduce((a, b) => a + b, 0) / values.length;

/** A length for every wall: that of the scaled sketch, or the mean of the taped ones. */
function lengthGuesses(input: RoomInput, frame: RoomFrame): readonly number[] {
  const { sketch } = input;
  const known = input.walls.filter((w) => w.lengths.length > 0).map((w) => mean(w.lengths));
  const middling = known.length > 0 ? mean(known) : 100;
  if (!sketch) return input.walls.map(() => middling);
  const scaled = scaleSketch(input, frame, sketch);
  return input.walls.map((_, i) => distance(scaled[i]!, scaled[wallEnd(frame, i)]!) || middling);
}

/** The sketch at the size the tape says. */
function scaleSketch(input: RoomInput, frame: RoomFrame, sketch: readonly Point[]): readonly Point[] {
  let taped = 0;
  let drawn = 0;
  input.walls.forEach((w, i) => {
    if (w.lengths.length === 0) return;
    taped += mean(w.lengths);
    drawn += distance(sketch[i]!, sketch[wallEnd(frame, i)]!);
  });
  const scale = taped > 0 && drawn > 0 ? taped / drawn : 1;
  return sketch.map(([x, y]): Point => [x * scale, y * scale]);
}

/** Lengths of the walls nobody taped that close the ring best; with bearings known that is a linear problem. */
function closingLengths(
  bearings: readonly number[],
  taped: readonly (number | null)[],
  guesses: readonly number[],
): readonly number[] {
  const open = taped.flatMap((length, i) => (length === null ? [i] : []));
  if (open.length === 0) return taped.map((length) => length!);
  const known = walk(taped.map((length, i) => ({ bearing: bearings[i]!, length: length ?? 0 }))).misclosure;
  const rows = Matrix.zeros(2 + open.length, open.length);
  const right = Matrix.zeros(2 + open.length, 1);
  open.forEach((wall, k) => {
    rows.set(0, k, Math.cos(bearings[wall]!));
    rows.set(1, k, Math.sin(bearings[wall]!));
    rows.set(2 + k, k, GUESS_WEIGHT);
    right.set(2 + k, 0, GUESS_WEIGHT * guesses[wall]!);
  });
  right.set(0, 0, -known[0]);
  right.set(1, 0, -known[1]);
  const solved = solve(rows, right);
  return taped.map((length, i) => {
    if (length !== null) return length;
    const closing = solved.get(open.indexOf(i), 0);
    return closing > SHORTEST_SHARE * guesses[i]! ? closing : guesses[i]!;
  });
}
