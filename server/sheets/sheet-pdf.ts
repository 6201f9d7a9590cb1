import type { SheetRequest } from '@/geometry/scene/paper/sheet-request';
import { sheetEntry, sheetSet, type SheetKind } from '@/geometry/scene/sheet-kinds';

import { paintPdf } from './paint-pdf';
import { SheetError } from './sheet-error';

export interface SheetPdfRequest extends SheetRequest {
  readonly kinds: readonly SheetKind[];
  /** Pages of the set to print, from 1; all when left out. */
  readonly only?: readonly number[];
}

/**
 * Sheets as one PDF. The same request gives the same bytes on any day, in any time zone: the only date in the file is the
 * revision's.
 *
 * @throws SheetError `no_slab_plan` while the pieces are not nested and nothing else is asked for; `no_pages` where the job
 *   has nothing for these sheets
 */
export function sheetPdf({ kinds, only, ...request }: SheetPdfRequest): NodeJS.ReadableStream {
  const { plan, head } = request;
  const nested = (plan.nest?.slabs.length ?? 0) > 0;
  if (!nested && kinds.every((kind) => sheetEntry(kind).needsSlabs))
    throw new SheetError(
      'no_slab_plan',
      'There is no slab plan for these pieces yet. Open Slabs and let the search end.',
    );
  const all = sheetSet(kinds, request);
  const pages = only ? all.filter((_, i) => only.includes(i + 1)) : all;
  if (pages.length === 0)
    throw new SheetError('no_pages', `The job has nothing for ${namesOf(kinds)}${only ? ' on these pages' : ''}.`);
  return paintPdf(pages, {
    title: `${titleOf(kinds)}, ${head.jobNumber} ${head.jobName}, revision ${head.revision}${head.draft ? ', draft' : ''}`,
    subject: subjectOf(kinds, request),
    author: head.drawnBy,
    created: revisionTime(head.revisionDate),
  });
}

const titleOf = (kinds: readonly SheetKind[]): string =>
  kinds.length === 1 ? `${sheetEntry(kinds[0]!).name}s` : 'Sheets';

const namesOf = (kinds: readonly SheetKind[]): string =>
  kinds.map((kind) => sheetEntry(kind).name.toLowerCase()).join(', ');

const subjectOf = (kinds: readonly SheetKind[], { plan }: SheetRequest): string =>
  kinds.length === 1 && kinds[0] === 'cut' ? `Saw cuts of ${plan.nest?.slabs.length ?? 0} slabs` : namesOf(kinds);

/** The revision's time; one without a zone is UTC, whatever zone this process runs in. */
function revisionTime(iso: string): Date {
  const zoned = /T.*(Z|[+-]\d{2}:?\d{2})$/.test(iso) || !iso.includes('T') ? iso : `${iso}Z`;
  return new Date(zoned);
}
