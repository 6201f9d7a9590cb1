import { pipeline } from 'node:stream/promises';

import { Router } from 'express';

import {
  kindsOf,
  SHEET_PATH,
  sheetParams,
  sheetQuery,
  type SheetChoice,
  type SheetQuery,
} from '@/shared/contracts/sheets';
import { actorOf } from '../http/authenticate';
import { goneSignal } from '../http/gone-signal';
import { parseRequest } from '../http/route';
import type { SheetService } from '../services/sheet-service';

export function sheetRoutes(sheets: SheetService): Router {
  const router = Router();
  router.get(SHEET_PATH, async (req, res) => {
    const actor = actorOf(res);
    const { params, query } = parseRequest({ params: sheetParams, query: sheetQuery }, req);
    const gone = goneSignal(res);
    const { jobId, kind } = params as { jobId: string; kind: SheetChoice };
    const { pdf, fileName } = await sheets.print(actor, jobId, kindsOf(kind), query as SheetQuery, gone);
    res.set({
      'Content-Type': 'application/pdf',
      'Content-Disposition': `inline; filename="${fileName}"`,
      'Cache-Control': 'private, no-cache',
    });
    await pipeline(pdf, res, { signal: gone });
  });
  return router;
}
