import { ipKeyGenerator, rateLimit } from 'express-rate-limit';
import type { Request, RequestHandler } from 'express';

import { ProblemError } from './problem-error';

const MINUTE_MS = 60_000;

/** Wrong passwords for one address from one place. */
const WRONG_SIGN_INS = 10;
const WRONG_SIGN_IN_WINDOW_MS = 15 * MINUTE_MS;
/** Wrong passwords, tokens and invitations from one place, whatever the address: guessing across people. */
const WRONG_ANSWERS = 60;
/** Mails that one place can have sent. */
const RESET_MAILS = 5;
const RESET_WINDOW_MS = 60 * MINUTE_MS;
/** Requests of any kind from one place; a crew behind one router draws far fewer. */
const REQUESTS_A_MINUTE = 3000;

export interface Limits {
  readonly requests: RequestHandler;
  readonly wrongAnswers: RequestHandler;
  readonly wrongSignIns: RequestHandler;
  readonly resetMails: RequestHandler;
}

/** Counters of one server process; a shop with several processes allows that many times more. */
export function createLimits(): Limits {
  return {
    requests: limit({ windowMs: MINUTE_MS, max: REQUESTS_A_MINUTE, key: placeOf, count: 'all' }),
    wrongAnswers: limit({ windowMs: WRONG_SIGN_IN_WINDOW_MS, max: WRONG_ANSWERS, key: placeOf, count: 'failed' }),
    wrongSignIns: limit({
      windowMs: WRONG_SIGN_IN_WINDOW_MS,
      max: WRONG_SIGN_INS,
      key: (req) => `${placeOf(req)} ${emailOf(req)}`,
      count: 'failed',
    }),
    resetMails: limit({ windowMs: RESET_WINDOW_MS, max: RESET_MAILS, key: placeOf, count: 'all' }),
  };
}

interface Rule {
  readonly windowMs: number;
  readonly max: number;
  readonly key: (req: Request) => string;
  readonly count: 'all' | 'failed';
}

function limit({ windowMs, max, key, count }: Rule): RequestHandler {
  return rateLimit({
    windowMs,
    limit: max,
    keyGenerator: key,
    skipSuccessfulRequests: count === 'failed',
    standardHeaders: 'draft-8',
    legacyHeaders: false,
    handler: () => {
      const minutes = Math.ceil(windowMs / MINUTE_MS);
      const wait = minutes === 1 ? 'a minute' : `${minutes} minutes`;
      throw new ProblemError('too_many_requests', `Too many tries from here. Wait up to ${wait}, then try again.`);
    },
  });
}

/** IPv6 addresses count by their network, since one household has very many. */
function placeOf(req: Request): string {
  return ipKeyGenerator(req.ip ?? 'unknown');
}

function emailOf(req: Request): string {
  const { email } = (req.body ?? {}) as { readonly email?: unknown };
  return typeof email === 'string' ? email.trim().toLowerCase() : '';
}
