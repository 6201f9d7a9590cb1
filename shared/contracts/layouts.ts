import { z } from 'zod';

import { editSchema } from '../layout/apply-edit';
import { layoutSchema } from '../layout/layout-schema';
import { contract } from './contract';
import { moment, uuid } from './fields';

const layoutParams = z.strictObject({ layoutId: uuid });

/** More edits than a person makes between two saves, even after a day without signal. */
const MOST_EDITS = 500;

export const loggedEditSchema = z.strictObject({
  seq: z.number().int().positive(),
  edit: editSchema,
  personId: uuid,
  personName: z.string(),
  at: moment,
});

export type LoggedEdit = z.infer<typeof loggedEditSchema>;

export const getLayout = contract({
  method: 'get',
  path: '/layouts/:layoutId',
  summary: 'The layout and the number of edits in it.',
  may: 'job.see',
  params: layoutParams,
  response: z.strictObject({
    layoutId: uuid,
    jobId: uuid,
    seq: z.number().int().min(0),
    layout: layoutSchema,
  }),
  problems: ['not_found'],
});

export const editsSinceSchema = z.strictObject({ seq: z.number().int().min(0), edits: z.array(loggedEditSchema) });

export type EditsSince = z.infer<typeof editsSinceSchema>;

export const listEdits = contract({
  method: 'get',
  path: '/layouts/:layoutId/edits',
  summary: 'Edits after a sequence number, in order: what others did.',
  may: 'job.see',
  params: layoutParams,
  query: z.strictObject({ since: z.coerce.number().int().min(0).default(0) }),
  response: editsSinceSchema,
  problems: ['not_found'],
});

/** What became of the edits sent. `others` and `applied` together, by `seq`, are everything that happened after `base`. */
export const editsOutcomeSchema = z.strictObject({
  seq: z.number().int().min(0),
  /** In the layout now, by this request or by an earlier one with the same id. */
  applied: z.array(z.strictObject({ id: uuid, seq: z.number().int().positive() })),
  /** Could not be kept: the edit with its values, and why, in a sentence. */
  refused: z.array(z.strictObject({ edit: editSchema, reason: z.string() })),
  others: z.array(loggedEditSchema),
});

export type EditsOutcome = z.infer<typeof editsOutcomeSchema>;

export const postEdits = contract({
  method: 'post',
  path: '/layouts/:layoutId/edits',
  summary: 'Apply edits in order; 409 with the same outcome where none of them applies any more.',
  may: 'layout.edit',
  params: layoutParams,
  body: z.strictObject({
    /** Sequence the client's edits were made on. */
    base: z.number().int().min(0),
    edits: z.array(editSchema).max(MOST_EDITS),
  }),
  response: editsOutcomeSchema,
  problems: ['not_found', 'edits_refused'],
});

export const takeStock = contract({
  method: 'post',
  path: '/layouts/:layoutId/stock',
  summary: "Put what the shop has of the layout's wood and thickness into it, as one edit by the caller.",
  may: 'layout.edit',
  params: layoutParams,
  body: z.strictObject({
    /** Id of the edit, made by the client, so that a resend does no harm. */
    editId: uuid,
    base: z.number().int().min(0),
  }),
  response: editsSinceSchema,
  problems: ['not_found'],
});
