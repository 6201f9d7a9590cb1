import { PROBLEMS, type Problem, type ProblemCode, type ProblemIssue } from '@/shared/problems/problem';

/** An expected failure that becomes an HTTP answer. Anything else becomes a 500. */
export class ProblemError extends Error {
  override readonly name = 'ProblemError';
  readonly code: ProblemCode;
  readonly issues: readonly ProblemIssue[] | undefined;
  readonly more: Readonly<Record<string, unknown>> | undefined;

  /**
   * @param detail - what happened and what is kept, a sentence that a screen can show
   * @param given.issues - places in the request that are not right
   * @param given.more - members of its own that the contract of the route names
   */
  constructor(
    code: ProblemCode,
    detail: string,
    given: { readonly issues?: readonly ProblemIssue[]; readonly more?: Readonly<Record<string, unknown>> } = {},
  ) {
    super(detail);
    this.code = code;
    this.issues = given.issues;
    this.more = given.more;
  }

  get status(): number {
    return PROBLEMS[this.code].status;
  }

  /** The body of the answer. @see RFC 9457, 3.2 for members of its own */
  toProblem(): Problem {
    return {
      ...this.more,
      type: `urn:offsquare:problem:${this.code}`,
      title: PROBLEMS[this.code].title,
      status: this.status,
      code: this.code,
      detail: this.message,
      ...(this.issues ? { issues: [...this.issues] } : {}),
    };
  }
}
