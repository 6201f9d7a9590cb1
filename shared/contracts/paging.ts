import { z } from 'zod';

const DEFAULT_PAGE = 50;
const LARGEST_PAGE = 200;

/** Query of a list: `after` is the `next` of the page before. */
export const pageQuery = {
  after: z.string().max(400).optional(),
  limit: z.coerce.number().int().min(1).max(LARGEST_PAGE).default(DEFAULT_PAGE),
};

/** One page of a list; `next` is null on the last one. */
export const pageOf = <T extends z.ZodType>(item: T) =>
  z.strictObject({ items: z.array(item), next: z.string().nullable() });

export interface Page<T> {
  readonly items: T[];
  readonly next: string | null;
}
