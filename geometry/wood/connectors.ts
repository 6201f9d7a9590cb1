import { toRadians } from '../core/angle';
import type { ConnectorSettings } from '../core/settings';
import type { Point, Polygon } from '../core/point';
import { cross, distance, dot, subtract, unit } from '../core/vector';
import type { TopJoint } from '../top/types';
import { upToSixteenth } from './movement';

/** A stretch of a joint, inches from its back point. */
export type Stretch = readonly [from: number, to: number];

/** Under this angle the joint runs along a piece's edge rather than into it, and has no point to come through at. */
const ALONG_EDGE = toRadians(5);

/**
 * Wood left between a mortise and the piece's edge, inches; negative when it comes through.
 *
 * @param fromPoint - from the piece's point to the mortise's centre along the joint
 * @param angle - of the piece at that point, radians
 * @param width - of the mortise along the joint; `depth` - into the piece
 */
export function mortiseCover(fromPoint: number, angle: number, width: number, depth: number): number {
  return (fromPoint - width / 2) * Math.sin(angle) - depth * Math.max(0, Math.cos(angle));
}

/** Least distance from a piece's point at which a mortise leaves `cover` of wood; 0 where the joint runs along the edge. */
export function leastFromPoint(angle: number, { width, depth, cover }: ConnectorSettings): number {
  if (angle < ALONG_EDGE || angle > Math.PI - ALONG_EDGE) return 0;
  return width / 2 + (cover + depth * Math.max(0, Math.cos(angle))) / Math.sin(angle);
}

/**
 * Stretches of a joint where a mortise would reach into a cutout or leave too little wood beside it.
 *
 * @param from - back point of the joint; `to` - front point; cutouts in the same axes
 */
export function stretchesInCutouts(
  from: Point,
  to: Point,
  cutouts: readonly Polygon[],
  settings: ConnectorSettings,
): readonly Stretch[] {
  const direction = unit(from, to);
  if (!direction) return [];
  const reach = settings.depth + settings.cover;
  const side = settings.width / 2 + settings.cover;
  const total = distance(from, to);
  return cutouts.flatMap((cutout): Stretch[] => {
    const local = cutout.map((p): Point => [dot(subtract(p, from), direction), cross(direction, subtract(p, from))]);
    const band = keepBelow(keepBelow(local, reach, 1), reach, -1);
    if (band.length === 0) return [];
    const s = band.map((p) => p[0]);
    const stretch: Stretch = [Math.min(...s) - side, Math.max(...s) + side];
    return stretch[1] > 0 && stretch[0] < total ? [stretch] : [];
  });
}

/** The part of an outline where `sign` x y is at most `limit`. */
function keepBelow(outline: readonly Point[], limit: number, sign: 1 | -1): Point[] {
  const kept: Point[] = [];
  outline.forEach((a, i) => {
    const b = outline[(i + 1) % outline.length]!;
    const over = sign * a[1] - limit;
    const nextOver = sign * b[1] - limit;
    if (over <= 0) kept.push(a);
    if (over * nextOver < 0) {
      const t = over / (over - nextOver);
      kept.push([a[0] + (b[0] - a[0]) * t, sign * limit]);
    }
  });
  return kept;
}

/**
 * Centres of the connectors along a joint, inches from its back point, ascending.
 *
 * They are set out from both ends in at the spacing, one more in the middle where the last two stand too far apart. Near
 * an acute point the first one moves in until the mortise leaves enough wood. None lies in a cutout; one that would come
 * within the shop's distance of a screw or drawbolt moves to the nearest clear place, or is left out when that is half a
 * spacing away.
 *
 * @param joint - its length and the two pieces' angles at the back point, degrees
 * @param blocked - stretches in cutouts; `hardware` - screws and drawbolts, inches from the back point
 */
export function connectorsAlong(
  joint: Pick<TopJoint, 'length' | 'angles'>,
  settings: ConnectorSettings,
  blocked: readonly Stretch[] = [],
  hardware: readonly number[] = [],
): readonly number[] {
  const [atBack, atFront] = endDistances(joint.angles, settings);
  const free = subtractStretches([atBack, joint.length - atFront], blocked);
  const clear = hardware.map((at): Stretch => {
    const side = settings.fromHardware + settings.width / 2;
    return [at - side, at + side];
  });
  const apart = settings.width + settings.cover;
  const centres = free.flatMap((stretch) => {
    const places = subtractStretches(stretch, clear);
    return setOut(stretch, settings.spacing, apart).flatMap((at) => nearestIn(places, at, settings.spacing / 2));
  });
  return dropCrowded(
    centres.sort((a, b) => a - b),
    apart,
  );
}

/** First connector from the back point and from the front point: the shop's distance, or more at an acute point. */
export function endDistances(angles: TopJoint['angles'], settings: ConnectorSettings): readonly [number, number] {
  const worst = (ends: readonly number[]) =>
    upToSixteenth(Math.max(settings.firstFromEnd, ...ends.map((f) => leastFromPoint(f, settings))));
  const back = angles.map(toRadians);
  return [worst(back), worst(back.map((f) => Math.PI - f))];
}

function subtractStretches([from, to]: Stretch, blocked: readonly Stretch[]): readonly Stretch[] {
  let free: Stretch[] = to >= from ? [[from, to]] : [];
  for (const [start, end] of blocked) {
    free = free.flatMap(([a, b]): Stretch[] => {
      if (end <= a || start >= b) return [[a, b]];
      const parts: Stretch[] = [];
      if (start >= a) parts.push([a, start]);
      if (end <= b) parts.push([end, b]);
      return parts;
    });
  }
  return free;
}

/**
 * Places in a stretch at `spacing` from both ends in. Where the inmost two stand further apart than the spacing, one more
 * goes between them; where they would run into each other, one in the middle takes their place.
 */
function setOut([from, to]: Stretch, spacing: number, apart: number): readonly number[] {
  const room = to - from;
  if (room <= 0) return [from];
  const pairs = Math.floor(room / (2 * spacing));
  const middle = room - 2 * pairs * spacing;
  const centre = from + room / 2;
  const outer = Array.from({ length: middle < apart ? pairs : pairs + 1 }, (_, i) => i * spacing);
  const between = middle < apart || middle > spacing ? [centre] : [];
  return [...outer.map((s) => from + s), ...between, ...outer.map((s) => to - s).reverse()];
}

function nearestIn(places: readonly Stretch[], at: number, limit: number): readonly number[] {
  let best: number | null = null;
  for (const [from, to] of places) {
    const candidate = Math.min(Math.max(at, from), to);
    if (best === null || Math.abs(candidate - at) < Math.abs(best - at)) best = candidate;
  }
  return best !== null && Math.abs(best - at) <= limit ? [best] : [];
}

function dropCrowded(centres: readonly number[], apart: number): readonly number[] {
  const kept: number[] = [];
  for (const centre of centres) {
    if (kept.length === 0 || centre - kept[kept.length - 1]! >= apart) kept.push(centre);
  }
  return kept;
}
