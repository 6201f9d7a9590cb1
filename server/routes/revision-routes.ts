import { Router } from 'express';

import { freezeRevision, getRevision, listRevisions, sendBack, signOff } from '@/shared/contracts/revisions';
import { route } from '../http/route';
import type { RevisionService } from '../services/revision-service';

export function revisionRoutes(revisions: RevisionService): Router {
  const router = Router();
  route(router, listRevisions, 200, ({ actor, params }) => revisions.list(actor, params.jobId));
  route(router, freezeRevision, 201, ({ actor, params, body }) =>
    revisions.freeze(actor, params.jobId, body.seq, body.nest, body.note),
  );
  route(router, getRevision, 200, ({ actor, params }) => revisions.get(actor, params.jobId, params.number));
  route(router, signOff, 200, ({ actor, params }) => revisions.signOff(actor, params.jobId, params.number));
  route(router, sendBack, 200, ({ actor, params, body }) =>
    revisions.sendBack(actor, params.jobId, params.number, body.note),
  );
  return router;
}
