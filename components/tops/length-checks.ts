import type { Layout, Run } from '@/geometry/core/layout';
import type { Plan } from '@/geometry/plan/types';
import { inches as say } from '@/geometry/top/sentence';
import { wallName } from './tops-choice';

/** A run may be drawn this far past its wall before it counts, inches; the engine allows the same. */
const SLACK = 1 / 16;

/** A length that has to be there. */
export const someLength =
  (what: string) =>
  (value: number): string | null =>
    value > 0 ? null : `${what} has to be more than nothing.`;

/** Inches of a wall as the fit left it; null while the room is not known. */
export function wallLength(plan: Plan, wall: string): number | null {
  return plan.room?.walls.find((w) => w.id === wall)?.adjusted ?? null;
}

/** Why a run cannot begin or end there, or null. */
export function runPlaceProblem(
  run: Run,
  place: { readonly from?: number; readonly to?: number },
  plan: Plan,
  layout: Layout,
): string | null {
  const length = wallLength(plan, run.wall);
  const from = place.from ?? run.from;
  const end = run.to === 'end' ? (length ?? Infinity) : run.to;
  const to = place.to ?? end;
  if (to <= from)
    return `The run has no length: it would go from ${say(from, layout.step)} to ${say(to, layout.step)}.`;
  if (length !== null && to > length + SLACK)
    return `Wall ${wallName(layout, run.wall)} is ${say(length, layout.step)} long; the run would go ${say(to - length, layout.step)} past its end.`;
  return null;
}

/** Why a cutout cannot have this size or place on its top, or null. Its strips are the engine's to judge. */
export function cutoutPlaceProblem(
  layout: Layout,
  on: string,
  cutout: { readonly setback: number; readonly depth: number; readonly mount?: string; readonly kind: string },
): string | null {
  const top = [...layout.runs, ...layout.islands].find((t) => t.id === on);
  if (!top) return null;
  if (cutout.kind === 'notch' || cutout.kind === 'free' || cutout.mount === 'apron') return null;
  const past = cutout.setback + cutout.depth - top.depth;
  return past > 0
    ? `The top is ${say(top.depth, layout.step)} deep; the cutout would reach ${say(past, layout.step)} past its back edge.`
    : null;
}
