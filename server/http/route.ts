import { createHash } from 'node:crypto';

import type { Request, Response, Router } from 'express';
import type { z } from 'zod';

import type { Contract, ParsedBody, ParsedParams, ParsedQuery } from '@/shared/contracts/contract';
import type { ProblemIssue } from '@/shared/problems/problem';
import type { Actor, Once } from '../services/actor';
import { actorOf } from './authenticate';
import { ProblemError } from './problem-error';

export interface RouteInput<C extends Contract> {
  readonly params: ParsedParams<C>;
  readonly query: ParsedQuery<C>;
  readonly body: ParsedBody<C>;
  /** Nobody on a public route. */
  readonly actor: C['may'] extends 'public' ? undefined : Actor;
  readonly req: Request;
  readonly res: Response;
}

type Answer<C extends Contract> = C['response'] extends z.ZodType ? z.input<C['response']> : void;

/**
 * Puts a contract on a router: what comes in is parsed, `handler` is called, what goes out is checked.
 *
 * @param status - of a good answer; a contract without a response answers 204
 * @throws ProblemError validation_failed with the path of every field that is not right; not_signed_in;
 *   idempotency_key_required where the contract creates something
 */
export function route<C extends Contract>(
  router: Router,
  contract: C,
  status: number,
  handler: (input: RouteInput<C>) => Promise<Answer<C>>,
): void {
  router[contract.method](contract.path, async (req: Request, res: Response) => {
    const actor = contract.may === 'public' ? undefined : actorOf(res);
    const input = {
      ...parseRequest(contract, req),
      actor: actor && contract.creates ? { ...actor, once: readOnce(req) } : actor,
      req,
      res,
    };
    const answer = await handler(input as RouteInput<C>);
    if (contract.method === 'get') res.set('Cache-Control', 'private, no-cache');
    else res.set('Cache-Control', 'no-store');
    if (contract.response === null) res.status(204).end();
    else res.status(status).json(contract.response.parse(answer));
  });
}

/**
 * Parses what came in by the schemas given.
 *
 * @throws ProblemError validation_failed with the path of every field that is not right; not_found for an id that is none
 */
export function parseRequest(contract: Pick<Contract, 'params' | 'query' | 'body'>, req: Request) {
  const issues: ProblemIssue[] = [];
  const read = (name: string, schema: z.ZodType | undefined, value: unknown): unknown => {
    if (!schema) return undefined;
    const parsed = schema.safeParse(value);
    if (parsed.success) return parsed.data;
    for (const issue of parsed.error.issues) {
      issues.push({ path: [name, ...issue.path].join('.'), message: issue.message });
    }
    return undefined;
  };
  const params = read('params', contract.params, req.params);
  const query = read('query', contract.query, req.query);
  const body = read('body', contract.body, contract.body ? jsonBody(req) : undefined);
  // An address with an id that is none names nothing.
  if (issues.length > 0 && issues.every((issue) => issue.path.startsWith('params.'))) {
    throw new ProblemError('not_found', 'There is nothing at this address.');
  }
  if (issues.length > 0) {
    throw new ProblemError('validation_failed', 'Something in the request is not right. Nothing was changed.', {
      issues,
    });
  }
  return { params, query, body };
}

function jsonBody(req: Request): unknown {
  if (req.is('application/json') === false) {
    throw new ProblemError('media_type_refused', 'The body has to be JSON (Content-Type: application/json).');
  }
  return req.body as unknown;
}

function readOnce(req: Request): Once {
  const key = req.get('idempotency-key') ?? '';
  if (!/^[\x21-\x7e]{8,200}$/.test(key)) {
    throw new ProblemError(
      'idempotency_key_required',
      'This request makes something new: send an Idempotency-Key of 8 to 200 characters, the same one when you send again.',
    );
  }
  const body = JSON.stringify(req.body ?? null);
  const requestHash = createHash('sha256').update(`${req.method} ${req.originalUrl}\n${body}`).digest();
  return { key, requestHash };
}
