import { Router, type Response } from 'express';

import { findInvitation, join, refresh, requestReset, resetPassword, signIn, signOut } from '@/shared/contracts/auth';
import type { Limits } from '../http/limits';
import { ProblemError } from '../http/problem-error';
import { clearRefreshCookie, readRefreshCookie, setRefreshCookie } from '../http/refresh-cookie';
import { route } from '../http/route';
import type { AuthService, Opened } from '../services/auth-service';

/** @param secure - the cookie travels over HTTPS only */
export function authRoutes(auth: AuthService, limits: Limits, secure: boolean): Router {
  const router = Router();
  const opened = (res: Response, { session, refreshToken }: Opened) => {
    setRefreshCookie(res, refreshToken, secure);
    return session;
  };
  router.use([signIn.path, resetPassword.path, findInvitation.path, join.path], limits.wrongAnswers);
  router.use(signIn.path, limits.wrongSignIns);
  router.use(requestReset.path, limits.resetMails);

  route(router, signIn, 200, async ({ body, res }) =>
    opened(res, await auth.signIn(body.email, body.password, body.shopId)),
  );

  route(router, refresh, 200, async ({ req, res }) => {
    try {
      return opened(res, await auth.refresh(readRefreshCookie(req)));
    } catch (error) {
      // A cookie that is good for nothing any more should not come again.
      if (error instanceof ProblemError && error.code === 'session_ended') clearRefreshCookie(res, secure);
      throw error;
    }
  });

  route(router, signOut, 204, async ({ req, res }) => {
    await auth.signOut(readRefreshCookie(req));
    clearRefreshCookie(res, secure);
  });

  route(router, requestReset, 204, ({ body }) => auth.requestReset(body.email));
  route(router, resetPassword, 204, ({ body }) => auth.resetPassword(body.token, body.password));
  route(router, findInvitation, 200, ({ body }) => auth.findInvitation(body.token));
  route(router, join, 201, async ({ body, res }) => opened(res, await auth.join(body.token, body.name, body.password)));

  return router;
}
