import type { Run } from '@/geometry/core/layout';
import type { Point, Polygon } from '@/geometry/core/point';
import type { SolvedRoom } from '@/geometry/top/solved-room';

/**
 * The deck of runs that follow each other round their corners, drawn as one outline from offset wall lines: back points
 * left to right, then front points right to left. Shares no code with the program; every line is a x + b y = c.
 */
export function expectedDeck(room: SolvedRoom, runs: readonly Run[]): Polygon {
  const walls = runs.map((run) => wallOf(room, run.wall));
  const back: Point[] = [];
  const front: Point[] = [];
  runs.forEach((run, i) => {
    const wall = walls[i]!;
    const off = standoff(room, run);
    const [b, f] = [offsetLine(wall, off), offsetLine(wall, off + run.depth)];
    if (i === 0) pushEnd(back, front, b, f, endLine(room, run, 'left'));
    const next = runs[i + 1];
    if (!next) return pushEnd(back, front, b, f, endLine(room, run, 'right'));
    const other = walls[i + 1]!;
    const nextOff = standoff(room, next);
    const [nb, nf] = [offsetLine(other, nextOff), offsetLine(other, nextOff + next.depth)];
    const cornerDeg = interior(wall, other);
    if (Math.abs(cornerDeg - 180) <= 5) {
      const split = bisector(wall, other);
      pushEnd(back, front, b, f, split);
      pushEnd(back, front, nb, nf, split);
    } else {
      back.push(cross(b, nb));
      front.push(cross(f, nf));
    }
  });
  return [...back, ...front.reverse()].reverse();
}

interface WallLine {
  readonly from: Point;
  readonly to: Point;
  readonly length: number;
}
type Coefficients = readonly [number, number, number];

function wallOf(room: SolvedRoom, id: string): WallLine {
  const i = room.walls.findIndex((wall) => wall.id === id);
  const [from, to] = [room.points[i]!, room.points[(i + 1) % room.points.length]!];
  return { from, to, length: Math.hypot(to[0] - from[0], to[1] - from[1]) };
}

/** Line parallel to a wall, `off` inches to its right-hand side. */
function offsetLine({ from, to, length }: WallLine, off: number): Coefficients {
  const [a, b] = [(to[1] - from[1]) / length, -(to[0] - from[0]) / length];
  return [a, b, a * from[0] + b * from[1] + off];
}

function squareLine({ from, to, length }: WallLine, at: number): Coefficients {
  const [a, b] = [(to[0] - from[0]) / length, (to[1] - from[1]) / length];
  return [a, b, a * from[0] + b * from[1] + at];
}

function cross([a, b, c]: Coefficients, [d, e, f]: Coefficients): Point {
  const det = a * e - b * d;
  return [(c * e - b * f) / det, (a * f - c * d) / det];
}

function pushEnd(back: Point[], front: Point[], b: Coefficients, f: Coefficients, end: Coefficients): void {
  back.push(cross(b, end));
  front.push(cross(f, end));
}

function bisector(left: WallLine, right: WallLine): Coefficients {
  const unit = ({ from, to, length }: WallLine) => [(to[0] - from[0]) / length, (to[1] - from[1]) / length] as const;
  const [u, v] = [unit(left), unit(right)];
  const [x, y] = [u[0] + v[0], u[1] + v[1]];
  return [x, y, x * left.to[0] + y * left.to[1]];
}

/** Interior angle, degrees, room on the right-hand side. */
function interior(left: WallLine, right: WallLine): number {
  const into = Math.atan2(left.to[1] - left.from[1], left.to[0] - left.from[0]);
  const out = Math.atan2(right.to[1] - right.from[1], right.to[0] - right.from[0]);
  const degrees = ((Math.PI + out - into) * 180) / Math.PI;
  return ((degrees % 360) + 360) % 360;
}

function endLine(room: SolvedRoom, run: Run, side: 'left' | 'right'): Coefficients {
  const wall = wallOf(room, run.wall);
  const end = run[side];
  if (end.kind === 'wall') {
    const i = room.walls.findIndex((w) => w.id === run.wall) + (side === 'left' ? -1 : 1);
    return offsetLine(wallOf(room, room.walls[(i + room.walls.length) % room.walls.length]!.id), end.clearance);
  }
  const overhang = end.kind === 'joint' ? 0 : end.overhang;
  const to = run.to === 'end' ? wall.length : run.to;
  return squareLine(wall, side === 'left' ? run.from - overhang : to + overhang);
}

/** Back gap and the highest bump between the run's ends, straight between stations, level past the outer ones. */
function standoff(room: SolvedRoom, run: Run): number {
  const { profile } = room.walls.find((wall) => wall.id === run.wall)!;
  const follows = (kind: string) => kind === 'wall' || kind === 'joint';
  const length = wallOf(room, run.wall).length;
  const from = follows(run.left.kind) ? 0 : run.from;
  const to = follows(run.right.kind) || run.to === 'end' ? length : run.to;
  if (profile.length === 0) return run.backGap;
  const off = (at: number) => {
    const after = profile.findIndex((station) => station.at >= at);
    if (after === 0) return profile[0]!.off;
    if (after < 0) return profile[profile.length - 1]!.off;
    const [a, b] = [profile[after - 1]!, profile[after]!];
    return a.off + ((at - a.at) / (b.at - a.at)) * (b.off - a.off);
  };
  const inner = profile.filter((station) => station.at > from && station.at < to).map((station) => station.off);
  return run.backGap + Math.max(0, ...[off(from), off(to), ...inner].map((value) => -value));
}

/** Inches of a segment that are covered by edges of the outlines, whichever way they run. */
export function edgeCover(outlines: readonly Polygon[], from: Point, to: Point): number {
  const length = Math.hypot(to[0] - from[0], to[1] - from[1]);
  const [ux, uy] = [(to[0] - from[0]) / length, (to[1] - from[1]) / length];
  const place = ([x, y]: Point) => [(x - from[0]) * ux + (y - from[1]) * uy, (y - from[1]) * ux - (x - from[0]) * uy];
  let covered = 0;
  for (const outline of outlines) {
    outline.forEach((p, i) => {
      const [a, da] = place(p) as [number, number];
      const [b, db] = place(outline[(i + 1) % outline.length]!) as [number, number];
      if (Math.abs(da) > 1e-7 || Math.abs(db) > 1e-7) return;
      covered += Math.max(0, Math.min(length, Math.max(a, b)) - Math.max(0, Math.min(a, b)));
    });
  }
  return covered;
}
