import { z } from 'zod';

import { STAGES } from '../roles/stages';
import { contract } from './contract';
import { day, email, given, line, moment, paragraph, uuid } from './fields';
import { pageOf, pageQuery } from './paging';

const ring = z.array(z.tuple([z.number(), z.number()]).readonly()).readonly();

/** Outlines for the list, inches, y up: the wall line as solved (as sketched until then) and the pieces. */
export const thumbnailSchema = z.strictObject({
  walls: ring,
  closed: z.boolean(),
  pieces: z.array(ring).readonly(),
});

export type Thumbnail = z.infer<typeof thumbnailSchema>;

const personOf = z.strictObject({ id: uuid, name: z.string() }).nullable();

const jobRow = {
  id: uuid,
  number: z.number().int(),
  name: z.string(),
  customerName: z.string(),
  siteAddress: z.string(),
  stage: z.enum(STAGES),
  sentForCheckAt: moment.nullable(),
  /** The date of what comes next: measuring, cutting or fitting. */
  nextOn: day.nullable(),
  installer: personOf,
  designer: personOf,
  shopHand: personOf,
  /** Number of the newest revision. */
  revision: z.number().int().nullable(),
  signedOff: z.boolean(),
  /** The layout was edited after that revision: 'changed since revision N'. */
  changedSince: z.boolean(),
  updatedAt: moment,
};

export const jobListItemSchema = z.strictObject({ ...jobRow, thumbnail: thumbnailSchema.nullable() });

export const jobSchema = z.strictObject({
  ...jobRow,
  layoutId: uuid,
  customerEmail: z.string(),
  customerPhone: z.string(),
  measureOn: day.nullable(),
  cutOn: day.nullable(),
  fitOn: day.nullable(),
  createdAt: moment,
});

export type JobListItem = z.infer<typeof jobListItemSchema>;
export type Job = z.infer<typeof jobSchema>;

const jobParams = z.strictObject({ jobId: uuid });

export const listJobs = contract({
  method: 'get',
  path: '/jobs',
  summary: 'Jobs of the shop, last touched first.',
  may: 'job.see',
  query: z.strictObject({
    ...pageQuery,
    /** In name, customer, address and number. */
    search: line(100).optional(),
    stage: z.enum(STAGES).optional(),
    /** On the job as installer, designer or shop hand. */
    person: uuid.optional(),
  }),
  response: pageOf(jobListItemSchema),
  problems: [],
});

export const createJob = contract({
  method: 'post',
  path: '/jobs',
  summary: 'Open a job with an empty layout.',
  may: 'job.edit',
  creates: true,
  body: z.strictObject({
    name: given(120),
    customerName: line(120).default(''),
    siteAddress: line(300).default(''),
  }),
  response: jobSchema,
  problems: [],
});

export const getJob = contract({
  method: 'get',
  path: '/jobs/:jobId',
  summary: 'One job.',
  may: 'job.see',
  params: jobParams,
  response: jobSchema,
  problems: ['not_found'],
});

export const updateJob = contract({
  method: 'patch',
  path: '/jobs/:jobId',
  summary: 'Change customer, address, dates or people; what is left out stays.',
  may: 'job.edit',
  params: jobParams,
  body: z.strictObject({
    name: given(120).optional(),
    customerName: line(120).optional(),
    customerEmail: z.union([email, z.literal('')]).optional(),
    customerPhone: line(40).optional(),
    siteAddress: line(300).optional(),
    measureOn: day.nullable().optional(),
    cutOn: day.nullable().optional(),
    fitOn: day.nullable().optional(),
    installerId: uuid.nullable().optional(),
    designerId: uuid.nullable().optional(),
    shopHandId: uuid.nullable().optional(),
  }),
  response: jobSchema,
  problems: ['not_found'],
});

export const moveStage = contract({
  method: 'post',
  path: '/jobs/:jobId/stage',
  summary: 'Move a job to another stage; who and when are kept.',
  may: 'member',
  params: jobParams,
  body: z.strictObject({ to: z.enum(STAGES), note: paragraph(1000).default('') }),
  response: jobSchema,
  problems: ['not_found', 'stage_refused'],
});

export const sendForCheck = contract({
  method: 'post',
  path: '/jobs/:jobId/send-for-check',
  summary: 'Ask a designer to check a drawn job.',
  may: 'layout.edit',
  params: jobParams,
  response: jobSchema,
  problems: ['not_found', 'stage_refused'],
});

export const activitySchema = z.strictObject({
  id: uuid,
  at: moment,
  personName: z.string().nullable(),
  action: z.string(),
  /** What the action was about, as it was stored. */
  data: z.record(z.string(), z.unknown()),
});

export type Activity = z.infer<typeof activitySchema>;

export const listActivity = contract({
  method: 'get',
  path: '/jobs/:jobId/activity',
  summary: 'Who did what on a job, newest first.',
  may: 'job.see',
  params: jobParams,
  query: z.strictObject(pageQuery),
  response: pageOf(activitySchema),
  problems: ['not_found'],
});
