import type { Request, Response } from 'express';

import { API_ROOT } from '@/shared/contracts/contract';
import { REFRESH_DAYS } from '../services/auth-service';

const NAME = 'offsquare_session';
const DAY_MS = 24 * 3600 * 1000;

/** Sent to the sign-in addresses only, never to other sites, never readable by a script. */
const options = (secure: boolean) =>
  ({ httpOnly: true, sameSite: 'strict', path: `${API_ROOT}/auth`, secure }) as const;

export function setRefreshCookie(res: Response, token: string, secure: boolean): void {
  res.cookie(NAME, token, { ...options(secure), maxAge: REFRESH_DAYS * DAY_MS });
}

export function clearRefreshCookie(res: Response, secure: boolean): void {
  res.clearCookie(NAME, options(secure));
}

/** The refresh token that the browser sent, or null. */
export function readRefreshCookie(req: Request): string | null {
  for (const pair of (req.get('cookie') ?? '').split(';')) {
    const [name, value] = pair.trim().split('=', 2);
    if (name === NAME && value) return value;
  }
  return null;
}
