import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { useStore } from 'zustand';

import type { Layout } from '@/geometry/core/layout';
import { makePlan } from '@/geometry/plan/make-plan';
import type { Plan } from '@/geometry/plan/types';
import { turnPlan, viewTurn } from '@/geometry/scene/turn-plan';
import { getRevision } from '@/shared/contracts/revisions';
import { applyEdit, type Edit } from '@/shared/layout/apply-edit';
import { call } from '../api/client';
import { useRevisions } from '../api/use-sheets';
import { useOpenJob } from '../editor/JobProvider';
import { inSentence } from './tops-choice';

export type BeforeWhat = 'change' | 'revision';

/** The tops as they were. */
export interface Before {
  readonly layout: Layout;
  readonly plan: Plan;
  /** Turned for drawing. */
  readonly drawn: Plan;
  /** "before depth 25 in", "as revision 2". */
  readonly words: string;
}

export interface BeforeState {
  /** Number of the newest revision, null while there is none. */
  readonly revision: number | null;
  /** Null while there is nothing to compare with, or it is being fetched. */
  readonly before: Before | null;
}

/** An edit that is only tried needs a name too; it is never sent. */
const TRIED = '00000000-0000-4000-8000-000000000000';

/** The tops before this person's last change, or as the newest revision froze them. Computed only while `wanted`. */
export function useBefore(what: BeforeWhat, wanted: boolean): BeforeState {
  const { job, store, settings } = useOpenJob();
  const revisions = useRevisions(job.id);
  const newest = revisions.data?.revisions[0]?.number ?? null;
  const frozen = useQuery({
    queryKey: ['revisions', job.id, newest],
    queryFn: ({ signal }) => call(getRevision, { params: { jobId: job.id, number: newest! }, signal }),
    enabled: wanted && what === 'revision' && newest !== null,
    // A revision never changes.
    staleTime: Infinity,
  });
  const layout = useStore(store, (state) => state.layout);
  const deed = useStore(store, (state) => state.undo.at(-1));
  const before = useMemo((): Before | null => {
    if (!wanted) return null;
    if (what === 'revision') {
      if (!frozen.data) return null;
      const { layout: then, plan } = frozen.data;
      return { layout: then, plan, drawn: turnPlan(plan, viewTurn(then.room)), words: `as revision ${newest}` };
    }
    if (!deed) return null;
    const undone = applyEdit(layout, { ...deed.inverse, id: TRIED } as Edit);
    if (!undone.ok) return null;
    const plan = makePlan({ layout: undone.layout, settings, nest: null });
    return {
      layout: undone.layout,
      plan,
      drawn: turnPlan(plan, viewTurn(undone.layout.room)),
      words: `before ${inSentence(deed.label)}`,
    };
  }, [wanted, what, frozen.data, newest, deed, layout, settings]);
  return { revision: newest, before };
}
