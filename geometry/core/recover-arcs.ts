import { circlePathOf, type ArcPath, type PathVertex } from './arc-path';
import { CHORD_ERROR } from './arc';
import type { Point, Polygon } from './point';
import { cross, distance, dot, subtract } from './vector';

/** Inches: points that were put on a circle lie closer to it than this. */
const ON_CIRCLE = 1e-6;

/**
 * Finds the arcs again in an outline whose arcs of one known radius were flattened to chords (`arcPoints`). Where a cut
 * ends an arc between two of its points, the rest of that chord stays a line, at most `CHORD_ERROR` off the arc.
 *
 * @param radius - of the arcs, inches; 0 leaves the outline as it is
 */
export function recoverArcs(outline: Polygon, radius: number): ArcPath {
  const n = outline.length;
  const centres = radius > 0 && n >= 3 ? outline.map((_, i) => centreAt(outline, i, radius)) : [];
  // A chord belongs to an arc when one of its ends lies in the middle of three points on one circle.
  const chords = outline.map((_, i) => centres[i] ?? centres[(i + 1) % n] ?? null);
  if (chords.every((centre) => centre !== null && same(centre, chords[0]!))) return circlePathOf(chords[0]!, radius);
  const start = Math.max(
    0,
    chords.findIndex((centre, i) => !same(centre, chords[(i + n - 1) % n] ?? null)),
  );
  const vertices: PathVertex[] = [];
  for (let k = 0; k < n;) {
    const i = (start + k) % n;
    const centre = chords[i] ?? null;
    let count = 1;
    while (centre && k + count < n && same(centre, chords[(i + count) % n] ?? null)) count++;
    const from = outline[i]!;
    vertices.push(...(centre ? arcVertices(from, outline[(i + count) % n]!, centre) : [{ at: from, bulge: 0 }]));
    k += count;
  }
  return { vertices, closed: true };
}

/** Centre of the circle of this radius through a point and its two neighbours, or null when they lie on none. */
function centreAt(outline: Polygon, i: number, radius: number): Point | null {
  const n = outline.length;
  const [a, b, c] = [outline[(i + n - 1) % n]!, outline[i]!, outline[(i + 1) % n]!];
  const longest = 2 * Math.sqrt(2 * radius * CHORD_ERROR) * 1.001;
  if (distance(a, b) > longest || distance(b, c) > longest) return null;
  const [ab, ac] = [subtract(b, a), subtract(c, a)];
  const twice = 2 * cross(ab, ac);
  // Outlines run counter-clockwise: round corners of holes and pieces turn to the left.
  if (twice < 1e-12) return null;
  const [p, q] = [dot(ab, ab), dot(ac, ac)];
  const centre: Point = [a[0] + (ac[1] * p - ab[1] * q) / twice, a[1] + (ab[0] * q - ac[0] * p) / twice];
  return Math.abs(distance(centre, a) - radius) < ON_CIRCLE ? centre : null;
}

const same = (a: Point | null, b: Point | null): boolean => (a && b ? distance(a, b) < 10 * ON_CIRCLE : a === b);

/** One arc, cut in two where it is more than half a turn, since a bulge says no more. */
function arcVertices(from: Point, to: Point, centre: Point): PathVertex[] {
  const [u, v] = [subtract(from, centre), subtract(to, centre)];
  const short = Math.atan2(cross(u, v), dot(u, v));
  const sweep = short < 0 ? short + 2 * Math.PI : short;
  if (sweep <= Math.PI) return [{ at: from, bulge: Math.tan(sweep / 4) }];
  const half = Math.atan2(u[1], u[0]) + sweep / 2;
  const r = Math.hypot(u[0], u[1]);
  const middle: Point = [centre[0] + r * Math.cos(half), centre[1] + r * Math.sin(half)];
  const bulge = Math.tan(sweep / 8);
  return [
    { at: from, bulge },
    { at: middle, bulge },
  ];
}
