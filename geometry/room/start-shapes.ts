import { Matrix, solve } from 'ml-matrix';

import type { Point } from '../core/point';
import { distance, rotate, subtract } from '../core/vector';
import { closeTraverse, walk } from './close-traverse';
import type { Leg } from './close-traverse';
import type { ExpectedAngle } from './expected-angles';
import { wallEnd } from './room-frame';
import type { RoomFrame } from './room-frame';
import type { RoomInput } from './types';

/** Weight of a guessed wall length beside closing the ring: enough to settle walls that closure leaves open. */
const GUESS_WEIGHT = 0.01;
/** A wall that closure would make shorter than this share of its guess keeps the guess. */
const SHORTEST_SHARE = 0.05;
/** Other guesses for walls nobody taped, as shares of the first one. */
const OTHER_GUESSES = [0.4, 2.5] as const;

/**
 * Shapes from which the adjustment may start, the most likely first; each is worked out when it is called. Where only a
 * sketch says which way a corner turns, each such corner is also tried the other way round.
 */
export function startShapes(
  input: RoomInput,
  frame: RoomFrame,
  expected: readonly ExpectedAngle[],
): readonly (() => readonly Point[])[] {
  const measured = expected.map((e) => e.measured);
  const shapes = [
    () => walkShape(input, frame, turnsToBearings(frame, measured), 1),
    () =>
      walkShape(
        input,
        frame,
        turnsToBearings(
          frame,
          expected.map((e) => e.said),
        ),
        1,
      ),
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
  expected.forEach((e, i) => {
    if (e.firm) return;
    const turned = measured.map((angle, k) => (k === i ? 2 * Math.PI - angle : angle));
    shapes.push(() => walkShape(input, frame, turnsToBearings(frame, turned), 1));
  });
  return shapes;
}

/** The points turned and moved so that the first is the origin and the second lies on +x. */
export function toRoomAxes(points: readonly Point[]): readonly Point[] {
  const first = points[0]!;
  const turn = -bearingOf(first, points[1]!);
  return points.map((p) => rotate(subtract(p, first), turn));
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
