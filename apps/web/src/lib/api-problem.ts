import type { Problem } from '@linkfell/contracts';

type FieldFault = NonNullable<Problem['errors']>[number];

/** An answer of the API that is not a success, as RFC 9457 problem details, or no answer at all (status 0). */
export class ApiProblem extends Error {
  override readonly name = 'ApiProblem';
  readonly type: string;
  readonly title: string;
  readonly status: number;
  readonly detail: string | undefined;
  readonly code: string | undefined;
  /** Faults in what was sent, by JSON pointer (RFC 6901) into the body. */
  readonly errors: readonly FieldFault[];
  /** Seconds to wait, where the server named them (429, 503). */
  readonly retryAfterS: number | undefined;

  constructor(problem: Partial<Problem> & { status: number }, retryAfterS?: number) {
    super(problem.detail ?? problem.title ?? `The server answered ${problem.status}`);
    this.type = problem.type ?? 'about:blank';
    this.title = problem.title ?? 'Something went wrong';
    this.status = problem.status;
    this.detail = problem.detail;
    this.code = problem.code;
    this.errors = problem.errors ?? [];
    this.retryAfterS = retryAfterS;
  }

  /** The fault at a pointer such as "/strokeMm"; undefined when that field is in order. */
  faultAt(pointer: string): string | undefined {
    return this.errors.find((fault) => fault.pointer === pointer)?.detail;
  }
}

export const isApiProblem = (error: unknown): error is ApiProblem => error instanceof ApiProblem;
