import { createAsyncStoragePersister } from '@tanstack/query-async-storage-persister';
import { QueryClient } from '@tanstack/react-query';
import { PersistQueryClientProvider } from '@tanstack/react-query-persist-client';
import { createStore, del, get, set } from 'idb-keyval';
import { useState, type ReactNode } from 'react';

import { ApiError } from './api-problem';

/** What was fetched is shown again without signal for a week. */
const KEPT_MS = 7 * 24 * 3600 * 1000;
const FRESH_MS = 15_000;
const MOST_RETRIES = 2;

/** Bumped when stored answers can no longer be read. */
const STORED_SHAPE = '1';

function makeClient(): QueryClient {
  return new QueryClient({
    defaultOptions: {
      queries: {
        gcTime: KEPT_MS,
        staleTime: FRESH_MS,
        networkMode: 'offlineFirst',
        // A refusal stays one; only a missing signal or a stumbling server is asked again.
        retry: (count, error) => count < MOST_RETRIES && error instanceof ApiError && error.problem.kind === 'server',
      },
      mutations: { networkMode: 'offlineFirst', retry: false },
    },
  });
}

function makePersister() {
  const store = createStore('offsquare-answers', 'queries');
  return createAsyncStoragePersister({
    storage: {
      getItem: (key) => get<string>(key, store).then((text) => text ?? null),
      setItem: (key, value) => set(key, value, store),
      removeItem: (key) => del(key, store),
    },
    key: 'queries',
  });
}

/** Answers of the server, kept in the browser's database so that a kitchen without signal still opens its jobs. */
export function QueryProvider({ children }: { readonly children: ReactNode }) {
  const [client] = useState(makeClient);
  const [persister] = useState(makePersister);
  return (
    <PersistQueryClientProvider
      client={client}
      persistOptions={{ persister, maxAge: KEPT_MS, buster: STORED_SHAPE }}
      // What this device remembers may be older than the last change made on it: shown at once, asked again at once.
      onSuccess={() => void client.invalidateQueries()}
    >
      {children}
    </PersistQueryClientProvider>
  );
}
