/** One fault in the request, at an RFC 6901 pointer into the body (or `query/…`, `path/…`). */
export interface FieldProblem {
  pointer: string;
  detail: string;
}

export interface ProblemExtras {
  /** One plain sentence for the person who reads it. */
  detail?: string;
  errors?: FieldProblem[];
  /** Further members of the answer, such as the next free slots. */
  extensions?: Record<string, unknown>;
  headers?: Record<string, string>;
  cause?: unknown;
}

/** A refusal that the caller may read: becomes an RFC 9457 answer. Anything else that is thrown becomes a bare 500. */
export class ProblemException extends Error {
  constructor(
    readonly code: string,
    readonly status: number,
    readonly title: string,
    readonly extras: ProblemExtras = {},
  ) {
    super(`${code}: ${extras.detail ?? title}`, { cause: extras.cause });
  }
}

/**
 * Base class of a feature's exceptions: a closed set of codes, each with its status and title.
 *
 * @example
 * export class OrdersException extends problems({
 *   'stock-gone': { status: 409, title: 'Somebody bought the last one' },
 * }) {}
 * throw new OrdersException('stock-gone', { detail: 'Your plan is kept.' });
 */
export function problems<const Table extends Record<string, { status: number; title: string }>>(
  table: Table,
) {
  return class FeatureException extends ProblemException {
    constructor(code: keyof Table & string, extras: ProblemExtras = {}) {
      const { status, title } = table[code] as { status: number; title: string };
      super(code, status, title, extras);
    }
  };
}

/** What everybody may run into; features have their own. */
export class CommonException extends problems({
  'not-found': { status: 404, title: 'There is nothing here, or it is not yours to see' },
  'sign-in-needed': { status: 401, title: 'Sign in first' },
  'role-missing': { status: 403, title: 'Your role does not include this' },
  'cross-site': { status: 403, title: 'This request did not come from our own pages' },
  invalid: { status: 422, title: 'Some answers need another look' },
  'precondition-missing': { status: 428, title: 'Say which version you are changing' },
  'precondition-failed': { status: 412, title: 'Somebody changed this in the meantime' },
  'idempotency-key-missing': { status: 400, title: 'This request needs an Idempotency-Key' },
  'idempotency-key-reused': { status: 422, title: 'This Idempotency-Key was used for another request' },
  'still-at-work': { status: 409, title: 'The same request is still being worked on' },
  'too-many-requests': { status: 429, title: 'Too many requests; wait a little' },
  busy: { status: 503, title: 'Too many people changed the same thing at once; try again' },
}) {}
