import { Router, type Response } from 'express';

import { EVENTS_PATH, type ShopEvent } from '@/shared/contracts/events';
import { actorOf } from '../http/authenticate';
import type { EventHub } from '../services/event-hub';

/** Proxies close a connection that is silent for a minute. */
const HEARTBEAT_MS = 25_000;

/**
 * Server-sent events of the caller's shop. The stream ends when the access token runs out or events may have been missed;
 * whoever listens opens it again and looks at everything anew.
 */
export function eventRoutes(hub: EventHub): Router {
  const router = Router();
  router.get(EVENTS_PATH, (_req, res) => {
    const actor = actorOf(res);
    res.status(200).set({
      'Content-Type': 'text/event-stream; charset=utf-8',
      'Cache-Control': 'no-store',
      'X-Accel-Buffering': 'no',
    });
    const heartbeat = setInterval(() => res.write(': still here\n\n'), HEARTBEAT_MS);
    const expiry = setTimeout(() => res.end(), Math.max(0, actor.until.getTime() - Date.now()));
    const leave = hub.subscribe(actor.shopId, {
      heard: (event) => send(res, event),
      lost: () => res.end(),
    });
    res.once('close', () => {
      clearInterval(heartbeat);
      clearTimeout(expiry);
      leave();
    });
    void hub.ready().then(() => res.write(': listening\n\n'));
  });
  return router;
}

function send(res: Response, event: ShopEvent): void {
  res.write(`event: change\ndata: ${JSON.stringify(event)}\n\n`);
}
