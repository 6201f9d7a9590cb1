/** What somebody did with a step of the order of work. 'undo' takes back the tick, or the start of a step not ticked. */
export type WorkDeed = 'start' | 'done' | 'undo';

/** One deed as it is kept: a name for the step, who and when. */
export interface WorkAct {
  readonly id: string;
  /** Name of the step in the order of work, or the id of a step somebody added. */
  readonly step: string;
  readonly act: WorkDeed;
  /** ISO */
  readonly at: string;
  /** Hours that glue or finish needs after the step. */
  readonly waitHours: number;
  readonly by: string;
}

/** How a step stands. Times ISO. */
export interface WorkMark {
  readonly step: string;
  readonly startedAt: string | null;
  readonly startedBy: string | null;
  readonly doneAt: string | null;
  readonly doneBy: string | null;
  /** When what follows may begin: the glue has cured, the coat is dry. */
  readonly readyAt: string | null;
}

export type WorkMarks = Readonly<Record<string, WorkMark>>;

const HOUR_MS = 3_600_000;

const later = (at: string, hours: number): string => new Date(Date.parse(at) + hours * HOUR_MS).toISOString();

const untouched = (step: string): WorkMark => ({
  step,
  startedAt: null,
  startedBy: null,
  doneAt: null,
  doneBy: null,
  readyAt: null,
});

/** The step after one more deed; null when nothing is left of it. Whoever ticked first stays named. */
function afterAct(mark: WorkMark, { act, at, by, waitHours }: WorkAct): WorkMark | null {
  switch (act) {
    case 'start':
      return mark.startedAt === null && mark.doneAt === null ? { ...mark, startedAt: at, startedBy: by } : mark;
    case 'done':
      return mark.doneAt === null ? { ...mark, doneAt: at, doneBy: by, readyAt: later(at, waitHours) } : mark;
    case 'undo':
      if (mark.doneAt === null || mark.startedAt === null) return null;
      return { ...mark, doneAt: null, doneBy: null, readyAt: null };
  }
}

/** How all steps stand after these deeds, in their order, on top of what stood before. */
export function marksAfter(acts: readonly WorkAct[], before: WorkMarks = {}): WorkMarks {
  const marks: Record<string, WorkMark> = { ...before };
  for (const act of acts) {
    const next = afterAct(marks[act.step] ?? untouched(act.step), act);
    if (next && (next.startedAt !== null || next.doneAt !== null)) marks[act.step] = next;
    else delete marks[act.step];
  }
  return marks;
}
