import type { Layout, Run, RunEnd } from '@/geometry/core/layout';
import type { SolvedRoom } from '@/geometry/top/solved-room';
import { layout } from './tops-builder';
import type { Random } from './random';
import { DRAWINGS, trueRoom, type TrueRoom } from './true-rooms';

/** A room that leans on nothing: two to six walls, inside, obtuse, nearly straight and outside corners. */
export function randomChain(random: Random): TrueRoom {
  const count = 2 + random.below(5);
  const nominalDeg: number[] = [];
  let bearing = 0;
  const points: [number, number][] = [[0, 0]];
  for (let i = 0; i < count; i++) {
    const length = random.uniform(40, 180);
    const [x, y] = points[i]!;
    points.push([x + length * Math.cos(bearing), y + length * Math.sin(bearing)]);
    const ranges = [
      [62, 118],
      [80, 100],
      [120, 172],
      [176, 184],
      [190, 240],
      [250, 298],
    ] as const;
    const [low, high] = ranges[random.below(ranges.length)]!;
    const angle = random.uniform(low, high);
    if (i < count - 1) nominalDeg.push(angle);
    bearing += ((angle - 180) * Math.PI) / 180;
  }
  return { name: 'chain', closed: false, points, nominalDeg };
}

export function randomRoom(random: Random): TrueRoom {
  if (random.below(2) === 0) return randomChain(random);
  const names = Object.keys(DRAWINGS);
  const name = names[random.below(names.length)]!;
  return trueRoom(
    name,
    random,
    Array.from({ length: 12 }, () => random.uniform(-2, 2)),
  );
}

/** Bows on some walls: three to five stations within 3/8 in. */
export function withBows(room: SolvedRoom, random: Random): SolvedRoom {
  return {
    ...room,
    walls: room.walls.map((wall) => {
      if (random.below(3) > 0) return wall;
      const count = 3 + random.below(3);
      const profile = Array.from({ length: count }, (_, i) => ({
        at: (wall.length * i) / (count - 1),
        off: Math.round(random.uniform(-6, 6)) / 16,
      }));
      return { ...wall, profile };
    }),
  };
}

const open = (random: Random): RunEnd => ({ kind: 'open', overhang: random.below(2), radius: 1 });

/** Part runs keep this far out of the corners, where a neighbour may lie, inches. */
const CORNER = 40;

/** Runs over whole walls and parts of walls; neighbours over whole walls are joined, of any two depths. */
export function randomKitchen(
  room: SolvedRoom,
  random: Random,
): { layout: Layout; groups: readonly (readonly Run[])[] } {
  const corner = (i: number) => room.corners[i]?.angle;
  const kinds = room.walls.map(({ length }) => {
    const kind = ['whole', 'whole', 'whole', 'part', 'none'][random.below(5)]!;
    return kind === 'part' && length < 2.4 * CORNER ? 'none' : kind;
  });
  const groups: Run[][] = [];
  let group: Run[] = [];
  const close = () => {
    if (group.length > 0) groups.push(group);
    group = [];
  };
  room.walls.forEach((wall, i) => {
    const kind = kinds[i]!;
    const whole = kind === 'whole';
    if (!whole) close();
    if (kind === 'none') return;
    const before = corner(i - 1);
    const after = corner(i);
    const joinsLeft = whole && i > 0 && kinds[i - 1] === 'whole';
    const joinsRight = whole && i < room.walls.length - 1 && kinds[i + 1] === 'whole';
    const againstWall = (angle: number | undefined): RunEnd | null =>
      whole && angle !== undefined && angle < 150 ? { kind: 'wall', clearance: 0.25 } : null;
    const run: Run = {
      id: String(i + 1),
      wall: wall.id,
      from: whole ? 0 : random.uniform(CORNER, wall.length * 0.45),
      to: whole ? 'end' : random.uniform(wall.length * 0.55, wall.length - CORNER),
      depth: random.below(2) === 0 ? 25 : Math.round(random.uniform(14, 38) * 8) / 8,
      backGap: [0.25, 0.25, 0.25, 0.125, 0.5][random.below(5)]!,
      left: joinsLeft ? { kind: 'joint' } : (againstWall(before) ?? open(random)),
      right: joinsRight ? { kind: 'joint' } : (againstWall(after) ?? open(random)),
    };
    group.push(run);
    if (!joinsRight) close();
  });
  close();
  const runs = groups.flat();
  const joints = groups.flatMap((list) =>
    list.slice(1).map((right, i): Layout['joints'][number] => {
      const left = list[i]!;
      const kind = (['miter', 'miter', 'butt'] as const)[random.below(3)]!;
      const through = random.below(2) === 0 ? left.id : right.id;
      return {
        between: [left.id, right.id],
        kind,
        ...(kind === 'butt' && { through }),
        assembled: random.below(2) === 0 ? 'shop' : 'site',
      };
    }),
  );
  return { layout: layout({ runs, joints }), groups };
}
