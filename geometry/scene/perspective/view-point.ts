import type { Point } from '../../core/point';
import { dot, scale } from '../../core/vector';
import type { Plan } from '../../plan/types';
import { cameraAt, type Camera } from './camera';

/** Directions tried round the room. */
const TRIES = 24;
/** Height looked at, and how far the eye rises with its distance: high enough to look onto the tops. */
const LOOK_AT = 26;
const LEAST_EYE = 62;
const RISE = 0.4;
/** Distance of the eye before the nearest top, as a share of the width to be seen. */
const BACK = 0.62;
const LEAST_BACK = 40;

/** Where somebody would stand to see the fronts of most tops, before all of them. Axes of the plan. */
export function viewPoint(plan: Plan): Camera {
  const points = plan.pieces.filter((piece) => piece.kind !== 'strip').flatMap((piece) => [...piece.outline]);
  const forward = lineOfSight(plan);
  const right: Point = [forward[1], -forward[0]];
  const span = (axis: Point): readonly [number, number] => {
    const along = points.map((p) => dot(p, axis));
    return [Math.min(...along), Math.max(...along)];
  };
  const [[left, rightmost], [near, far]] = [span(right), span(forward)];
  const width = Math.max(rightmost - left, 24);
  const back = Math.max(width * BACK, LEAST_BACK);
  const middle = (left + rightmost) / 2;
  const place = (u: number, v: number): Point => [right[0] * u + forward[0] * v, right[1] * u + forward[1] * v];
  const [ex, ey] = place(middle, near - back);
  const [tx, ty] = place(middle, (near + far) / 2);
  return cameraAt([ex, ey, LEAST_EYE + RISE * (back + (far - near) / 2)], [tx, ty, LOOK_AT]);
}

/** A front seen askew counts for less than its share, so that a U is looked into straight and an L into its corner. */
const ASKEW = 1.5;

/** Level direction that faces most front edge and hides least; up the page where nothing has a front. */
function lineOfSight(plan: Plan): Point {
  const fronts = plan.tops.runs.map(({ back, front, backFrom, backTo }) => {
    const normal: Point = [front.origin[0] - back.origin[0], front.origin[1] - back.origin[1]];
    const size = Math.hypot(...normal) || 1;
    return { normal: scale(normal, 1 / size), length: Math.max(0, backTo - backFrom) };
  });
  let best: Point = [0, 1];
  let most = -1;
  for (let i = 0; i < TRIES; i++) {
    const angle = Math.PI / 2 + (2 * Math.PI * i) / TRIES;
    const forward: Point = [Math.cos(angle), Math.sin(angle)];
    const seen = fronts.reduce((sum, front) => {
      const facing = -dot(front.normal, forward);
      return sum + front.length * Math.sign(facing) * Math.abs(facing) ** ASKEW;
    }, 0);
    if (seen > most + 1e-6) [best, most] = [forward, seen];
  }
  return best;
}
