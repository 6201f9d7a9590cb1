import { z } from 'zod';

import { contract } from './contract';
import { uuid } from './fields';
import { nestPlanSchema } from './nest-plan-schema';

/** Longest search a request may ask for, ms. */
export const LONGEST_SEARCH_MS = 30_000;

export const nestJob = contract({
  method: 'post',
  path: '/jobs/:jobId/nest',
  summary: 'Search the cheapest slabs for the layout as it is stored; nothing is kept.',
  may: 'plan.make',
  params: z.strictObject({ jobId: uuid }),
  body: z.strictObject({ limitMs: z.number().int().min(100).max(LONGEST_SEARCH_MS).default(5_000) }),
  response: z.strictObject({ seq: z.number().int().min(0), nest: nestPlanSchema }),
  problems: ['not_found', 'plan_refused', 'busy'],
});
