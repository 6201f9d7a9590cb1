import type { Point } from '@/geometry/core/point';

/**
 * Where the drawing lies on the screen: the only place that knows both inches and pixels.
 * Screen points are px from the canvas's top left, y down; world points are inches, y up.
 */
export interface Viewport {
  /** Screen px per inch. */
  readonly scale: number;
  /** Screen px of the world's origin. */
  readonly x: number;
  readonly y: number;
}

/** px from the canvas's top left, y down. */
export type ScreenPoint = readonly [number, number];

export interface Size {
  readonly width: number;
  readonly height: number;
}

/** px kept free at each side, for badges, bars and a sheet at the foot. */
export interface Insets {
  readonly top: number;
  readonly right: number;
  readonly bottom: number;
  readonly left: number;
}

export interface Bounds {
  readonly minX: number;
  readonly minY: number;
  readonly maxX: number;
  readonly maxY: number;
}

/** Zoom against the fitted scale. */
export const ZOOM = { least: 0.5, most: 8 } as const;

/** Inches; a drawing of a single point still gets a room around it. */
const LEAST_EXTENT = 1;

export const toScreen = (view: Viewport, [x, y]: Point): ScreenPoint => [
  view.x + x * view.scale,
  view.y - y * view.scale,
];

export const toWorld = (view: Viewport, [x, y]: ScreenPoint): Point => [
  (x - view.x) / view.scale,
  (view.y - y) / view.scale,
];

/** A length on the screen in inches of the drawing. */
export const pxToInches = (view: Viewport, px: number): number => px / view.scale;

/**
 * The view that shows all of a drawing, in the middle of what the insets leave.
 *
 * @param bounds - inches
 * @param size - of the canvas, px
 * @param insets - px; where they leave nothing, the whole canvas is used
 */
export function fitView(bounds: Bounds, size: Size, insets: Insets): Viewport {
  const room = roomIn(size, insets);
  const wide = Math.max(bounds.maxX - bounds.minX, LEAST_EXTENT);
  const high = Math.max(bounds.maxY - bounds.minY, LEAST_EXTENT);
  const scale = Math.min(room.width / wide, room.height / high);
  const middle: Point = [(bounds.minX + bounds.maxX) / 2, (bounds.minY + bounds.maxY) / 2];
  return placeAt({ scale, x: 0, y: 0 }, middle, [room.left + room.width / 2, room.top + room.height / 2]);
}

/** The same scale, moved so that a world point lies under a screen point. */
export function placeAt(view: Viewport, world: Point, screen: ScreenPoint): Viewport {
  return { scale: view.scale, x: screen[0] - world[0] * view.scale, y: screen[1] + world[1] * view.scale };
}

/** The same scale, with a world point in the middle of what the insets leave (a selection over a bottom sheet). */
export function centreOn(view: Viewport, world: Point, size: Size, insets: Insets): Viewport {
  const room = roomIn(size, insets);
  return placeAt(view, world, [room.left + room.width / 2, room.top + room.height / 2]);
}

/** Moved by px. */
export const panView = (view: Viewport, dx: number, dy: number): Viewport => ({
  ...view,
  x: view.x + dx,
  y: view.y + dy,
});

/**
 * Zoomed about a screen point: what lies under it stays there. The scale is held between 0.5 and 8 times the fitted one.
 *
 * @param factor - over 1 zooms in
 * @param fitScale - px per inch of the fitted view
 */
export function zoomAbout(view: Viewport, at: ScreenPoint, factor: number, fitScale: number): Viewport {
  const scale = clampScale(view.scale * factor, fitScale);
  return placeAt({ ...view, scale }, toWorld(view, at), at);
}

/**
 * Two fingers: the world points first touched stay under the fingers' middle, and the scale follows their distance.
 *
 * @param start - the view when the second finger came down
 * @param from - both fingers then, px
 * @param to - both fingers now, px
 */
export function pinchView(
  start: Viewport,
  from: readonly [ScreenPoint, ScreenPoint],
  to: readonly [ScreenPoint, ScreenPoint],
  fitScale: number,
): Viewport {
  const apart = distance(...from);
  // Both fingers on one spot say nothing about a scale.
  const factor = apart === 0 ? 1 : distance(...to) / apart;
  const scale = clampScale(start.scale * factor, fitScale);
  return placeAt({ ...start, scale }, toWorld(start, midpoint(...from)), midpoint(...to));
}

/** How much one notch or glide of a wheel zooms: about 1.2 for a mouse notch of 100. */
export function wheelFactor(deltaY: number, deltaMode: number): number {
  const px = deltaMode === 1 ? deltaY * 16 : deltaMode === 2 ? deltaY * 400 : deltaY;
  return Math.exp(-Math.max(-400, Math.min(400, px)) * 0.0018);
}

/**
 * The SVG transform of a group painted about (0, 0), y up turned to y down, at `paintedScale` px per inch, so that it lies as
 * `now` says. A pan changes only this; a zoom stretches what is painted until it is painted anew.
 */
export function groupTransform(paintedScale: number, now: Viewport): string {
  const k = now.scale / paintedScale;
  return `matrix(${k} 0 0 ${k} ${now.x} ${now.y})`;
}

export const distance = (a: ScreenPoint, b: ScreenPoint): number => Math.hypot(a[0] - b[0], a[1] - b[1]);

export const midpoint = (a: ScreenPoint, b: ScreenPoint): ScreenPoint => [(a[0] + b[0]) / 2, (a[1] + b[1]) / 2];

const clampScale = (scale: number, fitScale: number): number =>
  Math.min(ZOOM.most * fitScale, Math.max(ZOOM.least * fitScale, scale));

function roomIn(size: Size, insets: Insets): Size & { readonly left: number; readonly top: number } {
  const width = size.width - insets.left - insets.right;
  const height = size.height - insets.top - insets.bottom;
  const fits = width > 0 && height > 0;
  return fits
    ? { left: insets.left, top: insets.top, width, height }
    : { left: 0, top: 0, width: Math.max(size.width, 1), height: Math.max(size.height, 1) };
}
