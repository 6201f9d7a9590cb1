import type { Point, Polygon } from '../../core/point';
import { FIT } from '../model/tolerance';
import type { NestCut } from '../types';
import type { BareCut } from './saw-cuts';

/** A part at its place, and the id it goes by. */
export interface NamedOutline {
  readonly id: string;
  readonly outline: Polygon;
}

/** Numbers the cuts of a slab and says which parts get an edge from each: on the near side those whose right or back edge it makes. */
export function nameCuts(cuts: readonly BareCut[], parts: readonly NamedOutline[]): NestCut[] {
  return cuts.map((cut, i): NestCut => {
    const near = touching(cut, parts, 'near');
    const far = touching(cut, parts, 'far');
    const pieces = [...near, ...far].map((p) => parts[p]!.id);
    const left = near[0] ?? null;
    const right = far[0] ?? null;
    return { ...cut, n: i + 1, pieces, left, right, shared: left !== null && right !== null };
  });
}

function touching(cut: BareCut, parts: readonly NamedOutline[], side: 'near' | 'far'): number[] {
  return parts.flatMap(({ outline }, index) =>
    outline.some((p, i) => isMadeBy(cut, side, p, outline[(i + 1) % outline.length]!)) ? [index] : [],
  );
}

/** An outline runs counter-clockwise: its right edges go up and its back edges go left. */
function isMadeBy(cut: BareCut, side: 'near' | 'far', p: Point, q: Point): boolean {
  const slack = 5 * FIT;
  if (cut.kind === 'rip') {
    const y = side === 'near' ? cut.across : cut.acrossFar;
    const runs = side === 'near' ? q[0] < p[0] : q[0] > p[0];
    const within = [p, q].every(([x]) => x >= cut.from - slack && x <= cut.to + slack);
    return runs && within && Math.abs(p[1] - y) <= slack && Math.abs(q[1] - y) <= slack;
  }
  const [front, back] = side === 'near' ? [cut.front, cut.back] : [cut.frontFar, cut.backFar];
  const slope = (back - front) / (cut.yBack - cut.yFront);
  const runs = side === 'near' ? q[1] > p[1] : q[1] < p[1];
  return (
    runs &&
    [p, q].every(
      ([x, y]) =>
        y >= cut.yFront - slack && y <= cut.yBack + slack && Math.abs(x - front - slope * (y - cut.yFront)) <= slack,
    )
  );
}
