import { Router } from 'express';

import { getWork, postWork } from '@/shared/contracts/work';
import { route } from '../http/route';
import type { WorkService } from '../services/work-service';

export function workRoutes(work: WorkService): Router {
  const router = Router();
  route(router, getWork, 200, ({ actor, params }) => work.get(actor, params.jobId));
  route(router, postWork, 200, ({ actor, params, body }) => work.post(actor, params.jobId, body));
  return router;
}
