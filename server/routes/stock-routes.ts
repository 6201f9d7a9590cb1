import { Router } from 'express';

import { createStock, deleteStock, importStock, listStock, removeStock, updateStock } from '@/shared/contracts/stock';
import { route } from '../http/route';
import type { StockService } from '../services/stock-service';

export function stockRoutes(stock: StockService): Router {
  const router = Router();
  route(router, listStock, 200, ({ actor }) => stock.list(actor));
  route(router, createStock, 201, ({ actor, body }) => stock.create(actor, body));
  route(router, importStock, 201, ({ actor, body }) => stock.import(actor, body.slabs));
  route(router, removeStock, 200, ({ actor, body }) => stock.remove(actor, body.ids));
  route(router, updateStock, 200, ({ actor, params, body }) => stock.update(actor, params.slabId, body));
  route(router, deleteStock, 204, ({ actor, params }) => stock.delete(actor, params.slabId));
  return router;
}
