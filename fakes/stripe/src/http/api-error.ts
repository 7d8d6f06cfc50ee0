export interface ApiErrorBody {
  type: 'invalid_request_error' | 'card_error' | 'idempotency_error' | 'api_error';
  message: string;
  code?: string;
  param?: string;
  decline_code?: string;
  charge?: string;
  payment_intent?: unknown;
  payment_method?: unknown;
}

/**
 * An answer in the form of the API's documented error object.
 * `saved` says whether an idempotency key keeps it: refused parameters never began to run and are not kept.
 */
export class ApiError extends Error {
  constructor(
    readonly status: number,
    readonly body: ApiErrorBody,
    readonly saved = true,
  ) {
    super(body.message);
  }
}

/** Parameters that were refused before anything ran. */
export function invalidParam(message: string, param?: string, code?: string): ApiError {
  return new ApiError(400, { type: 'invalid_request_error', message, param, code }, false);
}

/** A request that its object's state does not allow. */
export function refused(message: string, extra: Partial<ApiErrorBody> = {}): ApiError {
  return new ApiError(400, { type: 'invalid_request_error', message, ...extra });
}

/** The object named in the path (404) or in a parameter (400) does not exist. */
export function missing(kind: string, id: string, param = 'id'): ApiError {
  return new ApiError(param === 'id' ? 404 : 400, {
    type: 'invalid_request_error',
    code: 'resource_missing',
    message: `No such ${kind}: '${id}'`,
    param,
  });
}
