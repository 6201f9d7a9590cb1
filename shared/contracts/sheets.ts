import { z } from 'zod';

import { LABEL_GRID_KEYS } from '@/geometry/scene/labels/label-grids';
import { SHEET_KINDS, type SheetKind } from '@/geometry/scene/sheet-kinds';
import { uuid } from './fields';

/** GET: sheets of one kind as a PDF, or all of them as one set. */
export const SHEET_PATH = '/jobs/:jobId/sheets/:kind.pdf';

export const sheetParams = z.strictObject({ jobId: uuid, kind: z.enum(['all', ...SHEET_KINDS]) });

export type SheetChoice = z.infer<typeof sheetParams>['kind'];

/** The kinds that an address means. */
export const kindsOf = (choice: SheetChoice): readonly SheetKind[] => (choice === 'all' ? SHEET_KINDS : [choice]);

/** Most pages that may be picked out of a set. */
const MOST_PAGES = 400;

/** Pages as a printing dialog takes them: "1-3,5". */
const pageList = z
  .string()
  .max(200)
  .regex(/^\d{1,3}(-\d{1,3})?(,\d{1,3}(-\d{1,3})?)*$/, 'pages such as 1-3,5')
  .transform((text) => {
    const pages = text.split(',').flatMap((part) => {
      const [from, to = from] = part.split('-').map(Number) as [number, number?];
      return Array.from({ length: Math.max(0, to! - from + 1) }, (_, i) => from + i);
    });
    return [...new Set(pages)].sort((a, b) => a - b).slice(0, MOST_PAGES);
  });

export const sheetQuery = z.strictObject({
  /** Number of a revision, or 'draft': the layout as it is now, with DRAFT across it. */
  revision: z.union([z.literal('draft'), z.coerce.number().int().positive()]),
  paper: z.enum(['letter', 'a4']).default('letter'),
  pages: pageList.optional(),
  /** Labels only: the sheet of labels in the printer, and the first free label on it, counted from 1 along the rows. */
  grid: z.enum(LABEL_GRID_KEYS).optional(),
  start: z.coerce.number().int().min(1).max(100).default(1),
});

export type SheetQuery = z.infer<typeof sheetQuery>;

/** GET: every sheet, drawing and list of a revision or of the draft, and the job file, in one archive. */
export const BUNDLE_PATH = '/jobs/:jobId/sheets.zip';

export const bundleParams = z.strictObject({ jobId: uuid });
