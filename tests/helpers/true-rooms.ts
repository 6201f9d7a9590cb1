import type { Random } from './random';

/**
 * Rooms as they really stand, made without any code of the solver: plain coordinates, plain trigonometry. The room lies
 * on the right-hand side of every wall.
 */
export interface TrueRoom {
  readonly name: string;
  readonly closed: boolean;
  /** n + 1 points of an open chain, n of a ring; the first at (0, 0), the second on +x. */
  readonly points: readonly (readonly [number, number])[];
  /** Interior angles on the drawing, degrees, corner by corner. */
  readonly nominalDeg: readonly number[];
}

interface Drawing {
  readonly closed: boolean;
  readonly points: readonly (readonly [number, number])[];
}

/** Drawings, inches, before they are stretched and bent. */
export const DRAWINGS: Readonly<Record<string, Drawing>> = {
  L: {
    closed: false,
    points: [
      [0, 0],
      [96, 0],
      [96, -118],
    ],
  },
  U: {
    closed: false,
    points: [
      [0, 0],
      [96, 0],
      [96, -120],
      [12, -120],
    ],
  },
  bay: {
    closed: false,
    points: [
      [0, 0],
      [60, 0],
      [95, 35],
      [155, 35],
      [190, 0],
      [250, 0],
    ],
  },
  column: {
    closed: false,
    points: [
      [0, 0],
      [70, 0],
      [70, -14],
      [88, -14],
      [88, 0],
      [150, 0],
      [150, -110],
    ],
  },
  ring: {
    closed: true,
    points: [
      [0, 0],
      [144, 0],
      [144, -120],
      [0, -120],
    ],
  },
  'L ring': {
    closed: true,
    points: [
      [0, 0],
      [180, 0],
      [180, -90],
      [100, -90],
      [100, -160],
      [0, -160],
    ],
  },
  hexagon: {
    closed: true,
    points: [
      [0, 0],
      [80, 0],
      [120, -69.282],
      [80, -138.564],
      [0, -138.564],
      [-40, -69.282],
    ],
  },
  galley: {
    closed: true,
    points: [
      [0, 0],
      [84, 0],
      [84, -12],
      [108, -12],
      [108, 0],
      [192, 0],
      [192, -102],
      [120, -102],
      [120, -88],
      [92, -88],
      [92, -102],
      [0, -102],
    ],
  },
  'open galley': {
    closed: false,
    points: [
      [0, 0],
      [72, 0],
      [72, -15],
      [95, -15],
      [95, 0],
      [160, 0],
      [195, -35],
      [195, -150],
      [120, -150],
      [120, -132],
      [96, -132],
      [96, -150],
      [10, -150],
    ],
  },
};

/**
 * A room that stands like the drawing, but stretched and out of square.
 *
 * @param bendDeg - how far each corner's angle is off its drawing, degrees; the last corner of a ring takes what is left
 */
export function trueRoom(name: string, random: Random, bendDeg: readonly number[]): TrueRoom {
  const { closed, points } = DRAWINGS[name]!;
  const [sx, sy] = [random.uniform(0.85, 1.2), random.uniform(0.85, 1.2)];
  // Stretching a slanted wall would bend it; slanted drawings keep their proportions.
  const slanted = points.some(([x, y], i) => i > 0 && x !== points[i - 1]![0] && y !== points[i - 1]![1]);
  const drawn = points.map(([x, y]) => [x * sx, y * (slanted ? sx : sy)] as const);
  const n = closed ? drawn.length : drawn.length - 1;
  const at = (i: number) => drawn[i % drawn.length]!;
  const lengths: number[] = [];
  const bearings: number[] = [];
  for (let i = 0; i < n; i++) {
    const [dx, dy] = [at(i + 1)[0] - at(i)[0], at(i + 1)[1] - at(i)[1]];
    lengths.push(Math.hypot(dx, dy));
    bearings.push(Math.atan2(dy, dx));
  }
  const corners = closed ? n : n - 1;
  const nominalDeg = Array.from({ length: corners }, (_, i) => interiorDeg(bearings[i]!, bearings[(i + 1) % n]!));
  const bent = [0];
  for (let i = 1; i < n; i++) {
    const bend = (bendDeg[i - 1] ?? 0) * (Math.PI / 180);
    bent.push(bent[i - 1]! + bearings[i]! - bearings[i - 1]! + bend);
  }
  if (closed) closeWithLastTwo(lengths, bent);
  const walked: [number, number][] = [[0, 0]];
  for (let i = 0; i < (closed ? n - 1 : n); i++) {
    const [x, y] = walked[i]!;
    walked.push([x + lengths[i]! * Math.cos(bent[i]!), y + lengths[i]! * Math.sin(bent[i]!)]);
  }
  return { name, closed, points: walked, nominalDeg };
}

function interiorDeg(from: number, to: number): number {
  let turn = to - from;
  while (turn <= -Math.PI) turn += 2 * Math.PI;
  while (turn > Math.PI) turn -= 2 * Math.PI;
  return Math.round(180 + (turn * 180) / Math.PI);
}

/** Lets the last two walls meet the start again; they are never parallel in the drawings. */
function closeWithLastTwo(lengths: number[], bearings: readonly number[]): void {
  const n = lengths.length;
  let x = 0;
  let y = 0;
  for (let i = 0; i < n - 2; i++) {
    x += lengths[i]! * Math.cos(bearings[i]!);
    y += lengths[i]! * Math.sin(bearings[i]!);
  }
  const [c1, s1] = [Math.cos(bearings[n - 2]!), Math.sin(bearings[n - 2]!)];
  const [c2, s2] = [Math.cos(bearings[n - 1]!), Math.sin(bearings[n - 1]!)];
  const det = c1 * s2 - c2 * s1;
  lengths[n - 2] = (-x * s2 + y * c2) / det;
  lengths[n - 1] = (-y * c1 + x * s1) / det;
}

/** Interior angle at a corner of points, degrees, room on the right-hand side. */
export function trueAngleDeg(room: Pick<TrueRoom, 'points' | 'closed'>, corner: number): number {
  const count = room.points.length;
  const a = room.points[corner]!;
  const b = room.points[(corner + 1) % count]!;
  const c = room.points[(corner + 2) % count]!;
  const into = Math.atan2(b[1] - a[1], b[0] - a[0]);
  const out = Math.atan2(c[1] - b[1], c[0] - b[0]);
  let angle = Math.PI + out - into;
  while (angle < 0) angle += 2 * Math.PI;
  while (angle >= 2 * Math.PI) angle -= 2 * Math.PI;
  return (angle * 180) / Math.PI;
}
