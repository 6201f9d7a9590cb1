import type { Job, JobListItem, Thumbnail } from '@/shared/contracts/jobs';
import type { Stage } from '@/shared/roles/stages';
import type { JobRecord } from '../repositories/job-repository';

export function toListItem(job: JobRecord): JobListItem {
  return { ...common(job), thumbnail: (job.thumbnail ?? null) as Thumbnail | null };
}

export function toJob(job: JobRecord): Job {
  return {
    ...common(job),
    layoutId: job.layoutId,
    customerEmail: job.customerEmail,
    customerPhone: job.customerPhone,
    measureOn: job.measureOn,
    cutOn: job.cutOn,
    fitOn: job.fitOn,
    createdAt: job.createdAt.toISOString(),
  };
}

function common(job: JobRecord) {
  return {
    id: job.id,
    number: job.number,
    name: job.name,
    customerName: job.customerName,
    siteAddress: job.siteAddress,
    stage: job.stage,
    sentForCheckAt: job.sentForCheckAt?.toISOString() ?? null,
    nextOn: nextDate(job),
    installer: job.installer,
    designer: job.designer,
    shopHand: job.shopHand,
    revision: job.revision,
    signedOff: job.signedOff,
    changedSince: job.revisionSeq !== null && job.layoutSeq > job.revisionSeq,
    updatedAt: job.updatedAt.toISOString(),
  };
}

/** Which dates are still ahead in each stage, the nearest first. */
const AHEAD: Readonly<Record<Stage, readonly ('measureOn' | 'cutOn' | 'fitOn')[]>> = {
  new: ['measureOn', 'cutOn', 'fitOn'],
  measured: ['cutOn', 'fitOn'],
  drawn: ['cutOn', 'fitOn'],
  signed_off: ['cutOn', 'fitOn'],
  cut: ['fitOn'],
  fitted: [],
};

function nextDate(job: JobRecord): string | null {
  for (const date of AHEAD[job.stage]) {
    const on = job[date];
    if (on) return on;
  }
  return null;
}
