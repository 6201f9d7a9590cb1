import type { Layout } from '@/geometry/core/layout';
import type { Plan } from '@/geometry/plan/types';
import { cutSheetPages, type SheetNumbering } from '@/geometry/scene/cut-sheet/cut-sheet-scene';
import type { Paper, SheetHead } from '@/geometry/scene/paper/sheet-head';

import { paintPdf } from './paint-pdf';
import { SheetError } from './sheet-error';

export interface CutSheetRequest {
  readonly plan: Plan;
  readonly layout: Layout;
  readonly head: SheetHead;
  readonly paper: Paper;
  /** Where these sheets stand in a larger set. */
  readonly numbering?: SheetNumbering;
}

/**
 * The cut sheets of all slabs as one PDF, a page a slab. The same request gives the same bytes on any day, in any time
 * zone: the only date in the file is the revision's.
 *
 * @throws SheetError `no_slab_plan` while the pieces are not nested on slabs
 */
export function cutSheetPdf({ plan, layout, head, paper, numbering }: CutSheetRequest): NodeJS.ReadableStream {
  if (!plan.nest || plan.nest.slabs.length === 0) {
    throw new SheetError(
      'no_slab_plan',
      'There is no slab plan for these pieces yet. Open Slabs and let the search end.',
    );
  }
  const pages = cutSheetPages(plan, layout, head, paper, numbering);
  return paintPdf(pages, {
    title: `Cut sheets, ${head.jobNumber} ${head.jobName}, revision ${head.revision}${head.draft ? ', draft' : ''}`,
    subject: `Saw cuts of ${plan.nest.slabs.length} slabs`,
    author: head.drawnBy,
    created: revisionTime(head.revisionDate),
  });
}

/** The revision's time; one without a zone is UTC, whatever zone this process runs in. */
function revisionTime(iso: string): Date {
  const zoned = /T.*(Z|[+-]\d{2}:?\d{2})$/.test(iso) || !iso.includes('T') ? iso : `${iso}Z`;
  return new Date(zoned);
}
