import { useInfiniteQuery, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';

import { createJob, getJob, listJobs, moveStage, updateJob, type Job } from '@/shared/contracts/jobs';
import type { BodyOf, QueryOf } from '@/shared/contracts/contract';
import { call } from './client';

export type JobFilter = Omit<NonNullable<QueryOf<typeof listJobs>>, 'after' | 'limit'>;

export const jobKeys = {
  all: ['jobs'] as const,
  list: (filter: JobFilter) => ['jobs', 'list', filter] as const,
  one: (jobId: string) => ['jobs', jobId] as const,
};

/** Jobs of the shop, last touched first, page after page. */
export function useJobList(filter: JobFilter) {
  return useInfiniteQuery({
    queryKey: jobKeys.list(filter),
    queryFn: ({ pageParam, signal }) =>
      call(listJobs, { query: { ...filter, ...(pageParam !== null && { after: pageParam }) }, signal }),
    initialPageParam: null as string | null,
    getNextPageParam: (page) => page.next,
  });
}

export function useJob(jobId: string) {
  return useQuery({
    queryKey: jobKeys.one(jobId),
    queryFn: ({ signal }) => call(getJob, { params: { jobId }, signal }),
  });
}

export function useCreateJob() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ key, ...body }: BodyOf<typeof createJob> & { key: string }) =>
      call(createJob, { body, idempotencyKey: key }),
    onSuccess: (job) => {
      client.setQueryData(jobKeys.one(job.id), job);
      void client.invalidateQueries({ queryKey: jobKeys.all });
    },
  });
}

function useJobChange<Input>(jobId: string, change: (input: Input) => Promise<Job>) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: change,
    onSuccess: (job) => {
      client.setQueryData(jobKeys.one(jobId), job);
      void client.invalidateQueries({ queryKey: jobKeys.all });
    },
  });
}

export const useUpdateJob = (jobId: string) =>
  useJobChange(jobId, (body: BodyOf<typeof updateJob>) => call(updateJob, { params: { jobId }, body }));

export const useMoveStage = (jobId: string) =>
  useJobChange(jobId, (body: BodyOf<typeof moveStage>) => call(moveStage, { params: { jobId }, body }));
