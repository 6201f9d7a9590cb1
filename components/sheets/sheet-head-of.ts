import type { SheetHead } from '@/geometry/scene/paper/sheet-head';
import type { Job } from '@/shared/contracts/jobs';
import type { RevisionSummary } from '@/shared/contracts/revisions';

/** What the preview's pages say of themselves: a revision, or the layout as it is now. */
export function sheetHeadOf(job: Job, revision: RevisionSummary | null, today: string): SheetHead {
  const jobNumber = String(job.number).padStart(4, '0');
  const drawnBy = revision?.createdBy.name ?? job.designer?.name ?? job.installer?.name ?? '';
  if (!revision)
    return {
      jobNumber,
      jobName: job.name,
      revision: (job.revision ?? 0) + 1,
      revisionDate: today,
      drawnBy,
      signedBy: null,
      draft: true,
    };
  return {
    jobNumber,
    jobName: job.name,
    revision: revision.number,
    revisionDate: revision.createdAt,
    drawnBy,
    signedBy: revision.signedOff?.by.name ?? null,
    draft: revision.signedOff === null,
    ...(revision.changedSince && { changedSince: revision.number }),
  };
}
