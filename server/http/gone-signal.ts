import type { Response } from 'express';

/** Fires when the caller has gone before the answer was sent. */
export function goneSignal(res: Response): AbortSignal {
  const controller = new AbortController();
  res.once('close', () => {
    if (!res.writableFinished) controller.abort(new Error('the caller has gone'));
  });
  return controller.signal;
}
