import { z } from 'zod';

import { contract } from './contract';
import { moment, uuid } from './fields';

const jobParams = z.strictObject({ jobId: uuid });

const stepName = z.string().min(1).max(200);

/** A day in a shop without signal makes a few dozen. */
const MOST_ACTS = 200;

export const workMarkSchema = z.strictObject({
  step: stepName,
  startedAt: moment.nullable(),
  startedBy: z.string().nullable(),
  doneAt: moment.nullable(),
  doneBy: z.string().nullable(),
  /** When what follows may begin: the glue has cured, the coat is dry. */
  readyAt: moment.nullable(),
});

export const workMarksSchema = z.strictObject({ marks: z.array(workMarkSchema) });

export const getWork = contract({
  method: 'get',
  path: '/jobs/:jobId/work',
  summary: 'Steps of the order of work that were begun or ticked, with who and when.',
  may: 'job.see',
  params: jobParams,
  response: workMarksSchema,
  problems: ['not_found'],
});

export const postWork = contract({
  method: 'post',
  path: '/jobs/:jobId/work',
  summary:
    'Begin, tick or take back steps, also some that were ticked without signal; a resend of an id changes nothing.',
  may: 'work.tick',
  params: jobParams,
  body: z.strictObject({
    /** The device's clock when this is sent: times are kept by how long ago they were, whatever that clock says. */
    sentAt: moment,
    acts: z
      .array(
        z.strictObject({
          id: uuid,
          step: stepName,
          act: z.enum(['start', 'done', 'undo']),
          /** By the device's clock. */
          at: moment,
          waitHours: z.number().min(0).max(2000).default(0),
        }),
      )
      .max(MOST_ACTS),
  }),
  response: workMarksSchema,
  problems: ['not_found'],
});
