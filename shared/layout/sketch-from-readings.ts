import type { RoomReadings } from '@/geometry/core/layout';
import type { Point } from '@/geometry/core/point';
import { toRadians } from '@/geometry/core/angle';
import { rotate } from '@/geometry/core/vector';

/** Length drawn for a wall nobody has taped yet, inches. */
const UNKNOWN_WALL = 96;

/**
 * A first drawing from the readings themselves: walls at their taped lengths, corners at their nominal angles. Turned by
 * quarters so that the way into the room lies below, as somebody standing in it would draw it.
 */
export function sketchFromReadings(room: Pick<RoomReadings, 'closed' | 'walls' | 'corners'>): Point[] {
  const points = walk(room);
  const [x, y] = points[points.length - 1]!;
  const quarters = Math.round((-2 * Math.atan2(y, x)) / Math.PI + LEAN);
  const turned = points.map((point) => rotate(point, (quarters * Math.PI) / 2));
  return room.closed ? turned.slice(0, -1) : turned;
}

/** An L lies between two quarters; it is drawn with its first wall going up. */
const LEAN = 0.02;

function walk(room: Pick<RoomReadings, 'walls' | 'corners'>): Point[] {
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
  return points;
}
