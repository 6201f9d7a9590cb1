import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';

import { API_ROOT, type BodyOf } from '@/shared/contracts/contract';
import { listPrints, mailSheets } from '@/shared/contracts/sheet-acts';
import { BUNDLE_PATH } from '@/shared/contracts/sheets';
import { call, fetchFile } from './client';

const printsKey = (jobId: string) => ['prints', jobId] as const;

/** Revisions that went to paper, newest first. */
export function usePrints(jobId: string) {
  return useQuery({
    queryKey: printsKey(jobId),
    queryFn: ({ signal }) => call(listPrints, { params: { jobId }, signal }),
  });
}

/** Call it when something was printed: the list is asked for again. */
export function useAfterPrint(jobId: string): () => void {
  const client = useQueryClient();
  return () => void client.invalidateQueries({ queryKey: printsKey(jobId) });
}

/** `key` stays the same over retries, so that one press sends one mail. */
export function useMailSheets(jobId: string) {
  return useMutation({
    mutationFn: ({ key, ...body }: BodyOf<typeof mailSheets> & { readonly key: string }) =>
      call(mailSheets, { params: { jobId }, body, idempotencyKey: key }),
  });
}

/** Everything of a revision or of the draft in one archive. */
export function fetchBundle(jobId: string, revision: number | 'draft', paper: 'letter' | 'a4'): Promise<Blob> {
  const query = new URLSearchParams({ revision: String(revision), paper });
  return fetchFile(`${API_ROOT}${BUNDLE_PATH.replace(':jobId', jobId)}?${query.toString()}`);
}
