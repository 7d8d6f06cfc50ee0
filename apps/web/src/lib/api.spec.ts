import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { z } from 'zod';
import { callApi, callApiData } from './api';
import { ApiProblem } from './api-problem';

const fetched = vi.fn<typeof fetch>();
beforeEach(() => vi.stubGlobal('fetch', fetched));
afterEach(() => {
  vi.unstubAllGlobals();
  fetched.mockReset();
});

const sent = () => {
  const [url, init] = fetched.mock.calls[0] ?? [];
  return { url, init, headers: new Headers(init?.headers) };
};
const json = (body: unknown, status = 200, headers: Record<string, string> = {}) =>
  new Response(JSON.stringify(body), { status, headers: { 'Content-Type': 'application/json', ...headers } });
const problem = (body: unknown, status: number, headers: Record<string, string> = {}) =>
  json(body, status, { 'Content-Type': 'application/problem+json', ...headers });

describe('callApi', () => {
  it('reads with cookies of this site and hands over body and ETag', async () => {
    fetched.mockResolvedValue(json({ name: 'Kell' }, 200, { ETag: '"7"' }));
    const answer = await callApi('/frames/x', { schema: z.object({ name: z.string() }) });
    expect(answer).toEqual({ data: { name: 'Kell' }, etag: '"7"', status: 200 });
    expect(sent().url).toBe('/api/frames/x');
    expect(sent().init).toMatchObject({ method: 'GET', credentials: 'same-origin' });
    expect(sent().headers.has('X-Linkfell-Csrf')).toBe(false);
  });

  it('marks a change as ours and carries its keys', async () => {
    fetched.mockResolvedValue(new Response(null, { status: 204 }));
    await callApi('/plans', { method: 'POST', body: { a: 1 }, ifMatch: '"7"', idempotencyKey: 'k-1' });
    const { headers, init } = sent();
    expect(Object.fromEntries(headers)).toMatchObject({
      'x-linkfell-csrf': '1',
      'content-type': 'application/json',
      'if-match': '"7"',
      'idempotency-key': 'k-1',
    });
    expect(init?.body).toBe('{"a":1}');
  });

  it('turns problem details into an ApiProblem with its faults', async () => {
    fetched.mockResolvedValue(
      problem(
        {
          type: '/problems/invalid',
          title: 'Check your answers',
          status: 400,
          code: 'invalid',
          errors: [{ pointer: '/strokeMm', detail: 'Enter the stroke in mm' }],
        },
        400,
      ),
    );
    const error: unknown = await callApi('/x', { method: 'PUT', body: {} }).catch(
      (thrown: unknown) => thrown,
    );
    expect(error).toBeInstanceOf(ApiProblem);
    expect(error).toMatchObject({ status: 400, code: 'invalid', title: 'Check your answers' });
    expect((error as ApiProblem).faultAt('/strokeMm')).toBe('Enter the stroke in mm');
    expect((error as ApiProblem).faultAt('/other')).toBeUndefined();
  });

  it('survives an answer that is no problem document, and reads how long to wait', async () => {
    fetched.mockResolvedValue(
      new Response('<h1>Bad gateway</h1>', { status: 502, headers: { 'Retry-After': '30' } }),
    );
    await expect(callApi('/x')).rejects.toMatchObject({ status: 502, retryAfterS: 30, errors: [] });
  });

  it('says so when there is no connection, and lets a cancelled call be', async () => {
    fetched.mockRejectedValueOnce(new TypeError('failed'));
    await expect(callApi('/x')).rejects.toMatchObject({ status: 0, code: 'unreachable' });
    const stop = new AbortController();
    stop.abort();
    fetched.mockRejectedValueOnce(new DOMException('stopped', 'AbortError'));
    await expect(callApi('/x', { signal: stop.signal })).rejects.toMatchObject({ name: 'AbortError' });
  });

  it('refuses an answer of another shape', async () => {
    fetched.mockResolvedValue(json({ name: 7 }));
    await expect(callApiData('/x', { schema: z.object({ name: z.string() }) })).rejects.toThrow();
  });
});
