import { Router } from 'express';

import { getMe, updateMe } from '@/shared/contracts/auth';
import { route } from '../http/route';
import type { CrewService } from '../services/crew-service';

export function meRoutes(crew: CrewService): Router {
  const router = Router();
  route(router, getMe, 200, ({ actor }) => crew.me(actor));
  route(router, updateMe, 200, ({ actor, body }) => crew.rename(actor, body.name));
  return router;
}
