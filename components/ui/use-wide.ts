import { useSyncExternalStore } from 'react';

import { WIDE_FROM } from './tokens';

const query = (): MediaQueryList => window.matchMedia(`(min-width: ${WIDE_FROM}px)`);

/** Whether the window has room for a rail and an inspector. */
export function useWide(): boolean {
  return useSyncExternalStore(
    subscribe,
    () => query().matches,
    () => false,
  );
}

function subscribe(listener: () => void): () => void {
  const list = query();
  list.addEventListener('change', listener);
  return () => list.removeEventListener('change', listener);
}
