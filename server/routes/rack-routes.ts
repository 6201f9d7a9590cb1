import { Router } from 'express';

import { createRackPiece, listRack } from '@/shared/contracts/rack';
import { route } from '../http/route';
import type { RackService } from '../services/rack-service';

export function rackRoutes(rack: RackService): Router {
  const router = Router();
  route(router, listRack, 200, ({ actor }) => rack.list(actor));
  route(router, createRackPiece, 201, ({ actor, body }) => rack.create(actor, body));
  return router;
}
