import type { Role } from './roles';

/** The way a job goes, in order. */
export const STAGES = ['new', 'measured', 'drawn', 'signed_off', 'cut', 'fitted'] as const;

export type Stage = (typeof STAGES)[number];

export const STAGE_NAMES: Readonly<Record<Stage, string>> = {
  new: 'New',
  measured: 'Measured',
  drawn: 'Drawn',
  signed_off: 'Signed off',
  cut: 'Cut',
  fitted: 'Fitted',
};

/** Who sets a stage, and who may take it back. */
export const STAGE_SETTERS: Readonly<Record<Stage, readonly Role[]>> = {
  new: ['owner', 'designer', 'installer'],
  measured: ['owner', 'designer', 'installer'],
  drawn: ['owner', 'designer', 'installer'],
  signed_off: ['owner', 'designer'],
  cut: ['owner', 'shop_hand'],
  fitted: ['owner', 'installer'],
};

export type StageMove =
  | { readonly kind: 'allowed' }
  | { readonly kind: 'not_allowed' }
  /** `reason` is a sentence for the person who tried. */
  | { readonly kind: 'refused'; readonly reason: string };

/**
 * Whether a person may move a job from one stage to another. Forward goes one stage at a time, and to Signed off only by
 * signing a revision; back goes any number of stages, by those who may set the stage the job is in.
 */
export function stageMove(role: Role, from: Stage, to: Stage): StageMove {
  const steps = STAGES.indexOf(to) - STAGES.indexOf(from);
  if (steps === 0) return { kind: 'refused', reason: `The job is in ${STAGE_NAMES[to]} already.` };
  if (steps < 0) return STAGE_SETTERS[from].includes(role) ? { kind: 'allowed' } : { kind: 'not_allowed' };
  if (!STAGE_SETTERS[to].includes(role)) return { kind: 'not_allowed' };
  if (to === 'signed_off') return { kind: 'refused', reason: 'Sign a revision off; the job then moves by itself.' };
  if (steps > 1) {
    const next = STAGES[STAGES.indexOf(from) + 1] as Stage;
    return { kind: 'refused', reason: `The job is in ${STAGE_NAMES[from]}; the next stage is ${STAGE_NAMES[next]}.` };
  }
  return { kind: 'allowed' };
}

/** The stages this person may move the job to now, for the menu that offers them. */
export function possibleStages(role: Role, from: Stage): Stage[] {
  return STAGES.filter((to) => stageMove(role, from, to).kind === 'allowed');
}
