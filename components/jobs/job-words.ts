import type { JobListItem } from '@/shared/contracts/jobs';
import { STAGE_NAMES, type Stage as StageKey } from '@/shared/roles/stages';
import type { Stage as StageWord } from '../ui/StageChip';

/** Job numbers are written with four digits, as on the paper. */
export const jobNumber = (number: number): string => `Job ${String(number).padStart(4, '0')}`;

export const stageWord = (stage: StageKey): StageWord => STAGE_NAMES[stage] as StageWord;

/** What the next date is for. */
const NEXT: Readonly<Record<StageKey, string>> = {
  new: 'Measure',
  measured: 'Cut',
  drawn: 'Cut',
  signed_off: 'Cut',
  cut: 'Fit',
  fitted: 'Fitted',
};

/** "Cut Fri, 15 May", or '' when no date is set. */
export function nextDate(job: Pick<JobListItem, 'stage' | 'nextOn'>): string {
  if (!job.nextOn) return '';
  return `${NEXT[job.stage]} ${dayWords(job.nextOn)}`;
}

/** "Fri, May 15" of a plain date, in the reader's own language order; the same in every time zone. */
export function dayWords(day: string): string {
  return new Date(`${day}T12:00:00Z`).toLocaleDateString(undefined, {
    weekday: 'short',
    day: 'numeric',
    month: 'short',
    timeZone: 'UTC',
  });
}

/** First names on the job, installer first; the whole name stands in the job. */
export function people(job: Pick<JobListItem, 'installer' | 'designer' | 'shopHand'>): string {
  const names = [job.installer, job.designer, job.shopHand].flatMap((person) =>
    person ? [person.name.split(' ')[0]!] : [],
  );
  return [...new Set(names)].join(', ');
}

/** What somebody has to look at, or ''. */
export function toLookAt(job: Pick<JobListItem, 'changedSince' | 'revision' | 'sentForCheckAt' | 'stage'>): string {
  if (job.changedSince && job.revision !== null) return `Changed since revision ${job.revision}`;
  if (job.sentForCheckAt && job.stage === 'drawn') return 'Sent for check';
  return '';
}
