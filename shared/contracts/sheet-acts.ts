import { z } from 'zod';

import { contract } from './contract';
import { moment, paragraph, uuid } from './fields';

const jobParams = z.strictObject({ jobId: uuid });

export const sheetPrintSchema = z.strictObject({
  /** Number of the revision that was printed or downloaded. */
  revision: z.number().int().positive(),
  kinds: z.array(z.string()),
  at: moment,
  by: z.string(),
});

export type SheetPrint = z.infer<typeof sheetPrintSchema>;

export const listPrints = contract({
  method: 'get',
  path: '/jobs/:jobId/prints',
  summary: 'Which revisions have gone to paper, newest first: sheets of an older one have to be binned.',
  may: 'job.see',
  params: jobParams,
  response: z.strictObject({ prints: z.array(sheetPrintSchema) }),
  problems: ['not_found'],
});

export const mailSheets = contract({
  method: 'post',
  path: '/jobs/:jobId/sheet-mails',
  summary: 'Send somebody of the crew a mail with the way to the sheets of a revision.',
  may: 'sheet.print',
  creates: true,
  params: jobParams,
  body: z.strictObject({
    personId: uuid,
    revision: z.number().int().positive(),
    note: paragraph(1000).default(''),
  }),
  response: z.strictObject({ sentTo: z.string() }),
  problems: ['not_found'],
});
