import type { RequestHandler, Response } from 'express';

import type { Actor } from '../services/actor';
import type { AccessTokens } from '../services/access-tokens';
import { ProblemError } from './problem-error';

const BEARER = /^Bearer ([\w.-]+)$/i;

/** Reads the access token, where there is one, so that `actorOf` knows who asks. */
export function authenticate(tokens: AccessTokens): RequestHandler {
  return async (req, res, next) => {
    const found = BEARER.exec(req.get('authorization') ?? '');
    if (found) res.locals['actor'] = await tokens.read(found[1] as string);
    next();
  };
}

/**
 * Who makes this request.
 *
 * @throws ProblemError not_signed_in, without a token or with one that is wrong or too old
 */
export function actorOf(res: Response): Actor {
  const actor = res.locals['actor'] as Actor | null | undefined;
  if (!actor) throw new ProblemError('not_signed_in', 'You are not signed in, or the sign-in has run out.');
  return actor;
}
