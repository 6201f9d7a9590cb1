import { pipeline } from 'node:stream/promises';

import { Router } from 'express';

import { listPrints, mailSheets } from '@/shared/contracts/sheet-acts';
import {
  BUNDLE_PATH,
  bundleParams,
  kindsOf,
  SHEET_PATH,
  sheetParams,
  sheetQuery,
  type SheetChoice,
  type SheetQuery,
} from '@/shared/contracts/sheets';
import { actorOf } from '../http/authenticate';
import { goneSignal } from '../http/gone-signal';
import { parseRequest, route } from '../http/route';
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
  router.get(BUNDLE_PATH, async (req, res) => {
    const actor = actorOf(res);
    const { params, query } = parseRequest({ params: bundleParams, query: sheetQuery }, req);
    const gone = goneSignal(res);
    const { jobId } = params as { jobId: string };
    const { pdf, fileName } = await sheets.bundle(actor, jobId, query as SheetQuery, gone);
    res.set({
      'Content-Type': 'application/zip',
      'Content-Disposition': `attachment; filename="${fileName}"`,
      'Cache-Control': 'private, no-cache',
    });
    await pipeline(pdf, res, { signal: gone });
  });
  route(router, listPrints, 200, ({ actor, params }) => sheets.prints(actor, params.jobId));
  route(router, mailSheets, 201, ({ actor, params, body }) =>
    sheets.mail(actor, params.jobId, body.personId, body.revision, body.note ?? ''),
  );
  return router;
}
