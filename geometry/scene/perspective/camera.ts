import type { Point, Polygon } from '../../core/point';

/** A place in the room: plan axes and height over the floor, inches. */
export type Place = readonly [number, number, number];

/** An eye in the room. Its picture is drawn in inches of its own plane, y up. */
export interface Camera {
  readonly eye: Place;
  readonly right: Place;
  readonly up: Place;
  readonly forward: Place;
}

/** What lies nearer to the eye than this is cut off, inches. */
const NEAR = 16;
/** Size of the picture: a length this far away, inches, keeps its size in it. */
const PLANE = 100;

/** An eye at one place that looks at another; they do not stand over each other. */
export function cameraAt(eye: Place, target: Place): Camera {
  const forward = unit3(minus(target, eye));
  const right = unit3(cross3(forward, [0, 0, 1]));
  return { eye, forward, right, up: cross3(right, forward) };
}

/** Inches before the eye, along its line of sight. */
export const depthOf = (camera: Camera, place: Place): number => dot3(minus(place, camera.eye), camera.forward);

/** Where a place before the eye is seen. */
export function see(camera: Camera, place: Place): Point {
  const from = minus(place, camera.eye);
  const k = PLANE / Math.max(dot3(from, camera.forward), NEAR);
  return [dot3(from, camera.right) * k, dot3(from, camera.up) * k];
}

/** The picture of a flat outline, less what lies behind the eye; fewer than three points when nothing is left. */
export function seeOutline(camera: Camera, outline: readonly Place[]): Polygon {
  const kept: Place[] = [];
  outline.forEach((p, i) => {
    const q = outline[(i + 1) % outline.length]!;
    const [a, b] = [depthOf(camera, p) - NEAR, depthOf(camera, q) - NEAR];
    if (a >= 0) kept.push(p);
    if (a >= 0 !== b >= 0) kept.push(between(p, q, a / (a - b)));
  });
  return kept.map((place) => see(camera, place));
}

/** A flat outline at one height. */
export const atHeight = (outline: Polygon, z: number): Place[] => outline.map(([x, y]): Place => [x, y, z]);

const between = (a: Place, b: Place, t: number): Place => [
  a[0] + (b[0] - a[0]) * t,
  a[1] + (b[1] - a[1]) * t,
  a[2] + (b[2] - a[2]) * t,
];
const minus = (a: Place, b: Place): Place => [a[0] - b[0], a[1] - b[1], a[2] - b[2]];
const dot3 = (a: Place, b: Place): number => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
const cross3 = (a: Place, b: Place): Place => [
  a[1] * b[2] - a[2] * b[1],
  a[2] * b[0] - a[0] * b[2],
  a[0] * b[1] - a[1] * b[0],
];
function unit3(a: Place): Place {
  const length = Math.hypot(...a);
  return [a[0] / length, a[1] / length, a[2] / length];
}
