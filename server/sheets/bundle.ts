import type { Readable } from 'node:stream';

import archiver from 'archiver';

import { orderCsv } from '@/geometry/export/order-csv';
import { piecesCsv } from '@/geometry/export/pieces-csv';
import { piecesDrawing, topsDrawing } from '@/geometry/export/plan-drawings';
import { writeDxf } from '@/geometry/export/write-dxf';
import { writeSvg } from '@/geometry/export/write-svg';
import { orderList } from '@/geometry/plan/order-list';
import { sheetEntry, SHEET_KINDS, type SheetKind } from '@/geometry/scene/sheet-kinds';
import type { SheetRequest } from '@/geometry/scene/paper/sheet-request';
import { toJobFile } from '@/shared/layout/to-job-file';

import { sheetPdf } from './sheet-pdf';

/**
 * Everything of a job in one archive: a PDF for each kind of sheet, tops and pieces as DXF and SVG, lists as CSV, the job
 * file. Entries carry the revision's date, so that the same revision gives the same archive.
 */
export function sheetBundle(request: SheetRequest): NodeJS.ReadableStream {
  const { plan, layout, settings, head, prices = false } = request;
  const archive = archiver('zip', { zlib: { level: 9 } });
  const date = new Date(head.revisionDate.includes('T') ? head.revisionDate : `${head.revisionDate}T00:00:00Z`);
  const text = (name: string, content: string) => archive.append(content, { name, date });
  const nested = (plan.nest?.slabs.length ?? 0) > 0;
  const has = (kind: SheetKind) =>
    (nested || !sheetEntry(kind).needsSlabs) && sheetEntry(kind).pages(request).length > 0;
  for (const kind of SHEET_KINDS.filter(has)) {
    const pdf = sheetPdf({ ...request, kinds: [kind] });
    archive.append(pdf as Readable, { name: `${kind}.pdf`, date });
  }
  const drawings = [
    ['tops', topsDrawing(plan, head.jobName)],
    ['pieces', piecesDrawing(plan, layout, head.jobName)],
  ] as const;
  for (const [name, drawing] of drawings) {
    text(`${name}.dxf`, writeDxf(drawing));
    text(`${name}.svg`, writeSvg(drawing));
  }
  text('pieces.csv', piecesCsv(plan, layout));
  text('order.csv', orderCsv(orderList(plan, layout, settings), prices));
  text('job.json', JSON.stringify(toJobFile(layout, head.jobName), null, 2));
  void archive.finalize();
  return archive;
}
