import { createStore, get, set } from 'idb-keyval';
import { useEffect, useState } from 'react';

import { getWork, postWork } from '@/shared/contracts/work';
import { call } from '../api/client';
import { listenToShop } from '../api/shop-events';
import { useSession } from '../api/use-session';
import { createTicksStore, NO_TICKS, type TicksRecord, type TicksStore } from './ticks-store';
import { startTicksSync, type TicksLink } from './ticks-sync';

let opened: ReturnType<typeof createStore> | null = null;
const database = () => (opened ??= createStore('offsquare-ticks', 'jobs'));

function linkTo(jobId: string): TicksLink {
  const params = { jobId };
  return {
    get: async () => (await call(getWork, { params })).marks,
    post: async (acts) => {
      const sent = acts.map(({ by: _by, ...act }) => act);
      return (await call(postWork, { params, body: { sentAt: new Date().toISOString(), acts: sent } })).marks;
    },
  };
}

/**
 * The ticks of a job, kept on this device for the person signed in and in step with the server; null while they are
 * fetched from the device. Private windows keep nothing and work on.
 */
export function useTicks(jobId: string): TicksStore | null {
  const { me } = useSession();
  const [store, setStore] = useState<TicksStore | null>(null);
  const personId = me?.personId ?? null;
  const name = me?.name ?? '';
  useEffect(() => {
    if (!personId) return;
    let closed = false;
    const closers: (() => void)[] = [];
    const key = `${personId} ${jobId}`;
    const open = async () => {
      const kept = await get<TicksRecord>(key, database()).catch(() => undefined);
      if (closed) return;
      const made = createTicksStore(kept ?? NO_TICKS, { by: name });
      closers.push(keep(made, key), follow(made, jobId));
      setStore(made);
    };
    void open();
    return () => {
      closed = true;
      for (const close of closers) close();
      setStore(null);
    };
  }, [jobId, personId, name]);
  return store;
}

function keep(store: TicksStore, key: string): () => void {
  return store.subscribe(({ known, pending }, before) => {
    if (known === before.known && pending === before.pending) return;
    void set(key, { known, pending }, database()).catch(() => undefined);
  });
}

function follow(store: TicksStore, jobId: string): () => void {
  const sync = startTicksSync(store, linkTo(jobId));
  const deaf = listenToShop((event) => {
    if (event.kind === 'work' && event.jobId === jobId) sync.now();
  }, sync.now);
  window.addEventListener('online', sync.now);
  return () => {
    sync.stop();
    deaf();
    window.removeEventListener('online', sync.now);
  };
}
