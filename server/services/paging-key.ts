import { z } from 'zod';

import type { Page } from '@/shared/contracts/paging';
import { ProblemError } from '../http/problem-error';

const keySchema = z.tuple([z.iso.datetime(), z.uuid()]);

export interface PagingKey {
  readonly at: string;
  readonly id: string;
}

/**
 * Reads the `next` of the page before.
 *
 * @throws ProblemError validation_failed when it is none of ours
 */
export function readPagingKey(after: string | undefined): PagingKey | null {
  if (after === undefined) return null;
  try {
    const [at, id] = keySchema.parse(JSON.parse(Buffer.from(after, 'base64url').toString('utf8')));
    return { at, id };
  } catch {
    throw new ProblemError('validation_failed', 'This page cannot be found. Start at the first one.', {
      issues: [{ path: 'query.after', message: 'has to be the "next" of the page before' }],
    });
  }
}

/**
 * Makes a page of rows that were asked for with one more than fits: the one over tells that there is a next page.
 *
 * @param keyOf - the paging key of a row
 */
export function pageOfRows<Row, Item>(
  rows: readonly Row[],
  limit: number,
  keyOf: (row: Row) => { readonly at: Date; readonly id: string },
  toItem: (row: Row) => Item,
): Page<Item> {
  const shown = rows.slice(0, limit);
  const last = shown.at(-1);
  const more = rows.length > limit && last !== undefined;
  const next = more ? pagingKey(keyOf(last)) : null;
  return { items: shown.map(toItem), next };
}

function pagingKey({ at, id }: { readonly at: Date; readonly id: string }): string {
  return Buffer.from(JSON.stringify([at.toISOString(), id])).toString('base64url');
}
