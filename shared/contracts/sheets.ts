import { z } from 'zod';

import { uuid } from './fields';

/** GET: the cut sheet as a PDF, a page a slab. */
export const CUT_SHEET_PATH = '/jobs/:jobId/sheets/cut.pdf';

export const cutSheetParams = z.strictObject({ jobId: uuid });

export const cutSheetQuery = z.strictObject({
  /** Number of a revision, or 'draft': the layout as it is now, with DRAFT across it. */
  revision: z.union([z.literal('draft'), z.coerce.number().int().positive()]),
  paper: z.enum(['letter', 'a4']).default('letter'),
});

export type CutSheetQuery = z.infer<typeof cutSheetQuery>;
