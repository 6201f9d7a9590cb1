import { Router } from 'express';

import { getLayout, listEdits, postEdits, takeStock } from '@/shared/contracts/layouts';
import { route } from '../http/route';
import type { LayoutService } from '../services/layout-service';

export function layoutRoutes(layouts: LayoutService): Router {
  const router = Router();
  route(router, getLayout, 200, async ({ actor, params }) => {
    const { id, jobId, seq, doc } = await layouts.get(actor, params.layoutId);
    return { layoutId: id, jobId, seq, layout: doc };
  });
  route(router, listEdits, 200, ({ actor, params, query }) => layouts.listEdits(actor, params.layoutId, query.since));
  route(router, postEdits, 200, ({ actor, params, body }) =>
    layouts.postEdits(actor, params.layoutId, body.base, body.edits),
  );
  route(router, takeStock, 200, ({ actor, params, body }) =>
    layouts.takeStock(actor, params.layoutId, body.base, body.editId),
  );
  return router;
}
