import { pipeline } from 'node:stream/promises';

import { Router } from 'express';

import { CUT_SHEET_PATH, cutSheetParams, cutSheetQuery, type CutSheetQuery } from '@/shared/contracts/sheets';
import { actorOf } from '../http/authenticate';
import { goneSignal } from '../http/gone-signal';
import { parseRequest } from '../http/route';
import type { SheetService } from '../services/sheet-service';

export function sheetRoutes(sheets: SheetService): Router {
  const router = Router();
  router.get(CUT_SHEET_PATH, async (req, res) => {
    const actor = actorOf(res);
    const { params, query } = parseRequest({ params: cutSheetParams, query: cutSheetQuery }, req);
    const gone = goneSignal(res);
    const { jobId } = params as { jobId: string };
    const { pdf, fileName } = await sheets.cutSheet(actor, jobId, query as CutSheetQuery, gone);
    res.set({
      'Content-Type': 'application/pdf',
      'Content-Disposition': `inline; filename="${fileName}"`,
      'Cache-Control': 'private, no-cache',
    });
    await pipeline(pdf, res, { signal: gone });
  });
  return router;
}
