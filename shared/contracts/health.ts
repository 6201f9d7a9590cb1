import { z } from 'zod';

import { contract } from './contract';

export const getHealth = contract({
  method: 'get',
  path: '/health',
  summary: 'Whether the server and its database answer.',
  may: 'public',
  response: z.strictObject({ status: z.literal('ok') }),
  problems: ['busy'],
});
