import type { ProblemCode } from '@/shared/problems/problem';

/**
 * Everything that can go wrong between this page and the server, as one union. 'offline' and 'server' may be tried
 * again; 'problem' carries the server's code and a sentence for the person.
 */
export type ApiProblem =
  | { readonly kind: 'offline' }
  | { readonly kind: 'server'; readonly status: number }
  | { readonly kind: 'signed-out' }
  | {
      readonly kind: 'problem';
      readonly status: number;
      readonly code: ProblemCode;
      readonly detail: string;
      readonly issues: readonly { readonly path: string; readonly message: string }[];
      /** The whole answer, for problems that carry more than a sentence. */
      readonly body: unknown;
    };

/** A call that failed. Compare `problem.kind` and `problem.code`, never the message. */
export class ApiError extends Error {
  override readonly name = 'ApiError';
  constructor(readonly problem: ApiProblem) {
    super(sentenceOf(problem));
  }
}

/** What happened and what is kept, for a person. */
export function sentenceOf(problem: ApiProblem): string {
  switch (problem.kind) {
    case 'offline':
      return 'No signal. What you typed is kept on this device and sent when the signal is back.';
    case 'server':
      return 'The server could not answer. What you typed is kept; try again in a moment.';
    case 'signed-out':
      return 'You are signed out. Sign in again; what you typed is kept on this device.';
    case 'problem':
      return problem.detail;
  }
}
