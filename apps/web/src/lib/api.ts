import { ApiProblem } from './api-problem';

/** What we need of a zod schema; typed loosely so that zod itself stays out of pages that never call the API. */
export interface ResponseSchema<T> {
  parse(value: unknown): T;
}

export interface ApiRequest<T> {
  method?: 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';
  /** Sent as JSON. */
  body?: unknown;
  /** Parses the answer; left out where the answer has no body. */
  schema?: ResponseSchema<T>;
  /** The ETag that was read with what is now changed: sent as If-Match (412 when somebody was quicker). */
  ifMatch?: string;
  /** The same key again asks for the same outcome, not for a second one. */
  idempotencyKey?: string;
  signal?: AbortSignal;
}

export interface ApiAnswer<T> {
  data: T;
  etag: string | null;
  status: number;
}

function headersOf({ method = 'GET', body, ifMatch, idempotencyKey }: ApiRequest<unknown>): Headers {
  const headers = new Headers({ Accept: 'application/json, application/problem+json' });
  if (method !== 'GET') headers.set('X-Linkfell-Csrf', '1');
  if (body !== undefined) headers.set('Content-Type', 'application/json');
  if (ifMatch) headers.set('If-Match', ifMatch);
  if (idempotencyKey) headers.set('Idempotency-Key', idempotencyKey);
  return headers;
}

async function problemOf(response: Response): Promise<ApiProblem> {
  const wait = Number(response.headers.get('Retry-After') ?? Number.NaN);
  const isProblem = /\bjson\b/.test(response.headers.get('Content-Type') ?? '');
  const body: unknown = isProblem ? await response.json().catch(() => null) : null;
  const known = typeof body === 'object' && body !== null ? body : {};
  return new ApiProblem({ ...known, status: response.status }, Number.isFinite(wait) ? wait : undefined);
}

/**
 * Calls our API at a path below /api, with the reader's own cookies.
 * @returns the parsed body with its ETag
 * @throws {ApiProblem} for every answer but success; status 0 when the server could not be reached
 */
export async function callApi<T = void>(path: string, request: ApiRequest<T> = {}): Promise<ApiAnswer<T>> {
  const { method = 'GET', body, schema, signal } = request;
  let response: Response;
  try {
    response = await fetch(`/api${path}`, {
      method,
      headers: headersOf(request),
      credentials: 'same-origin',
      body: body === undefined ? undefined : JSON.stringify(body),
      signal,
    });
  } catch (error) {
    if (signal?.aborted) throw error;
    throw new ApiProblem({
      status: 0,
      code: 'unreachable',
      title: 'No connection',
      detail:
        'We could not reach Linkfell. Check your connection, then try again. Nothing you typed is lost.',
    });
  }
  if (!response.ok) throw await problemOf(response);
  const answer = { etag: response.headers.get('ETag'), status: response.status };
  if (!schema) return { ...answer, data: undefined as T };
  return { ...answer, data: schema.parse(await response.json()) };
}

/** As callApi, for those who need nothing but the body. */
export async function callApiData<T>(
  path: string,
  request: ApiRequest<T> & { schema: ResponseSchema<T> },
): Promise<T> {
  return (await callApi(path, request)).data;
}
