import type { Point } from '../../core/point';
import { distance } from '../../core/vector';
import type { DrawItem, Stroke } from '../display-list';
import { badgePrimitives, bladePrimitives } from './blade-primitives';
import { hatchPrimitives } from './hatch-primitives';
import { markPrimitives } from './mark-primitives';
import {
  arcPath,
  outlinePath,
  pathThrough,
  project,
  type Path,
  type PathPrimitive,
  type Primitive,
  type View,
} from './primitive';
import { boardPrimitives, facetPrimitives } from './picture-primitives';
import { stavePrimitives } from './stave-primitives';
import { textPrimitives } from './text-primitives';

/** px that the casing under a line is wider than it. */
const CASING = 4;

/**
 * One item of a drawing as paths and text in the painter's plane.
 *
 * @returns in the order of painting
 */
export function toPrimitives(item: DrawItem, view: View): Primitive[] {
  switch (item.kind) {
    case 'line':
      return stroked(pathThrough([project(view, item.from), project(view, item.to)], false), item.stroke, view);
    case 'polyline':
      return stroked(pathThrough(item.points.map((p) => project(view, p)), false), item.stroke, view); // prettier-ignore
    case 'arc':
      return stroked(
        arcPath(project(view, item.centre), item.radius * view.pxPerInch, item.start, item.end),
        item.stroke,
        view,
      );
    case 'polygon':
      return polygonPrimitives(item, view);
    case 'staves':
      return stavePrimitives(item, view);
    case 'boards':
      return boardPrimitives(item, view);
    case 'facet':
      return facetPrimitives(item, view);
    case 'hatch':
      return hatchPrimitives(item, view);
    case 'text':
      return textPrimitives(item, [{ text: item.text }], item.style, view, item);
    case 'length':
      return textPrimitives(item, [{ inches: item.inches, step: item.step, unit: item.unit }], item.style, view);
    case 'runs':
      return textPrimitives(item, item.runs, item.style, view, item);
    case 'blade':
      return bladePrimitives(item, view);
    case 'badge':
      return badgePrimitives(item, view);
    case 'dimension':
      return dimensionPrimitives(item, view);
    case 'mark':
      return markPrimitives(item, view);
  }
}

function stroked(path: Path, stroke: Stroke, view: View): PathPrimitive[] {
  const line = {
    paint: stroke.ink,
    width: stroke.width * view.pixel,
    ...(stroke.dash ? { dash: stroke.dash.map((d) => d * view.pixel) } : {}),
  };
  const drawn: PathPrimitive = { kind: 'path', path, line };
  if (!stroke.casing) return [drawn];
  return [{ kind: 'path', path, line: { paint: 'paper', width: (stroke.width + CASING) * view.pixel } }, drawn];
}

function polygonPrimitives(item: Extract<DrawItem, { kind: 'polygon' }>, view: View): Primitive[] {
  const path = outlinePath(view, item.outline, item.holes);
  const evenOdd = item.holes && item.holes.length > 0 ? { evenOdd: true } : {};
  const fill: Primitive[] = item.fill ? [{ kind: 'path', path, fill: item.fill, ...evenOdd }] : [];
  return item.stroke ? [...fill, ...stroked(path, item.stroke, view)] : fill;
}

/** px that a dimension's end ticks reach to either side. */
const TICK = 5;

function dimensionPrimitives(item: Extract<DrawItem, { kind: 'dimension' }>, view: View): Primitive[] {
  const span = distance(item.from, item.to);
  if (span === 0) return [];
  const dir: Point = [(item.to[0] - item.from[0]) / span, (item.to[1] - item.from[1]) / span];
  const shift: Point = [-dir[1] * item.offset, dir[0] * item.offset];
  const end = (p: Point, out: number) => project(view, p, [shift[0] - dir[1] * out, shift[1] + dir[0] * out]);
  const ticks = [item.from, item.to].flatMap((p) => pathThrough([end(p, -TICK), end(p, TICK)], false));
  const path = [...pathThrough([end(item.from, 0), end(item.to, 0)], false), ...ticks];
  const middle: Point = [(item.from[0] + item.to[0]) / 2, (item.from[1] + item.to[1]) / 2];
  const angle = Math.atan2(dir[1], dir[0]);
  const turn = Math.abs(angle) > (100 * Math.PI) / 180 ? angle + Math.PI : angle;
  const label = textPrimitives(
    { at: middle, anchor: 'middle', middle: true, shift, turn, ground: 'paper' },
    [{ inches: item.inches, step: item.step }],
    item.style,
    view,
  );
  return [{ kind: 'path', path, line: { paint: item.style.ink, width: 1.2 * view.pixel } }, ...label];
}
