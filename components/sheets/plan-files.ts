import type { Layout } from '@/geometry/core/layout';
import type { ShopSettings } from '@/geometry/core/settings';
import { orderCsv } from '@/geometry/export/order-csv';
import { piecesCsv } from '@/geometry/export/pieces-csv';
import { piecesDrawing, topsDrawing } from '@/geometry/export/plan-drawings';
import { writeDxf } from '@/geometry/export/write-dxf';
import { writeSvg } from '@/geometry/export/write-svg';
import { orderList } from '@/geometry/plan/order-list';
import type { Plan } from '@/geometry/plan/types';
import { toJobFile } from '@/shared/layout/to-job-file';

/** A file that is made on this device, also without signal. */
export interface PlanFile {
  readonly name: string;
  readonly label: string;
  readonly type: string;
  readonly write: () => string;
}

export interface PlanFilesOf {
  readonly plan: Plan;
  readonly layout: Layout;
  readonly settings: ShopSettings;
  readonly jobName: string;
  /** Four digits. */
  readonly number: string;
  readonly prices: boolean;
}

/** Drawings, lists and the job file of a plan. */
export function planFiles({ plan, layout, settings, jobName, number, prices }: PlanFilesOf): readonly PlanFile[] {
  const tops = () => topsDrawing(plan, jobName);
  const pieces = () => piecesDrawing(plan, layout, jobName);
  const dxf = 'image/vnd.dxf';
  const svg = 'image/svg+xml';
  return [
    { name: `${number}-tops.dxf`, label: 'Tops, DXF', type: dxf, write: () => writeDxf(tops()) },
    { name: `${number}-pieces.dxf`, label: 'Pieces, DXF', type: dxf, write: () => writeDxf(pieces()) },
    { name: `${number}-tops.svg`, label: 'Tops, SVG', type: svg, write: () => writeSvg(tops()) },
    { name: `${number}-pieces.svg`, label: 'Pieces, SVG', type: svg, write: () => writeSvg(pieces()) },
    { name: `${number}-pieces.csv`, label: 'Pieces, CSV', type: 'text/csv', write: () => piecesCsv(plan, layout) },
    {
      name: `${number}-order.csv`,
      label: 'Order, CSV',
      type: 'text/csv',
      write: () => orderCsv(orderList(plan, layout, settings), prices),
    },
    {
      name: `${number}-job.json`,
      label: 'Job file',
      type: 'application/json',
      write: () => JSON.stringify(toJobFile(layout, jobName), null, 2),
    },
  ];
}
