import type { Point, Polygon } from '../../core/point';

/** Shortest stroke worth painting, in the painter's unit. */
const SHORTEST = 0.5;

/**
 * Parallel strokes that fill rings (even-odd, so inner rings are holes).
 *
 * @param rings - painter's plane
 * @param spacing - between strokes
 * @param angle - radians, direction of the strokes as the painter's x and y go
 * @returns from-to pairs; strokes of neighbouring shapes lie on the same lines
 */
export function scanLines(rings: readonly Polygon[], spacing: number, angle: number): (readonly [Point, Point])[] {
  const c = Math.cos(angle);
  const s = Math.sin(angle);
  const edges = rings.flatMap((ring) => edgesOf(ring.map(([x, y]): Point => [x * c + y * s, y * c - x * s])));
  const heights = edges.flatMap(([a, b]) => [a[1], b[1]]);
  const strokes: (readonly [Point, Point])[] = [];
  const last = Math.max(...heights);
  for (let row = Math.ceil(Math.min(...heights) / spacing); row * spacing < last; row++) {
    const y = row * spacing;
    const crossings = edges
      .filter(([a, b]) => a[1] > y !== b[1] > y)
      .map(([a, b]) => a[0] + ((y - a[1]) * (b[0] - a[0])) / (b[1] - a[1]))
      .sort((p, q) => p - q);
    for (let i = 0; i + 1 < crossings.length; i += 2) {
      const [from, to] = [crossings[i]!, crossings[i + 1]!];
      if (to - from < SHORTEST) continue;
      strokes.push([
        [from * c - y * s, from * s + y * c],
        [to * c - y * s, to * s + y * c],
      ]);
    }
  }
  return strokes;
}

function edgesOf(ring: Polygon): (readonly [Point, Point])[] {
  return ring.map((p, i) => [p, ring[(i + 1) % ring.length]!]);
}
