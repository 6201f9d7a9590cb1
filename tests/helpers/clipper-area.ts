import type { Polygon } from '@/geometry/core/point';

interface IntPoint {
  readonly X: number;
  readonly Y: number;
}
type Paths = IntPoint[][];
interface ClipperLib {
  readonly Clipper: {
    new (): {
      AddPaths(paths: Paths, type: number, closed: boolean): void;
      Execute(kind: number, solution: Paths, subject: number, clip: number): boolean;
    };
    Area(path: IntPoint[]): number;
  };
  readonly Paths: new () => Paths;
  readonly ClipType: {
    readonly ctIntersection: number;
    readonly ctUnion: number;
    readonly ctDifference: number;
    readonly ctXor: number;
  };
  readonly PolyType: { readonly ptSubject: number; readonly ptClip: number };
  readonly PolyFillType: { readonly pftNonZero: number };
}
// eslint-disable-next-line @typescript-eslint/no-require-imports -- the package brings no types and no ES module
const lib = require('clipper-lib') as ClipperLib;

/** Grid of the integer clipper, inches: a corner moves by at most half of it. */
const GRID = 1e-6;

const toPath = (polygon: Polygon) => polygon.map(([x, y]) => ({ X: Math.round(x / GRID), Y: Math.round(y / GRID) }));

function combine(kind: number, subject: readonly Polygon[], clip: readonly Polygon[]): number {
  const clipper = new lib.Clipper();
  clipper.AddPaths(subject.map(toPath), lib.PolyType.ptSubject, true);
  if (clip.length > 0) clipper.AddPaths(clip.map(toPath), lib.PolyType.ptClip, true);
  const solution = new lib.Paths();
  clipper.Execute(kind, solution, lib.PolyFillType.pftNonZero, lib.PolyFillType.pftNonZero);
  // Holes come clockwise, so their areas subtract.
  return solution.reduce((sum, path) => sum + lib.Clipper.Area(path), 0) * GRID * GRID;
}

/** Areas by an independent clipper (clipper-lib, Vatti's algorithm on integers), square inches. */
export const unionArea = (polygons: readonly Polygon[]): number => combine(lib.ClipType.ctUnion, polygons, []);
export const sharedArea = (a: readonly Polygon[], b: readonly Polygon[]): number =>
  combine(lib.ClipType.ctIntersection, a, b);
export const differenceArea = (a: readonly Polygon[], b: readonly Polygon[]): number =>
  combine(lib.ClipType.ctDifference, a, b);
export const xorArea = (a: readonly Polygon[], b: readonly Polygon[]): number => combine(lib.ClipType.ctXor, a, b);
