import type { EditsOutcome, LoggedEdit } from '@/shared/contracts/layouts';
import type { Edit } from '@/shared/layout/apply-edit';
import { ApiError } from '../api/api-problem';
import type { EditorStore } from './editor-store';

/** The way to the server, so that tests can put another in its place. */
export interface LayoutLink {
  readonly post: (base: number, edits: readonly Edit[]) => Promise<EditsOutcome>;
  readonly list: (since: number) => Promise<{ readonly seq: number; readonly edits: readonly LoggedEdit[] }>;
}

export interface Sync {
  /** Sends what is waiting and fetches what others did, now. */
  readonly now: () => void;
  /** Somebody stored edits up to `seq`. */
  readonly news: (seq: number) => void;
  readonly stop: () => void;
}

/** Typing a reading makes one edit; a short pause lets several travel together. */
const PAUSE_MS = 150;
const FIRST_RETRY_MS = 1000;
const LONGEST_RETRY_MS = 30_000;
const MOST_AT_ONCE = 200;

/** Keeps one layout in step with the server: sends pending edits in order, brings in others', tries again without signal. */
export function startSync(
  store: EditorStore,
  link: LayoutLink,
  clock: Pick<typeof globalThis, 'setTimeout' | 'clearTimeout'> = globalThis,
): Sync {
  let timer: ReturnType<typeof setTimeout> | null = null;
  let busy = false;
  let stopped = false;
  let wanted = false;
  let retryMs = FIRST_RETRY_MS;

  const later = (ms: number) => {
    if (stopped) return;
    if (timer) clock.clearTimeout(timer);
    timer = clock.setTimeout(() => void round(), ms);
  };

  const round = async (): Promise<void> => {
    if (busy || stopped) {
      wanted = true;
      return;
    }
    busy = true;
    wanted = false;
    try {
      await exchange();
      retryMs = FIRST_RETRY_MS;
      store.getState().setSync('idle');
    } catch (error) {
      giveReason(error);
    } finally {
      busy = false;
    }
    if (stopped) return;
    const { sync, pending } = store.getState();
    if (sync === 'offline') {
      later(retryMs);
      retryMs = Math.min(retryMs * 2, LONGEST_RETRY_MS);
    } else if (sync === 'idle' && (wanted || pending.length > 0)) later(0);
  };

  const exchange = async (): Promise<void> => {
    const { base, pending, receive, setSync } = store.getState();
    if (pending.length === 0) {
      const { seq, edits } = await link.list(base);
      receive({ seq, edits: edits.map((logged) => logged.edit), refused: [] });
      return;
    }
    const sent = pending.slice(0, MOST_AT_ONCE);
    setSync('sending');
    const outcome = await link.post(base, sent);
    receive({
      seq: outcome.seq,
      edits: inOrder(outcome, sent, base),
      refused: outcome.refused.map(({ edit, reason }) => ({ id: edit.id, reason })),
    });
  };

  const giveReason = (error: unknown): void => {
    if (!(error instanceof ApiError)) throw error;
    const { problem } = error;
    const forbidden = problem.kind === 'problem' && problem.status === 403;
    store.getState().setSync(forbidden ? 'no-permission' : 'offline');
  };

  const unsubscribe = store.subscribe((state, before) => {
    if (state.pending !== before.pending && state.pending.length > 0 && !busy) later(PAUSE_MS);
  });
  later(0);

  return {
    now: () => later(0),
    news: (seq) => {
      if (seq > store.getState().base) later(0);
    },
    stop: () => {
      stopped = true;
      if (timer) clock.clearTimeout(timer);
      unsubscribe();
    },
  };
}

/** Everything stored after `base`, mine and others', in the server's order. */
export function inOrder(outcome: EditsOutcome, sent: readonly Edit[], base: number): Edit[] {
  const mine = new Map(sent.map((edit) => [edit.id, edit]));
  const all = [
    ...outcome.others.map(({ seq, edit }) => ({ seq, edit })),
    ...outcome.applied.flatMap(({ id, seq }) => {
      const edit = mine.get(id);
      return edit ? [{ seq, edit }] : [];
    }),
  ];
  return all
    .filter(({ seq }) => seq > base)
    .sort((a, b) => a.seq - b.seq)
    .map(({ edit }) => edit);
}
