import { Router } from 'express';

import { createJob, getJob, listActivity, listJobs, moveStage, sendForCheck, updateJob } from '@/shared/contracts/jobs';
import { route } from '../http/route';
import type { JobService } from '../services/job-service';

export function jobRoutes(jobs: JobService): Router {
  const router = Router();
  route(router, listJobs, 200, ({ actor, query }) => jobs.list(actor, query));
  route(router, createJob, 201, ({ actor, body }) => jobs.create(actor, body));
  route(router, getJob, 200, ({ actor, params }) => jobs.get(actor, params.jobId));
  route(router, updateJob, 200, ({ actor, params, body }) => jobs.update(actor, params.jobId, body));
  route(router, moveStage, 200, ({ actor, params, body }) => jobs.moveStage(actor, params.jobId, body.to, body.note));
  route(router, sendForCheck, 200, ({ actor, params }) => jobs.sendForCheck(actor, params.jobId));
  route(router, listActivity, 200, ({ actor, params, query }) =>
    jobs.listActivity(actor, params.jobId, query.after, query.limit),
  );
  return router;
}
