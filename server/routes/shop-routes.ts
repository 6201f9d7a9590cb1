import { Router } from 'express';

import { getShop, updateShop } from '@/shared/contracts/shop';
import { route } from '../http/route';
import type { ShopService } from '../services/shop-service';

export function shopRoutes(shops: ShopService): Router {
  const router = Router();
  route(router, getShop, 200, ({ actor }) => shops.get(actor));
  route(router, updateShop, 200, ({ actor, body }) => shops.update(actor, body));
  return router;
}
