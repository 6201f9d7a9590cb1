import { z } from 'zod';

import { editsOutcomeSchema, getLayout, listEdits, postEdits } from '@/shared/contracts/layouts';
import type { LayoutLink } from '../editor/sync';
import { ApiError } from './api-problem';
import { call } from './client';

/** The answer is a problem with the outcome's fields beside it. */
const refusedOutcome = z.object(editsOutcomeSchema.shape);

/** The way from the editor of one layout to the server. */
export function layoutLink(layoutId: string): LayoutLink {
  const params = { layoutId };
  return {
    list: (since) => call(listEdits, { params, query: { since } }),
    post: async (base, edits) => {
      try {
        return await call(postEdits, { params, body: { base, edits: [...edits] } });
      } catch (error) {
        // None of the edits fits any more: the answer still says what happened and gives them back.
        const body = error instanceof ApiError && error.problem.kind === 'problem' ? error.problem.body : null;
        const outcome = refusedOutcome.safeParse(body);
        if (outcome.success) return outcome.data;
        throw error;
      }
    },
  };
}

/** The layout as the server has it. */
export const fetchLayout = (layoutId: string) => call(getLayout, { params: { layoutId } });
