import { useCallback, useEffect, useRef, useState } from 'react';

import type { NestError, NestInstance, NestPlan } from '@/geometry/nest/types';
import { startNestWorker } from './nest-worker';
import type { NestReply, NestRequest } from './workers/nest.worker';

export interface NestSearch {
  /** Best plan so far for the instance given; null before the first. */
  readonly plan: NestPlan | null;
  readonly error: NestError['error'] | null;
  readonly searching: boolean;
  /** Plans found so far, and what nothing can cost less than, cents. */
  readonly found: number;
  /** Layouts of slabs weighed so far. */
  readonly tried: number;
  readonly lowerBound: number | null;
  /** Ends the search with the best plan so far. */
  readonly stop: () => void;
}

type Progress = Omit<NestSearch, 'stop'> & { readonly instance: string | null };

const NOTHING: Progress = {
  instance: null,
  plan: null,
  error: null,
  searching: false,
  found: 0,
  tried: 0,
  lowerBound: null,
};

/** A drag changes the pieces sixty times a second; the search begins when they rest. */
const REST_MS = 200;
/** Units of counted work: a few seconds on a phone for the largest kitchens, well under one for most. */
export const WORK_LIMIT = 2_000_000;
/** Results kept, so that undo and a second look at a screen do not search again. */
const MOST_KEPT = 24;

const kept = new Map<string, NestPlan>();

function keep(plan: NestPlan): void {
  kept.delete(plan.instance);
  kept.set(plan.instance, plan);
  const oldest = kept.keys().next().value;
  if (kept.size > MOST_KEPT && oldest !== undefined) kept.delete(oldest);
}

/** Searches for slabs in a worker whenever the pieces or the stock change; null = nothing to nest yet. */
export function useNest(instance: NestInstance | null): NestSearch {
  const [progress, setProgress] = useState<Progress>(NOTHING);
  const worker = useRef<Worker | null>(null);
  const id = instance && instance.parts.length > 0 ? instance.id : null;

  const end = useCallback(() => {
    worker.current?.terminate();
    worker.current = null;
  }, []);

  const stop = useCallback(() => {
    end();
    setProgress((now) => {
      if (now.plan) keep(now.plan);
      return { ...now, searching: false };
    });
  }, [end]);

  useEffect(() => {
    if (!instance || id === null || kept.has(id)) return;
    const timer = setTimeout(() => {
      setProgress({ ...NOTHING, instance: id, searching: true });
      const started = startNestWorker();
      worker.current = started;
      if (!started) return;
      started.onmessage = ({ data }: MessageEvent<NestReply>) => setProgress((now) => progressAfter(now, id, data));
      started.onerror = () =>
        setProgress((now) => ({
          ...now,
          searching: false,
          error: {
            code: 'bad_setting',
            message: 'The slab search stopped by itself. Change something to try again.',
            path: [],
          },
        }));
      started.postMessage({ instance, workLimit: WORK_LIMIT } satisfies NestRequest);
    }, REST_MS);
    return () => {
      clearTimeout(timer);
      end();
    };
    // The id stands for everything in the instance.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [id, end]);

  return { ...shown(id, progress), stop };
}

function shown(id: string | null, progress: Progress): Progress {
  if (id === null) return NOTHING;
  const known = kept.get(id);
  if (known) return { ...NOTHING, instance: id, plan: known, lowerBound: known.lowerBound };
  return progress.instance === id ? progress : { ...NOTHING, instance: id, searching: true };
}

function progressAfter(now: Progress, id: string, reply: NestReply): Progress {
  if (now.instance !== id) return now;
  if (reply.kind === 'failed') return { ...now, searching: false, error: reply.error };
  if (reply.kind === 'progress') return { ...now, tried: reply.progress.tried, lowerBound: reply.progress.lowerBound };
  if (reply.kind === 'better') return { ...now, plan: reply.plan, found: now.found + 1, lowerBound: reply.lowerBound };
  keep(reply.plan);
  return { ...now, plan: reply.plan, searching: false, lowerBound: reply.plan.lowerBound };
}
