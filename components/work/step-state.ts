import type { WorkStep } from '@/geometry/wood/arrange-work';
import type { WorkMark, WorkMarks } from '@/shared/work/work-marks';

/** How a step stands for whoever wants to do it. */
export type StepState =
  | { readonly kind: 'done'; readonly mark: WorkMark }
  | { readonly kind: 'skipped'; readonly reason: string }
  /** What it needs is done and ready. */
  | { readonly kind: 'next' }
  /** Something before it still cures or dries. */
  | { readonly kind: 'curing'; readonly behind: WorkStep; readonly until: string }
  | { readonly kind: 'waits'; readonly behind: WorkStep };

/**
 * State of one step. A step that is left out holds nobody up; one that was ticked holds up what follows until its glue or
 * finish is ready.
 */
export function stepState(step: WorkStep, all: readonly WorkStep[], marks: WorkMarks, now: number): StepState {
  const mark = marks[step.key];
  if (mark?.doneAt) return { kind: 'done', mark };
  if (step.skipped !== null) return { kind: 'skipped', reason: step.skipped };
  const before = all.filter((one) => step.needs.includes(one.key) && one.skipped === null);
  const open = before.findLast((one) => !marks[one.key]?.doneAt);
  if (open) return { kind: 'waits', behind: open };
  for (const one of before) {
    const { doneAt, readyAt: ready } = marks[one.key] ?? {};
    // Without a wait it is ready by being done, whatever the clock of the page last said.
    if (ready && ready !== doneAt && Date.parse(ready) > now) return { kind: 'curing', behind: one, until: ready };
  }
  return { kind: 'next' };
}

/** "5 of 16 done", counting neither what is left out. */
export function doneCount(
  steps: readonly WorkStep[],
  marks: WorkMarks,
): { readonly done: number; readonly of: number } {
  const counted = steps.filter((step) => step.skipped === null || marks[step.key]?.doneAt);
  return { done: counted.filter((step) => marks[step.key]?.doneAt).length, of: counted.length };
}
