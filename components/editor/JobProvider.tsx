import { createContext, useContext, useEffect, useMemo, useState, type ReactNode } from 'react';
import { useStore } from 'zustand';

import type { ShopSettings } from '@/geometry/core/settings';
import type { Job } from '@/shared/contracts/jobs';
import type { EditDraft } from '@/shared/layout/apply-edit';
import type { ApiProblem } from '../api/api-problem';
import { ApiError } from '../api/api-problem';
import { useJob } from '../api/use-jobs';
import { useMay } from '../api/use-session';
import { useShopSettings } from '../api/use-shop';
import { useToast } from '../ui/ToastProvider';
import type { EditorStore } from './editor-store';
import { saveWords } from './editor-store';
import { lettersToKeep } from './letters-to-keep';
import { openEditor } from './open-editor';
import { useFreshStock } from './use-fresh-stock';
import { useLivePlan, type LivePlan } from './use-plan';

export interface OpenJob extends LivePlan {
  readonly job: Job;
  readonly settings: ShopSettings;
  readonly store: EditorStore;
  /** The person may change the layout. */
  readonly mayEdit: boolean;
  /** Applies an edit; shows the sentence when it cannot be done. True when it was. */
  readonly run: (edit: EditDraft, label: string) => boolean;
  readonly undo: () => void;
  readonly redo: () => void;
}

const JobContext = createContext<OpenJob | null>(null);

/** The job this page is about. Throws outside JobProvider. */
export function useOpenJob(): OpenJob {
  const job = useContext(JobContext);
  if (!job) throw new Error('useOpenJob needs a JobProvider above it');
  return job;
}

export interface JobProviderProps {
  readonly jobId: string;
  readonly loading: ReactNode;
  readonly failed: (problem: ApiProblem, again: () => void) => ReactNode;
  readonly children: ReactNode;
}

/** Opens a job: its record, its layout with what this device still has to send, and the live plan. */
export function JobProvider({ jobId, loading, failed, children }: JobProviderProps) {
  const job = useJob(jobId);
  const layoutId = job.data?.layoutId;
  const [store, setStore] = useState<EditorStore | null>(null);
  const [problem, setProblem] = useState<ApiProblem | null>(null);
  const [attempt, setAttempt] = useState(0);
  const toast = useToast();

  useEffect(() => {
    if (!layoutId) return;
    const opening = openEditor(layoutId, {
      opened: setStore,
      failed: setProblem,
      notKept: () =>
        toast({ tone: 'failure', text: 'This device could not keep a copy. Stay on this page until it says Saved.' }),
    });
    return () => {
      opening.close();
      setStore(null);
    };
  }, [layoutId, attempt, toast]);

  const again = () => {
    setProblem(null);
    void job.refetch();
    setAttempt((n) => n + 1);
  };
  const wrong = problem ?? (job.error instanceof ApiError && !job.data ? job.error.problem : null);
  if (wrong) return failed(wrong, again);
  if (!job.data || !store) return loading;
  return (
    <WithPlan job={job.data} store={store}>
      {children}
    </WithPlan>
  );
}

function WithPlan({ job, store, children }: { job: Job; store: EditorStore; children: ReactNode }) {
  const settings = useShopSettings();
  const live = useLivePlan(store, settings);
  const mayEdit = useMay('layout.edit');
  useFreshStock(store, job.layoutId, mayEdit);
  const toast = useToast();
  const value = useMemo<OpenJob>(
    () => ({
      ...live,
      job,
      settings,
      store,
      mayEdit,
      run: (edit, label) => {
        const letters = lettersToKeep(store.getState().layout, settings);
        if (letters) store.getState().keep(letters);
        const reason = store.getState().run(edit, label);
        if (reason) toast({ tone: 'failure', text: reason });
        return reason === null;
      },
      undo: () => turn(store, 'undo', toast),
      redo: () => turn(store, 'redo', toast),
    }),
    [live, job, settings, store, mayEdit, toast],
  );
  return <JobContext.Provider value={value}>{children}</JobContext.Provider>;
}

function turn(store: EditorStore, way: 'undo' | 'redo', toast: ReturnType<typeof useToast>): void {
  const deed = store.getState()[way].at(-1);
  if (!deed) return;
  const reason = way === 'undo' ? store.getState().undoLast() : store.getState().redoLast();
  toast(reason ? { tone: 'failure', text: reason } : { text: `${way === 'undo' ? 'Undid' : 'Redid'} ${deed.label}` });
}

/** "Saved", "Saving", "Saved here, 3 to send". */
export function useSaveWords(store: EditorStore): { readonly words: string; readonly offline: boolean } {
  const pending = useStore(store, (state) => state.pending);
  const sync = useStore(store, (state) => state.sync);
  return { words: saveWords({ pending, sync }), offline: sync === 'offline' };
}
