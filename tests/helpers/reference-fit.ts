import type { RoomInput, WallMark } from '@/geometry/room/types';

import { householderSolve, invert } from './dense-linear';

/**
 * An independent least-squares fit of a room, for comparison only: unknowns are wall lengths and bearings instead of
 * coordinates, derivatives are differences, steps are damped (Levenberg-Marquardt) and solved by Householder QR. It
 * imports nothing of geometry but types.
 */
export interface ReferenceFit {
  readonly points: readonly (readonly [number, number])[];
  readonly dof: number;
  readonly chi2: number;
  readonly anglesDeg: readonly number[];
  readonly angleSdsDeg: readonly number[];
  readonly wallSds: readonly number[];
  readonly names: readonly string[];
  readonly assumed: readonly boolean[];
  readonly redundancies: readonly number[];
  readonly standardised: readonly number[];
  /** First accused reading and those that cannot be told apart, or the assumed corner to check. */
  readonly suspect: { readonly observation: string; readonly orElse: readonly string[] } | null;
  readonly checkCorner: string | null;
}

type Point = readonly [number, number];
type Measure = (points: readonly Point[]) => number;

interface Observation {
  readonly name: string;
  readonly assumed: boolean;
  readonly value: number;
  readonly sd: number;
  readonly angular: boolean;
  readonly measure: Measure;
}

const RAD = Math.PI / 180;

/** @param truth - points to start from, so that the reference never lands in another valley */
export function referenceFit(input: RoomInput, truth: readonly Point[]): ReferenceFit {
  const observations = observe(input);
  const model = chainModel(input, truth);
  const misfits = (x: readonly number[]): number[] => {
    const points = model.points(x);
    return observations.map((o) => wrapped(o.measure(points) - o.value, o.angular) / o.sd);
  };
  const x = minimise(misfits, model.start);
  const points = model.points(x);
  const residuals = misfits(x);
  const jacobian = differences(misfits, x);
  const covariance = invert(normal(jacobian));
  const n = input.walls.length;
  const corners = Array.from({ length: input.closed ? n : n - 1 }, (_, i) => i);
  const spread = (measure: Measure): number => {
    const [g] = differences((y) => [measure(model.points(y))], x) as [number[]];
    return Math.sqrt(quadratic(g, covariance, g));
  };
  const redundancies = jacobian.map((row) => 1 - quadratic(row, covariance, row));
  const standardised = residuals.map((v, i) => (redundancies[i]! < 1e-6 ? 0 : v / Math.sqrt(redundancies[i]!)));
  const alike = (i: number, j: number): boolean =>
    redundancies[j]! >= 1e-6 &&
    (Math.abs(Math.abs(standardised[i]!) - Math.abs(standardised[j]!)) <= 1e-6 ||
      Math.abs(quadratic(jacobian[i]!, covariance, jacobian[j]!)) / Math.sqrt(redundancies[i]! * redundancies[j]!) >
        0.95);
  return {
    points,
    dof: observations.length - x.length,
    chi2: residuals.reduce((s, v) => s + v * v, 0),
    anglesDeg: corners.map((i) => interior(input, i)(points) / RAD),
    angleSdsDeg: corners.map((i) => spread(interior(input, i)) / RAD),
    wallSds: input.walls.map((_, i) => spread(length(input, i))),
    names: observations.map((o) => o.name),
    assumed: observations.map((o) => o.assumed),
    redundancies,
    standardised,
    ...accuse(observations, standardised, alike),
  };
}

function accuse(
  observations: readonly Observation[],
  standardised: readonly number[],
  alike: (i: number, j: number) => boolean,
): Pick<ReferenceFit, 'suspect' | 'checkCorner'> {
  let worst = -1;
  observations.forEach((o, i) => {
    if (o.assumed) return;
    if (worst < 0 || Math.abs(standardised[i]!) > Math.abs(standardised[worst]!)) worst = i;
  });
  if (worst < 0 || Math.abs(standardised[worst]!) <= 3.29) return { suspect: null, checkCorner: null };
  const group = observations.map((_, i) => i).filter((i) => i === worst || alike(worst, i));
  const corner = group.find((i) => observations[i]!.assumed);
  if (corner !== undefined) return { suspect: null, checkCorner: observations[corner]!.name };
  const names = [...new Set(group.map((i) => observations[i]!.name))];
  return { suspect: { observation: names[0]!, orElse: names.slice(1) }, checkCorner: null };
}

function observe(input: RoomInput): Observation[] {
  const tape = (value: number): number => input.tapeSd.fixed + input.tapeSd.perInch * value;
  const plain = { assumed: false, angular: false };
  const walls = input.walls.flatMap((wall, i) =>
    wall.lengths.map((value) => ({
      ...plain,
      name: `wall ${wall.id}`,
      value,
      sd: wall.sd ?? tape(value),
      measure: length(input, i),
    })),
  );
  const n = input.walls.length;
  const corners = Array.from({ length: input.closed ? n : n - 1 }, (_, i): Observation => {
    const [left, right] = [input.walls[i]!.id, input.walls[(i + 1) % n]!.id];
    const said = input.corners.find((c) => c.between[0] === left && c.between[1] === right);
    const name = `corner ${left}-${right}`;
    if (said?.triangle) {
      const { a, b, c, sd } = said.triangle;
      return { ...plain, name, value: c, sd: sd ?? tape(c), measure: triangle(input, i, a, b) };
    }
    const degrees = said?.angleDeg ?? said?.nominalDeg ?? 90;
    const sdDeg = said?.angleDeg === undefined ? 1 : (said.angleSdDeg ?? 0.2);
    const assumed = said?.angleDeg === undefined;
    return { name, assumed, angular: true, value: degrees * RAD, sd: sdDeg * RAD, measure: interior(input, i) };
  });
  const ties = input.ties.map((tie) => ({
    ...plain,
    name: `tie ${tie.id}`,
    value: tie.length,
    sd: tie.sd ?? tape(tie.length),
    measure: (points: readonly Point[]) => gap(place(input, tie.from, points), place(input, tie.to, points)),
  }));
  return [...walls, ...corners, ...ties].filter((o) => !input.ignore.includes(o.name));
}

