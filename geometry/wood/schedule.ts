import { makePieces, prepareSlabs, surface } from './shop-steps';
import { closeOnSite, finishOnSite, setOnSite } from './site-steps';
import type { Step } from './types';
import type { Stage, WorkInput } from './work-job';
import { jobOf } from './work-job';

/**
 * The order of work from receiving the slabs to handing over: shop first, then site.
 *
 * `step` names are unique; `after` holds the names of the steps that must be done before. Steps that a job has no use for
 * are left out, so one without joints has no glue-up. Hours of work are first guesses, hours of waiting the shop's.
 *
 * @returns no steps when there is nothing to make
 */
export function orderOfWork(input: WorkInput): readonly Step[] {
  const job = jobOf(input);
  if (job.letters.length === 0) return [];
  return chain([
    ...prepareSlabs(job),
    ...makePieces(job),
    ...surface(job),
    ...setOnSite(job),
    ...closeOnSite(job),
    ...finishOnSite(job),
  ]);
}

/** Every step follows the whole stage before it, and those of its own stage that hold one of its pieces. */
function chain(stages: readonly Stage[]): readonly Step[] {
  const steps: Step[] = [];
  const taken = new Map<string, number>();
  let before: readonly string[] = [];
  for (const stage of stages.filter((s) => s.length > 0)) {
    const drafts = stage.map((draft) => ({ ...draft, step: uniqueName(draft.step, taken) }));
    drafts.forEach((draft, i) => {
      const shared = drafts.slice(0, i).filter((other) => other.pieces.some((letter) => draft.pieces.includes(letter)));
      const after = shared.length > 0 ? shared.map((other) => other.step) : before;
      steps.push({ waitHours: 0, tools: [], consumables: [], ...draft, after });
    });
    before = drafts.map((draft) => draft.step);
  }
  return steps;
}

/** Two pieces that meet twice would give two steps of one name. */
function uniqueName(name: string, taken: Map<string, number>): string {
  const count = (taken.get(name) ?? 0) + 1;
  taken.set(name, count);
  return count === 1 ? name : `${name} (${count})`;
}
