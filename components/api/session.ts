import { createStore } from 'zustand/vanilla';

import type { Me } from '@/shared/contracts/auth';

/**
 * Who is signed in on this page. The access token lives in memory only; the refresh cookie, which scripts cannot read,
 * brings a new one after a reload. `person` alone is kept on the device, so that the app opens without signal.
 */
export interface SessionState {
  readonly status: 'starting' | 'in' | 'out';
  readonly accessToken: string | null;
  readonly me: Me | null;
}

const KEPT = 'offsquare-me';

export const session = createStore<SessionState>(() => ({ status: 'starting', accessToken: null, me: null }));

/** The page has a session; `me` is kept for the next start without signal. */
export function takeSession(accessToken: string | null, me: Me): void {
  localStorage.setItem(KEPT, JSON.stringify(me));
  session.setState({ status: 'in', accessToken, me });
}

export function dropSession(): void {
  localStorage.removeItem(KEPT);
  session.setState({ status: 'out', accessToken: null, me: null });
}

/** Who was signed in here last, or null. */
export function keptPerson(): Me | null {
  const text = localStorage.getItem(KEPT);
  if (!text) return null;
  try {
    return JSON.parse(text) as Me;
  } catch {
    return null;
  }
}
