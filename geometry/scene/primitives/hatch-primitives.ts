import type { Point, Polygon } from '../../core/point';
import type { DrawItem } from '../display-list';
import { pathThrough, project, type Path, type PathPrimitive, type Primitive, type View } from './primitive';
import { scanLines } from './scan-lines';

type Hatch = Extract<DrawItem, { kind: 'hatch' }>;

/** px between strokes and dots, and their thickness. */
const WASTE = { spacing: 8, width: 1 };
const DOTS = { spacing: 12, width: 2.6 };
const GRAIN = { spacing: 18, width: 0.7, dash: [17, 6] };

/** Waste strokes, dots for a face that lies down, dashes along the grain. */
export function hatchPrimitives(hatch: Hatch, view: View): Primitive[] {
  const rings = [hatch.outline, ...(hatch.holes ?? [])].map((ring) => ring.map((p) => project(view, p)));
  switch (hatch.pattern) {
    case 'waste':
      return [strokes(hatch, scanLines(rings, WASTE.spacing * view.pixel, -Math.PI / 4), WASTE.width, view)];
    case 'dots':
      return [dots(hatch, rings, view)];
    case 'grain':
      return [grainLines(rings, 0, hatch.ink, view)];
  }
}

/** Dashes along the grain; `angle` radians as the painter's x and y go. */
export function grainLines(rings: readonly Polygon[], angle: number, ink: Hatch['ink'], view: View): PathPrimitive {
  const path = scanLines(rings, GRAIN.spacing * view.pixel, angle).flatMap((stroke) => pathThrough(stroke, false));
  const dash = GRAIN.dash.map((d) => d * view.pixel);
  return { kind: 'path', path, line: { paint: ink, width: GRAIN.width * view.pixel, dash } };
}

function strokes(hatch: Hatch, lines: readonly (readonly [Point, Point])[], width: number, view: View): PathPrimitive {
  const path = lines.flatMap((line) => pathThrough(line, false));
  return { kind: 'path', path, line: { paint: hatch.ink, width: width * view.pixel } };
}

/** A dot is a dash of no length with round ends: a thousand of them cost one path. */
function dots(hatch: Hatch, rings: readonly Polygon[], view: View): PathPrimitive {
  const pitch = DOTS.spacing * view.pixel;
  const inset = DOTS.width * view.pixel * 0.8;
  const path: Path = scanLines(rings, pitch, 0).flatMap(([from, to]) => {
    const stagger = Math.round(from[1] / pitch) % 2 === 0 ? 0 : pitch / 2;
    const first = Math.ceil((from[0] + inset - stagger) / pitch) * pitch + stagger;
    return first > to[0] - inset ? [] : pathThrough([[first, from[1]], [to[0] - inset, to[1]]], false); // prettier-ignore
  });
  return {
    kind: 'path',
    path,
    line: {
      paint: hatch.ink,
      width: DOTS.width * view.pixel,
      dash: [0.01 * view.pixel, pitch - 0.01 * view.pixel],
      round: true,
    },
  };
}
