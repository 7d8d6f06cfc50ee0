import { setTimeout as sleep } from 'node:timers/promises';

import { Controller, Get } from '@nestjs/common';

import { Public } from '../../src/common/access/access.js';
import { startTestApp, type TestApp } from '../support/app.js';

let begun = 0;

@Controller('slow')
class SlowController {
  @Get()
  @Public()
  async slow(): Promise<{ done: true }> {
    begun += 1;
    await sleep(400);
    return { done: true };
  }
}

describe('operations', () => {
  let app: TestApp;
  beforeAll(async () => {
    app = await startTestApp();
  });
  afterAll(() => app.close());

  it('says that it lives and that it is ready', async () => {
    await app.client().get('/health/live').expect(200, { status: 'ok' });
    const ready = await app.client().get('/health/ready').expect(200);
    expect(ready.body.details.database.status).toBe('up');
  });

  it('counts requests per route template for a collector on this machine only', async () => {
    await app.client().get('/health/live').expect(200);
    const { text } = await app.client().get('/metrics').expect(200);
    expect(text).toMatch(
      /http_request_duration_seconds_count\{method="GET",route="\/health\/live",status="200"\} [1-9]/,
    );
    await app.client().get('/metrics').set('X-Forwarded-For', '203.0.113.9').expect(404);
  });

  it('answers unknown addresses with problem details and no page', async () => {
    const answer = await app.client().get('/api/nothing-here').expect(404);
    expect(answer.headers['content-type']).toBe('application/problem+json; charset=utf-8');
    expect(answer.body).toMatchObject({ title: 'Not Found', status: 404 });
    expect(answer.headers).toMatchObject({
      'cache-control': 'no-store',
      'x-content-type-options': 'nosniff',
      'referrer-policy': 'same-origin',
      'content-security-policy': expect.stringContaining("default-src 'none'"),
    });
    expect(answer.headers['strict-transport-security']).toBeUndefined();
    expect(answer.headers['x-powered-by']).toBeUndefined();
  });

  it('gives every request an id and takes over a harmless one', async () => {
    const own = await app.client().get('/health/live');
    expect(own.headers['x-request-id']).toMatch(/^[0-9a-f-]{36}$/);
    const given = await app.client().get('/health/live').set('X-Request-Id', 'proxy-12345');
    expect(given.headers['x-request-id']).toBe('proxy-12345');
    const bad = await app.client().get('/health/live').set('X-Request-Id', 'a b <script>');
    expect(bad.headers['x-request-id']).toMatch(/^[0-9a-f-]{36}$/);
  });

  it('finishes what it has begun when it is told to stop, and takes no more', async () => {
    const stopping = await startTestApp({ WORKER: 'in-process' }, { controllers: [SlowController] });
    const slow = stopping.client().get('/api/slow').expect(200, { done: true });
    const answered = slow.then(() => Date.now());
    while (begun === 0) await sleep(5);
    const closed = stopping.close().then(() => Date.now());
    expect(await answered).toBeLessThanOrEqual(await closed);
    await expect(fetch(`${stopping.url}/health/live`)).rejects.toThrow();
  });
});
