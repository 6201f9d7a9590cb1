import type { Point } from '@/geometry/core/point';

export type StartingShape = 'straight' | 'L' | 'U' | 'bay' | 'closed';

/** Rooms to begin with, one tap each; the tape gives them their sizes. Walls left to right, room on the right-hand side. */
const SHAPES: Readonly<Record<StartingShape, { readonly points: readonly Point[]; readonly closed: boolean }>> = {
  straight: {
    points: [
      [0, 0],
      [120, 0],
    ],
    closed: false,
  },
  L: {
    points: [
      [0, -96],
      [0, 0],
      [120, 0],
    ],
    closed: false,
  },
  U: {
    points: [
      [0, -96],
      [0, 0],
      [120, 0],
      [120, -96],
    ],
    closed: false,
  },
  bay: {
    points: [
      [0, -84],
      [0, 0],
      [48, 48],
      [120, 48],
      [168, 0],
      [168, -84],
    ],
    closed: false,
  },
  closed: {
    points: [
      [0, -108],
      [0, 0],
      [132, 0],
      [132, -108],
    ],
    closed: true,
  },
};

export const STARTING_SHAPES = Object.keys(SHAPES) as readonly StartingShape[];

/** Words on the buttons. */
export const SHAPE_NAMES: Readonly<Record<StartingShape, string>> = {
  straight: 'One wall',
  L: 'L',
  U: 'U',
  bay: 'Bay',
  closed: 'All round',
};

/** The edit that begins a room with a shape; its corners are sketched at 90 or 135 until they are checked. */
export function startingShape(shape: StartingShape) {
  const { points, closed } = SHAPES[shape];
  const count = closed ? points.length : points.length - 1;
  return {
    kind: 'traceRoom' as const,
    walls: Array.from({ length: count }, (_, i) => String.fromCharCode(65 + i)),
    points: points.map(([x, y]): [number, number] => [x, y]),
    closed,
  };
}
