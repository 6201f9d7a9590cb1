import type { z } from 'zod';

import type { ProblemCode } from '../problems/problem';
import type { Permission } from '../roles/roles';

/** Every path of a contract lies below this. */
export const API_ROOT = '/api/v1';

/** What one address takes and gives; the server checks it, the client is typed by it, the API document is made of it. */
export interface Contract {
  readonly method: 'get' | 'post' | 'patch' | 'delete';
  /** Below API_ROOT, parameters as `:name`. */
  readonly path: `/${string}`;
  /** One line for the API document. */
  readonly summary: string;
  /** 'public': no sign-in; 'member': anybody of a shop; else the permission it takes. */
  readonly may: 'public' | 'member' | Permission;
  readonly params?: z.ZodObject;
  readonly query?: z.ZodObject;
  readonly body?: z.ZodType;
  /** Null: no body, status 204. */
  readonly response: z.ZodType | null;
  /** Makes something: the request must carry an Idempotency-Key, and a resend with the same key makes nothing new. */
  readonly creates?: true;
  /** Problems of its own, beside those that any request can meet. */
  readonly problems: readonly ProblemCode[];
}

/** Keeps the exact type of a contract while checking its shape. */
export const contract = <const C extends Contract>(given: C): C => given;

type Output<T> = T extends z.ZodType ? z.output<T> : undefined;
type Input<T> = T extends z.ZodType ? z.input<T> : undefined;

/** What the client puts in. */
export type ParamsOf<C extends Contract> = Input<C['params']>;
export type QueryOf<C extends Contract> = Input<C['query']>;
export type BodyOf<C extends Contract> = Input<C['body']>;

/** What the server's handler gets. */
export type ParsedParams<C extends Contract> = Output<C['params']>;
export type ParsedQuery<C extends Contract> = Output<C['query']>;
export type ParsedBody<C extends Contract> = Output<C['body']>;

/** What comes back. */
export type ResponseOf<C extends Contract> = Output<C['response']>;
