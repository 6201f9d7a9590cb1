import type { Point, Polygon } from '../../core/point';
import { counterClockwise } from '../../core/polygon';
import { cross, distance, subtract } from '../../core/vector';
import type { DrawItem, Surface } from '../display-list';
import { seeOutline, type Camera, type Place } from './camera';

/** An upright side of something, its outline from the lower left, seen from outside. */
export interface Side {
  readonly from: Point;
  readonly to: Point;
  readonly outline: readonly Place[];
  readonly light: number;
}

/** Level direction the light comes from, and how bright the darkest side is. */
const LIGHT: Point = [-0.5, -0.87];
const DARKEST = 0.15;

/** How light a side is whose outward normal is given (unit). */
export const lightOn = (normal: Point): number =>
  DARKEST + (1 - DARKEST) * (0.5 + 0.5 * (normal[0] * LIGHT[0] + normal[1] * LIGHT[1]));

/** The upright sides between two heights that face the eye. */
export function sidesSeen(camera: Camera, footprint: Polygon, bottom: number, top: number): Side[] {
  const outline = counterClockwise(footprint);
  const eye: Point = [camera.eye[0], camera.eye[1]];
  return outline.flatMap((from, i): Side[] => {
    const to = outline[(i + 1) % outline.length]!;
    const length = distance(from, to);
    if (length < 1e-6 || cross(subtract(to, from), subtract(eye, from)) >= 0) return [];
    const normal: Point = [(to[1] - from[1]) / length, (from[0] - to[0]) / length];
    return [{ from, to, outline: upright(from, to, bottom, top), light: lightOn(normal) }];
  });
}

/** The upright rectangle over a line on the floor. */
export const upright = (from: Point, to: Point, bottom: number, top: number): Place[] => [
  [from[0], from[1], bottom],
  [to[0], to[1], bottom],
  [to[0], to[1], top],
  [from[0], from[1], top],
];

export interface FacetLook {
  readonly surface: Surface;
  readonly light: number;
  readonly species?: string;
  readonly id?: string;
  readonly layer: DrawItem['layer'];
}

/** A flat side as it is seen; nothing when it lies behind the eye. */
export function facet(camera: Camera, outline: readonly Place[], look: FacetLook): DrawItem[] {
  const seen = seeOutline(camera, outline);
  if (seen.length < 3) return [];
  const { id, ...rest } = look;
  return [{ kind: 'facet', outline: seen, ...rest, ...(id === undefined ? {} : { id }) }];
}
