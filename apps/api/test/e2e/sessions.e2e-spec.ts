import { setTimeout as sleep } from 'node:timers/promises';

import { Controller, Get, Param, Post, Req } from '@nestjs/common';
import type { Request } from 'express';

import { Public } from '../../src/common/access/access.js';
import { GrantsService } from '../../src/common/access/grants.service.js';
import { createAccount } from '../factories/account.factory.js';
import { startTestApp, type TestApp } from '../support/app.js';
import { guestWith } from '../support/guest.js';
import { signedIn } from '../support/sign-in.js';

let begun = 0;

@Controller('slow-grants')
class SlowGrantsController {
  constructor(private readonly grants: GrantsService) {}

  @Post(':id')
  @Public()
  async add(@Req() request: Request, @Param('id') id: string) {
    begun += 1;
    this.grants.addMeasureUp(request, id);
    await sleep(150);
    return {};
  }

  @Get()
  @Public()
  read(@Req() request: Request) {
    return this.grants.of(request);
  }
}

describe('sessions of a browser that asks several things at once', () => {
  let app: TestApp;
  beforeAll(async () => {
    app = await startTestApp({}, { controllers: [SlowGrantsController] });
  });
  beforeEach(() => {
    begun = 0;
  });
  afterAll(() => app.close());

  const stored = () => app.dataSource.query('SELECT sid FROM sessions');

  it('keep the grant of every request', async () => {
    const client = await guestWith(app, { measureUps: ['first'] });
    await Promise.all(
      ['a', 'b', 'c', 'd'].map((id) => client.post(`/api/slow-grants/${id}`).send({}).expect(201)),
    );
    const { body } = await client.get('/api/slow-grants').expect(200);
    expect([...body.measureUps].sort()).toEqual(['a', 'b', 'c', 'd', 'first']);
  });

  it('do not come back when a slow request ends after sign-out', async () => {
    await app.dataSource.query('DELETE FROM sessions');
    const client = await signedIn(app, await createAccount(app.manager));
    const slow = client.post('/api/slow-grants/late').send({}).expect(201);
    const ended = slow.then(() => undefined);
    while (begun === 0) await sleep(5);
    await client.post('/api/auth/sign-out').send({}).expect(204);
    expect(await stored()).toEqual([]);
    await ended;
    expect(await stored()).toEqual([]);
  });

  it('live on for two months from the last day they were used', async () => {
    const client = await guestWith(app, { measureUps: ['x'] });
    const first = await client.get('/api/slow-grants').expect(200);
    const expires = /Expires=([^;]+)/.exec(first.headers['set-cookie']?.[0] ?? '')?.[1] ?? '';
    expect(new Date(expires).getTime() - Date.now()).toBeGreaterThan(59 * 86_400_000);
    const second = await client.get('/api/slow-grants').expect(200);
    expect(second.headers['set-cookie']).toBeUndefined();
  });
});
