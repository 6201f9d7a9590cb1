import type { Layout, Run, RunEnd } from '@/geometry/core/layout';
import type { Point } from '@/geometry/core/point';
import type { SolvedRoom } from '@/geometry/top/solved-room';
import { emptyLayout } from '@/shared/layout/empty-layout';

export const JOINT: RunEnd = { kind: 'joint' };
export const WALL: RunEnd = { kind: 'wall', clearance: 0.25 };
export const OPEN: RunEnd = { kind: 'open', overhang: 1, radius: 1 };
export const FLUSH: RunEnd = { kind: 'open', overhang: 0, radius: 0 };

/** A run over a whole wall, 25 deep, 1/4 off the wall, flush open ends. */
export function run(id: string, wall: string, overrides: Partial<Run> = {}): Run {
  return { id, wall, from: 0, to: 'end', depth: 25, backGap: 0.25, left: FLUSH, right: FLUSH, ...overrides };
}

/** A layout with slabs of 96 x 25 and no other stock. */
export function layout(overrides: Partial<Layout> = {}): Layout {
  return emptyLayout({
    stock: {
      slabs: [{ id: 'S96', length: 96, depth: 25, price: 37900, count: null }],
      rack: [],
      kerf: 0.125,
      trim: 0.5,
      reuseMin: 18,
      turn: true,
      turnOver: true,
      grainMatch: false,
    },
    ...overrides,
  });
}

/**
 * A room from wall lengths and interior angles, degrees, wall 1 along +x from (0, 0): the points follow from them, so
 * an open room needs one angle less than walls.
 */
export function room(lengths: readonly number[], anglesDeg: readonly number[], sd = 0.1): SolvedRoom {
  const ids = lengths.map((_, i) => String.fromCharCode(65 + i));
  let bearing = 0;
  const points: Point[] = [[0, 0]];
  lengths.forEach((length, i) => {
    const [x, y] = points[i]!;
    points.push([x + length * Math.cos(bearing), y + length * Math.sin(bearing)]);
    bearing += (((anglesDeg[i] ?? 180) - 180) * Math.PI) / 180;
  });
  return {
    points,
    closed: false,
    walls: ids.map((id, i) => ({ id, length: lengths[i]!, profile: [] })),
    corners: anglesDeg.map((angle, i) => ({ between: [ids[i]!, ids[i + 1]!] as const, angle, sd })),
  };
}
