import { Router } from 'express';

import { nestJob } from '@/shared/contracts/nest';
import { goneSignal } from '../http/gone-signal';
import { route } from '../http/route';
import type { NestService } from '../services/nest-service';

export function nestRoutes(nests: NestService): Router {
  const router = Router();
  route(router, nestJob, 200, ({ actor, params, body, res }) =>
    nests.nestJob(actor, params.jobId, body.limitMs, goneSignal(res)),
  );
  return router;
}
