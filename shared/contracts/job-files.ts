import { z } from 'zod';

import { contract } from './contract';
import { line, uuid } from './fields';
import { jobSchema } from './jobs';

export const exportJob = contract({
  method: 'get',
  path: '/jobs/:jobId/file',
  summary: 'The job file: the layout in the words of docs/formats.md, as a download.',
  may: 'job.see',
  params: z.strictObject({ jobId: uuid }),
  response: z.record(z.string(), z.unknown()),
  problems: ['not_found'],
});

export const importJob = contract({
  method: 'post',
  path: '/job-files',
  summary: 'Open a job from a job file; every place in the file that is not right is named.',
  may: 'job.edit',
  creates: true,
  body: z.strictObject({
    file: z.unknown(),
    customerName: line(120).default(''),
    siteAddress: line(300).default(''),
  }),
  response: jobSchema,
  problems: ['job_file_refused'],
});
