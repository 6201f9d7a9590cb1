import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';

import type { LabelChoice } from '@/geometry/scene/labels/label-grids';
import type { NestPlan } from '@/geometry/nest/types';
import { API_ROOT } from '@/shared/contracts/contract';
import { freezeRevision, listRevisions, signOff } from '@/shared/contracts/revisions';
import { SHEET_PATH, type SheetChoice } from '@/shared/contracts/sheets';
import { call, fetchFile } from './client';
import { jobKeys } from './use-jobs';

const revisionsKey = (jobId: string) => ['revisions', jobId] as const;

/** Revisions of a job, newest first. */
export function useRevisions(jobId: string) {
  return useQuery({
    queryKey: revisionsKey(jobId),
    queryFn: ({ signal }) => call(listRevisions, { params: { jobId }, signal }),
  });
}

function useAfterRevision(jobId: string) {
  const client = useQueryClient();
  return () => {
    void client.invalidateQueries({ queryKey: revisionsKey(jobId) });
    void client.invalidateQueries({ queryKey: jobKeys.all });
  };
}

/** Freezes the layout as the server has it at `seq`, with the slabs found for it. */
export function useFreeze(jobId: string) {
  const onSuccess = useAfterRevision(jobId);
  return useMutation({
    mutationFn: ({ key, ...body }: { seq: number; nest: NestPlan | null; note: string; key: string }) =>
      call(freezeRevision, {
        params: { jobId },
        body: body as never,
        idempotencyKey: key,
      }),
    onSuccess,
  });
}

export function useSignOff(jobId: string) {
  const onSuccess = useAfterRevision(jobId);
  return useMutation({
    mutationFn: (number: number) => call(signOff, { params: { jobId, number } }),
    onSuccess,
  });
}

export interface SheetFile {
  readonly jobId: string;
  readonly kind: SheetChoice;
  readonly revision: number | 'draft';
  readonly paper: 'letter' | 'a4';
  /** Such as "1-3,5"; all when left out. */
  readonly pages?: string;
  /** How labels are printed. */
  readonly labels?: LabelChoice;
}

/** Sheets as a PDF. */
export function fetchSheets({ jobId, kind, revision, paper, pages, labels }: SheetFile): Promise<Blob> {
  const query = new URLSearchParams({
    revision: String(revision),
    paper,
    ...(pages && { pages }),
    ...(labels && { grid: labels.grid, start: String(labels.start) }),
  });
  const address = SHEET_PATH.replace(':jobId', jobId).replace(':kind', kind);
  return fetchFile(`${API_ROOT}${address}?${query.toString()}`);
}
