import { z } from 'zod';

/** Every failure a caller can meet: its stable code, its HTTP status and its title. */
export const PROBLEMS = {
  malformed_json: { status: 400, title: 'The request is not JSON' },
  idempotency_key_required: { status: 400, title: 'The request needs an Idempotency-Key' },
  not_signed_in: { status: 401, title: 'Sign in first' },
  wrong_sign_in: { status: 401, title: 'E-mail or password is wrong' },
  session_ended: { status: 401, title: 'Sign in again' },
  not_allowed: { status: 403, title: 'Not for this role' },
  not_found: { status: 404, title: 'Not there' },
  edits_refused: { status: 409, title: 'These changes no longer fit' },
  stage_refused: { status: 409, title: 'The job cannot move there' },
  layout_moved_on: { status: 409, title: 'The layout has changed since' },
  plan_refused: { status: 409, title: 'The plan cannot be used' },
  already_decided: { status: 409, title: 'The revision is already decided on' },
  code_taken: { status: 409, title: 'The name is taken' },
  already_in_crew: { status: 409, title: 'Already in the crew' },
  last_owner: { status: 409, title: 'The shop needs an owner' },
  link_ended: { status: 410, title: 'The link has ended' },
  body_too_large: { status: 413, title: 'Too large' },
  media_type_refused: { status: 415, title: 'Only JSON is taken' },
  validation_failed: { status: 422, title: 'Something in it is not right' },
  job_file_refused: { status: 422, title: 'The job file cannot be read' },
  idempotency_key_reused: { status: 422, title: 'The Idempotency-Key belongs to another request' },
  too_many_requests: { status: 429, title: 'Too many tries' },
  internal_error: { status: 500, title: 'The server made a mistake' },
  busy: { status: 503, title: 'The server is busy' },
} as const satisfies Record<string, { readonly status: number; readonly title: string }>;

export type ProblemCode = keyof typeof PROBLEMS;

export const PROBLEM_CODES = Object.keys(PROBLEMS) as [ProblemCode, ...ProblemCode[]];

/** Where in the request something is wrong: `body.walls.0.length`, and the sentence to show there. */
export const problemIssueSchema = z.object({ path: z.string(), message: z.string() });

/** The body of every failure, `application/problem+json`. @see RFC 9457 */
export const problemSchema = z.looseObject({
  type: z.string(),
  title: z.string(),
  status: z.number().int(),
  code: z.enum(PROBLEM_CODES),
  /** What happened and what is kept, a sentence to show. */
  detail: z.string(),
  issues: z.array(problemIssueSchema).optional(),
});

export type Problem = z.infer<typeof problemSchema>;
export type ProblemIssue = z.infer<typeof problemIssueSchema>;
