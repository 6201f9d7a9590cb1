import { z } from 'zod';

import type { Plan } from '@/geometry/plan/types';
import { layoutSchema } from '../layout/layout-schema';
import { contract } from './contract';
import { moment, paragraph, uuid } from './fields';
import { nestPlanSchema } from './nest-plan-schema';
import { shopSettingsSchema } from './shop-settings';

const jobParams = z.strictObject({ jobId: uuid });
const revisionParams = z.strictObject({ jobId: uuid, number: z.coerce.number().int().positive() });

const person = z.strictObject({ id: uuid, name: z.string() });

export const revisionSummarySchema = z.strictObject({
  id: uuid,
  number: z.number().int().positive(),
  /** Edits in the layout when it was frozen. */
  layoutSeq: z.number().int().min(0),
  engine: z.string(),
  /** Of layout, settings, nest, plan and engine as canonical JSON, hex. */
  sha256: z.string().regex(/^[0-9a-f]{64}$/),
  note: z.string(),
  createdAt: moment,
  createdBy: person,
  signedOff: z.strictObject({ at: moment, by: person }).nullable(),
  sentBack: z.strictObject({ at: moment, by: person, note: z.string() }).nullable(),
  /** The layout was edited after it: 'changed since revision N'. */
  changedSince: z.boolean(),
});

export type RevisionSummary = z.infer<typeof revisionSummarySchema>;

/** Made by the server's own engine and stored by it: not checked again field by field. */
const planSchema = z.custom<Plan>((value) => typeof value === 'object' && value !== null);

export const revisionSchema = z.strictObject({
  ...revisionSummarySchema.shape,
  layout: layoutSchema,
  settings: shopSettingsSchema,
  plan: planSchema,
});

export type Revision = z.infer<typeof revisionSchema>;

export const listRevisions = contract({
  method: 'get',
  path: '/jobs/:jobId/revisions',
  summary: 'Revisions of a job, newest first.',
  may: 'job.see',
  params: jobParams,
  response: z.strictObject({ revisions: z.array(revisionSummarySchema) }),
  problems: ['not_found'],
});

export const freezeRevision = contract({
  method: 'post',
  path: '/jobs/:jobId/revisions',
  summary: 'Freeze the layout, the settings and the plan under the next number. The server computes the plan itself.',
  may: 'revision.freeze',
  creates: true,
  params: jobParams,
  body: z.strictObject({
    /** The layout as the person saw it; it must not have moved on. */
    seq: z.number().int().min(0),
    /** Nest result for exactly these pieces and this stock, or null where nothing is nested yet. */
    nest: nestPlanSchema.nullable(),
    note: paragraph(1000).default(''),
  }),
  response: revisionSummarySchema,
  problems: ['not_found', 'layout_moved_on', 'plan_refused'],
});

export const getRevision = contract({
  method: 'get',
  path: '/jobs/:jobId/revisions/:number',
  summary: 'One revision with its layout, settings and plan.',
  may: 'job.see',
  params: revisionParams,
  response: revisionSchema,
  problems: ['not_found'],
});

export const signOff = contract({
  method: 'post',
  path: '/jobs/:jobId/revisions/:number/sign-off',
  summary: 'Sign the newest revision off; the job moves to Signed off.',
  may: 'revision.sign',
  params: revisionParams,
  response: revisionSummarySchema,
  problems: ['not_found', 'already_decided', 'plan_refused', 'stage_refused'],
});

export const sendBack = contract({
  method: 'post',
  path: '/jobs/:jobId/revisions/:number/send-back',
  summary: 'Send a revision back with what has to change; the job stays in, or returns to, Drawn.',
  may: 'revision.sign',
  params: revisionParams,
  body: z.strictObject({ note: paragraph(1000).min(1, 'say what has to change') }),
  response: revisionSummarySchema,
  problems: ['not_found', 'already_decided'],
});
