import { useQuery } from '@tanstack/react-query';

import type { Layout } from '@/geometry/core/layout';
import type { Plan } from '@/geometry/plan/types';
import { getRevision } from '@/shared/contracts/revisions';
import { call } from '../api/client';
import { useOpenJob } from '../editor/JobProvider';

/** The plan whose sheets are shown: a frozen revision's, or the live one; null while it loads. */
export function useShownPlan(
  jobId: string,
  which: number | 'draft',
): { readonly plan: Plan; readonly layout: Layout } | null {
  const { plan, layout } = useOpenJob();
  const frozen = useQuery({
    queryKey: ['revisions', jobId, which],
    queryFn: ({ signal }) => call(getRevision, { params: { jobId, number: which as number }, signal }),
    enabled: which !== 'draft',
    // A revision never changes.
    staleTime: Infinity,
  });
  if (which === 'draft') return { plan, layout };
  return frozen.data ? { plan: frozen.data.plan, layout: frozen.data.layout } : null;
}
