import polygonClipping from 'polygon-clipping';
import type { Point, Polygon } from '../core/point';
import { counterClockwise, signedArea } from '../core/polygon';

/** Slivers smaller than this come from rounding, square inches. */
const SLIVER = 1e-7;

type Pairs = [number, number][];
const ring = (polygon: Polygon): Pairs => polygon.map(([x, y]) => [x, y]);

/** Parts of `a` that lie inside `b`, counter-clockwise, holes left out (neither outline may have any). */
export function intersection(a: Polygon, b: Polygon): readonly Polygon[] {
  return outers(polygonClipping.intersection([ring(a)], [ring(b)]));
}

function outers(parts: [number, number][][][]): readonly Polygon[] {
  return parts
    .map(([outline]) => counterClockwise(open(outline ?? [])))
    .filter((outline) => signedArea(outline) > SLIVER);
}

/** The package repeats the first point at the end. */
const open = (closed: Pairs): readonly Point[] => closed.slice(0, -1);
