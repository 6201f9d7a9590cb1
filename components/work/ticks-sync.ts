import type { WorkAct, WorkMark } from '@/shared/work/work-marks';
import { ApiError } from '../api/api-problem';
import type { TicksStore } from './ticks-store';

/** The way to the server, so that tests can put another in its place. */
export interface TicksLink {
  readonly get: () => Promise<readonly WorkMark[]>;
  readonly post: (acts: readonly WorkAct[]) => Promise<readonly WorkMark[]>;
}

export interface TicksSync {
  readonly now: () => void;
  readonly stop: () => void;
}

const FIRST_RETRY_MS = 2000;
const LONGEST_RETRY_MS = 60_000;
const MOST_AT_ONCE = 100;

/** Sends ticks as they come, fetches what others ticked, and tries again without signal. */
export function startTicksSync(
  store: TicksStore,
  link: TicksLink,
  clock: Pick<typeof globalThis, 'setTimeout' | 'clearTimeout'> = globalThis,
): TicksSync {
  let timer: ReturnType<typeof setTimeout> | null = null;
  let busy = false;
  let again = false;
  let stopped = false;
  let retryMs = FIRST_RETRY_MS;

  const later = (ms: number) => {
    if (stopped) return;
    if (timer) clock.clearTimeout(timer);
    timer = clock.setTimeout(() => void round(), ms);
  };

  const exchange = async () => {
    const sent = store.getState().pending.slice(0, MOST_AT_ONCE);
    if (sent.length > 0) store.getState().setSync('sending');
    const marks = sent.length > 0 ? await link.post(sent) : await link.get();
    store.getState().receive(marks, new Set(sent.map(({ id }) => id)));
    store.getState().setSync('idle');
    retryMs = FIRST_RETRY_MS;
    if (again || store.getState().pending.length > 0) later(0);
  };

  const round = async () => {
    if (busy || stopped) {
      again = true;
      return;
    }
    busy = true;
    again = false;
    try {
      await exchange();
    } catch (error) {
      if (!(error instanceof ApiError)) throw error;
      const refused = error.problem.kind === 'problem' && error.problem.status < 500;
      store.getState().setSync(refused ? 'refused' : 'offline');
      if (!refused) later(retryMs);
      retryMs = Math.min(retryMs * 2, LONGEST_RETRY_MS);
    } finally {
      busy = false;
    }
  };

  const unsubscribe = store.subscribe((state, before) => {
    if (state.pending.length > before.pending.length) later(0);
  });
  later(0);
  return {
    now: () => later(0),
    stop: () => {
      stopped = true;
      if (timer) clock.clearTimeout(timer);
      unsubscribe();
    },
  };
}