const gap = (a: Point, b: Point): number => Math.sqrt((a[0] - b[0]) ** 2 + (a[1] - b[1]) ** 2);
const end = (input: RoomInput, points: readonly Point[], wall: number): Point =>
  points[input.closed ? (wall + 1) % points.length : wall + 1]!;
const length =
  (input: RoomInput, wall: number): Measure =>
  (points) =>
    gap(points[wall]!, end(input, points, wall));

const interior =
  (input: RoomInput, corner: number): Measure =>
  (points) => {
    const right = (corner + 1) % input.walls.length;
    const [p, q, r] = [points[corner]!, points[right]!, end(input, points, right)];
    const turn = Math.atan2(r[1] - q[1], r[0] - q[0]) - Math.atan2(q[1] - p[1], q[0] - p[0]);
    return Math.PI + wrapped(turn, true);
  };

function triangle(input: RoomInput, corner: number, a: number, b: number): Measure {
  const angle = interior(input, corner);
  return (points) => Math.sqrt(a * a + b * b - 2 * a * b * Math.cos(angle(points)));
}

function place(input: RoomInput, mark: WallMark, points: readonly Point[]): Point {
  const wall = input.walls.findIndex((w) => w.id === mark.wall);
  const [p, q] = [points[wall]!, end(input, points, wall)];
  const inches = mark.at === 'end' ? gap(p, q) : mark.at;
  const share = inches / gap(p, q);
  return [p[0] + share * (q[0] - p[0]), p[1] + share * (q[1] - p[1])];
}

const wrapped = (value: number, angular: boolean): number =>
  angular ? value - 2 * Math.PI * Math.round(value / (2 * Math.PI)) : value;

/** Lengths, then bearings but the first; a ring leaves out its last wall, which closes it. */
function chainModel(input: RoomInput, truth: readonly Point[]) {
  const free = input.closed ? input.walls.length - 1 : input.walls.length;
  const start: number[] = [];
  for (let i = 0; i < free; i++) start.push(gap(truth[i]!, truth[i + 1]!));
  for (let i = 1; i < free; i++)
    start.push(Math.atan2(truth[i + 1]![1] - truth[i]![1], truth[i + 1]![0] - truth[i]![0]));
  const points = (x: readonly number[]): Point[] => {
    const out: Point[] = [[0, 0]];
    for (let i = 0; i < free; i++) {
      const bearing = i === 0 ? 0 : x[free + i - 1]!;
      const [px, py] = out[i]!;
      out.push([px + x[i]! * Math.cos(bearing), py + x[i]! * Math.sin(bearing)]);
    }
    return out;
  };
  return { start, points };
}

function differences(of: (x: readonly number[]) => number[], x: readonly number[]): number[][] {
  const columns = x.map((value, k) => {
    const h = 1e-5 * Math.max(1, Math.abs(value));
    const shifted = (by: number): number[] => of(x.map((v, j) => (j === k ? v + by : v)));
    const [plus, minus, plus2, minus2] = [shifted(h), shifted(-h), shifted(2 * h), shifted(-2 * h)];
    return plus.map((p, i) => (8 * (p - minus[i]!) - (plus2[i]! - minus2[i]!)) / (12 * h));
  });
  return columns[0]!.map((_, i) => columns.map((column) => column[i]!));
}

function minimise(misfits: (x: readonly number[]) => number[], start: readonly number[]): number[] {
  const cost = (x: readonly number[]): number => misfits(x).reduce((s, v) => s + v * v, 0);
  let x = [...start];
  let damping = 1e-3;
  for (let round = 0; round < 400; round++) {
    const r = misfits(x);
    const rows = differences(misfits, x);
    const sizes = x.map((_, k) => Math.sqrt(rows.reduce((s, row) => s + row[k]! ** 2, 0)) || 1);
    const augmented = [...rows, ...x.map((_, k) => x.map((__, j) => (j === k ? Math.sqrt(damping) * sizes[k]! : 0)))];
    const step = householderSolve(augmented, [...r.map((v) => -v), ...x.map(() => 0)]);
    const next = x.map((v, k) => v + step[k]!);
    if (cost(next) <= cost(x)) {
      const small = step.every((s, k) => Math.abs(s) < 1e-10 * Math.max(1, Math.abs(x[k]!)));
      x = next;
      damping = Math.max(damping / 10, 1e-14);
      if (small) break;
    } else {
      damping *= 10;
      if (damping > 1e12) break;
    }
  }
  return x;
}

function normal(rows: readonly (readonly number[])[]): number[][] {
  const n = rows[0]!.length;
  return Array.from({ length: n }, (_, i) =>
    Array.from({ length: n }, (__, j) => rows.reduce((s, row) => s + row[i]! * row[j]!, 0)),
  );
}

function quadratic(a: readonly number[], m: readonly (readonly number[])[], b: readonly number[]): number {
  return a.reduce((sum, x, i) => sum + x * b.reduce((s, y, j) => s + m[i]![j]! * y, 0), 0);
}
