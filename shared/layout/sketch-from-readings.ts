import type { RoomReadings } from '@/geometry/core/layout';
import type { Point } from '@/geometry/core/point';
import { toRadians } from '@/geometry/core/angle';

/** Length drawn for a wall nobody has taped yet, inches. */
const UNKNOWN_WALL = 96;

/** A first drawing from the readings themselves: walls at their taped lengths, corners at their nominal angles. */
export function sketchFromReadings(room: Pick<RoomReadings, 'closed' | 'walls' | 'corners'>): Point[] {
  const nominal = new Map(room.corners.map((corner) => [corner.between.join('|'), corner.nominal]));
  const points: Point[] = [[0, 0]];
  let bearing = 0;
  room.walls.forEach((wall, i) => {
    const length = wall.length[0]?.value ?? UNKNOWN_WALL;
    const [x, y] = points[points.length - 1]!;
    points.push([x + length * Math.cos(bearing), y + length * Math.sin(bearing)]);
    const next = room.walls[i + 1];
    // The room lies to the right: an inside corner of 90 turns right by 90.
    if (next) bearing -= Math.PI - toRadians(nominal.get(`${wall.id}|${next.id}`) ?? 90);
  });
  return room.closed ? points.slice(0, -1) : points;
}
