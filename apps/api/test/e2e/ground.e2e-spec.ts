import { Body, Controller, Get, Param, Post, Put, Query, Req, Res } from '@nestjs/common';
import type { Request, Response } from 'express';
import { z } from 'zod';

import { Machine, Member, OrderGrant, PlanGrant, Platform, Public } from '../../src/common/access/access.js';
import { GrantsService } from '../../src/common/access/grants.service.js';
import { CurrentMember, type CurrentMemberData } from '../../src/common/access/principal.js';
import { IfMatch, needVersion, setVersion } from '../../src/common/http/etag.js';
import { TightLimit } from '../../src/common/http/rate-limit.js';
import { Idempotent } from '../../src/common/idempotency/idempotent.js';
import { problems } from '../../src/common/problems/problem.exception.js';
import { Answers } from '../../src/common/validation/answers.js';
import { zod } from '../../src/common/validation/zod.pipe.js';
import { createAccount } from '../factories/account.factory.js';
import { createMeasureUp } from '../factories/measure-up.factory.js';
import { createOrder } from '../factories/order.factory.js';
import { createMember, createShop, createWorkshop } from '../factories/organisation.factory.js';
import { createPlan } from '../factories/plan.factory.js';
import { startTestApp, type TestApp } from '../support/app.js';
import { guestWith } from '../support/guest.js';
import { signedIn } from '../support/sign-in.js';

class ProbeException extends problems({ 'out-of-tea': { status: 409, title: 'The pot is empty' } }) {}

const body = z.strictObject({
  name: z.string().min(1, 'Enter a name'),
  legs: z.array(z.object({ mm: z.int() })),
});

@Controller('probe')
class ProbeController {
  private made = 0;

  constructor(private readonly grants: GrantsService) {}

  @Get('undeclared')
  undeclared() {
    return {};
  }

  @Get('shops/:orgId')
  @Member('shop', ['owner'])
  shop(@CurrentMember() member: CurrentMemberData) {
    return member;
  }

  @Get('plans/:planId')
  @PlanGrant('planId')
  plan() {
    return {};
  }

  @Get('orders/:reference')
  @OrderGrant()
  order() {
    return {};
  }

  @Get('desk')
  @Platform('curator', 'administrator')
  desk() {
    return {};
  }

  @Post('grants/:id')
  @Public()
  grant(@Req() request: Request, @Param('id') id: string) {
    this.grants.addMeasureUp(request, id);
    return this.grants.of(request);
  }

  @Post('checked')
  @Public()
  @Answers(z.object({ name: z.string() }), 201)
  checked(@Body(zod(body)) given: z.output<typeof body>) {
    return { name: given.name, secret: 'not part of the contract' };
  }

  @Get('search')
  @Public()
  search(@Query(zod(z.object({ max: z.coerce.number() }))) query: object) {
    return query;
  }

  @Get('broken')
  @Public()
  broken() {
    throw new Error('password is swordfish');
  }

  @Get('refused')
  @Public()
  refused() {
    throw new ProbeException('out-of-tea', { detail: 'Put the kettle on.', extensions: { cups: 0 } });
  }

  @Put('versioned')
  @Public()
  versioned(@IfMatch() version: number, @Res({ passthrough: true }) response: Response) {
    needVersion(7, version);
    setVersion(response, 8);
    return {};
  }

  @Post('once')
  @Public()
  @Idempotent('probe-once')
  async once(
    @Body(zod(z.object({ fail: z.boolean().optional(), waitMs: z.number().optional() })))
    given: {
      fail?: boolean;
      waitMs?: number;
    },
  ) {
    if (given.waitMs) await new Promise((resolve) => setTimeout(resolve, given.waitMs));
    if (given.fail && this.made === 0) {
      this.made += 1;
      throw new ProbeException('out-of-tea');
    }
    this.made += 1;
    return { made: this.made };
  }

  @Post('hook')
  @Public()
  @Machine()
  hook(@Req() request: Request & { rawBody?: Buffer }) {
    return { raw: request.rawBody?.toString('utf8') };
  }

  @Get('seldom')
  @Public()
  @TightLimit(2)
  seldom() {
    return {};
  }
}

describe('the ground', () => {
  let app: TestApp;
  beforeAll(async () => {
    app = await startTestApp({}, { controllers: [ProbeController] });
  });
  afterAll(() => app.close());

  describe('access', () => {
    it('lets nobody into a route that names nobody', async () => {
      const administrator = await createAccount(app.manager, { platformRole: 'administrator' });
      await (await signedIn(app, administrator)).get('/api/probe/undeclared').expect(404);
    });

    it('knows members, their trade and their role', async () => {
      const [shop, workshop] = [await createShop(app.manager), await createWorkshop(app.manager)];
      const both = await createShop(app.manager, { isWorkshop: true });
      const owner = await signedIn(app, await createMember(app.manager, shop, 'owner'));
      const staff = await signedIn(app, await createMember(app.manager, shop, 'staff'));
      const workshopOwner = await signedIn(app, await createMember(app.manager, workshop, 'owner'));
      const bothOwner = await signedIn(app, await createMember(app.manager, both, 'owner'));
      await app.client().get(`/api/probe/shops/${shop.id}`).expect(401);
      const answer = await owner.get(`/api/probe/shops/${shop.id}`).expect(200);
      expect(answer.body).toMatchObject({ organisationId: shop.id, role: 'owner' });
      await staff.get(`/api/probe/shops/${shop.id}`).expect(403);
      await bothOwner.get(`/api/probe/shops/${both.id}`).expect(200);
      await workshopOwner.get(`/api/probe/shops/${workshop.id}`).expect(404);
      const foreign = await owner.get(`/api/probe/shops/${both.id}`).expect(404);
      const missing = await owner.get('/api/probe/shops/no-such-shop').expect(404);
      expect({ ...foreign.body, instance: '' }).toEqual({ ...missing.body, instance: '' });
    });

    it('opens a plan to whoever holds its measure-up, and an order to whoever holds the order', async () => {
      const rider = await createAccount(app.manager);
      const measureUp = await createMeasureUp(app.manager, {}, { accountId: rider.id });
      const plan = await createPlan(app.manager, { measureUpId: measureUp.id });
      const order = await createOrder(app.manager, { measureUpId: measureUp.id });
      const asRider = await signedIn(app, rider);
      const asOther = await signedIn(app, await createAccount(app.manager));
      const byLink = await guestWith(app, { measureUps: [measureUp.id] });
      const byOrder = await guestWith(app, { orders: [order.id] });
      for (const [client, planStatus, orderStatus] of [
        [asRider, 200, 200],
        [asOther, 404, 404],
        [byLink, 200, 404],
        [byOrder, 404, 200],
        [app.client(), 404, 404],
      ] as const) {
        await client.get(`/api/probe/plans/${plan.id}`).expect(planStatus);
        await client.get(`/api/probe/orders/${order.reference}`).expect(orderStatus);
      }
      await byLink.get('/api/probe/plans/not-a-uuid').expect(404);
    });

    it('opens the desk to platform roles only', async () => {
      const as = async (platformRole: 'rider' | 'curator') =>
        signedIn(app, await createAccount(app.manager, { platformRole }));
      await (await as('curator')).get('/api/probe/desk').expect(200);
      await (await as('rider')).get('/api/probe/desk').expect(404);
    });

    it('keeps guest grants through sign-in and forgets them at sign-out', async () => {
      const client = app.client();
      await client.post('/api/probe/grants/first').send({}).expect(201);
      const account = await createAccount(app.manager);
      await client
        .post('/api/auth/sign-in')
        .send({ email: account.email, password: 'moss and gravel lane' })
        .expect(200);
      const kept = await client.post('/api/probe/grants/second').send({}).expect(201);
      expect(kept.body.measureUps).toEqual(['first', 'second']);
      await client.post('/api/auth/sign-out').send({}).expect(204);
      const after = await client.post('/api/probe/grants/third').send({}).expect(201);
      expect(after.body.measureUps).toEqual(['third']);
    });
  });

  describe('cross-site requests', () => {
    const send = (headers: Record<string, string>) => {
      const client = app.client().set('X-Linkfell-Csrf', '').set('Sec-Fetch-Site', 'same-origin');
      return client.post('/api/probe/grants/x').set(headers).send({});
    };

    it.each([
      ['without our header', {}, 403],
      ['from another site', { 'X-Linkfell-Csrf': '1', 'Sec-Fetch-Site': 'cross-site' }, 403],
      ['from a sibling host', { 'X-Linkfell-Csrf': '1', 'Sec-Fetch-Site': 'same-site' }, 403],
      ['from another origin', { 'X-Linkfell-Csrf': '1', Origin: 'https://elsewhere.test' }, 403],
      ['from an opaque origin', { 'X-Linkfell-Csrf': '1', Origin: 'null' }, 403],
      ['from our own origin', { 'X-Linkfell-Csrf': '1', Origin: 'http://127.0.0.1:4310' }, 201],
    ])('%s', async (_, headers, status) => {
      await send(headers as Record<string, string>).expect(status);
    });

    it('do not concern machines, whose bytes are kept as they came', async () => {
      const answer = await send({}).expect(403);
      expect(answer.body.code).toBe('cross-site');
      const raw = '{ "id":"evt_1" }';
      const hook = await app
        .client()
        .set('X-Linkfell-Csrf', '')
        .post('/api/probe/hook')
        .type('json')
        .send(raw);
      expect(hook.body).toEqual({ raw });
    });
  });

  describe('answers', () => {
    it('point at every fault of a body', async () => {
      const bad = { name: '', legs: [{ mm: 1 }, { mm: 'x' }], 'a/b': 1 };
      const answer = await app.client().post('/api/probe/checked').send(bad).expect(422);
      expect(answer.headers['content-type']).toMatch(/^application\/problem\+json/);
      expect(answer.body.errors).toEqual(
        expect.arrayContaining([
          { pointer: '/name', detail: 'Enter a name' },
          { pointer: '/legs/1/mm', detail: expect.any(String) },
          { pointer: '/a~1b', detail: 'This is not asked for' },
        ]),
      );
      const query = await app.client().get('/api/probe/search?max=lots').expect(422);
      expect(query.body.errors[0].pointer).toBe('query/max');
    });

    it('hold only what the contract says', async () => {
      await app.client().post('/api/probe/checked').send({ name: 'x', legs: [] }).expect(201, { name: 'x' });
    });

    it('say what a feature refuses, and nothing of a fault of ours', async () => {
      const refused = await app.client().get('/api/probe/refused').expect(409);
      expect(refused.body).toMatchObject({
        type: '/problems/out-of-tea',
        title: 'The pot is empty',
        detail: 'Put the kettle on.',
        code: 'out-of-tea',
        cups: 0,
      });
      const broken = await app.client().get('/api/probe/broken').expect(500);
      expect(broken.body).toEqual({
        type: 'about:blank',
        title: 'Internal Server Error',
        status: 500,
        instance: `/requests/${broken.headers['x-request-id']}`,
      });
    });

    it('want to know which version is being changed', async () => {
      const put = (ifMatch?: string) => {
        const request = app.client().put('/api/probe/versioned');
        return (ifMatch === undefined ? request : request.set('If-Match', ifMatch)).send({});
      };
      await put().expect(428);
      await put('"6"').expect(412);
      await put('*').expect(412);
      const answer = await put('"7"').expect(200);
      expect(answer.headers.etag).toBe('"8"');
    });
  });

  describe('idempotency keys', () => {
    let n = 0;
    const once = (client: ReturnType<TestApp['client']>, key: string | null, given: object = {}) => {
      const request = client.post('/api/probe/once');
      return (key === null ? request : request.set('Idempotency-Key', key)).send(given);
    };
    const newKey = () => `key-for-test-${(n += 1)}`;
    const newClient = async () => guestWith(app, {});

    it('are needed', async () => {
      await once(await newClient(), null).expect(400);
      await once(await newClient(), 'short').expect(400);
    });

    it('try again what failed, and give the stored answer for what succeeded', async () => {
      const [client, key] = [await newClient(), newKey()];
      await once(client, key, { fail: true }).expect(409);
      const first = await once(client, key, { fail: true }).expect(201);
      const again = await once(client, key, { fail: true }).expect(201);
      expect(again.body).toEqual(first.body);
      expect(again.headers['idempotency-replayed']).toBe('true');
      const other = await once(client, newKey()).expect(201);
      expect(other.body.made).toBe(first.body.made + 1);
    });

    it('belong to one body and to one person', async () => {
      const [client, key] = [await newClient(), newKey()];
      const first = await once(client, key).expect(201);
      await once(client, key, { waitMs: 1 }).expect(422);
      const somebodyElse = await once(await newClient(), key).expect(201);
      expect(somebodyElse.body).not.toEqual(first.body);
    });

    it('do the work once when requests come at the same moment', async () => {
      const [client, key] = [await newClient(), newKey()];
      const answers = await Promise.all(Array.from({ length: 5 }, () => once(client, key, { waitMs: 150 })));
      // Whoever comes while the work runs is sent away; a slow one that comes after it gets the stored answer.
      const made = answers.filter(({ status }) => status === 201).map(({ body }) => body.made as number);
      expect(answers.filter(({ status }) => status === 409)).toHaveLength(5 - made.length);
      expect(new Set(made).size).toBe(1);
      const after = await once(client, key, { waitMs: 150 }).expect(201);
      expect(after.body.made).toBe(made[0]);
    });

    it('pass on from a process that died at work', async () => {
      const [client, key] = [await newClient(), newKey()];
      await once(client, key).expect(201);
      await app.dataSource.query(
        `UPDATE idempotency_keys SET status = NULL, response = NULL WHERE key = $1`,
        [key],
      );
      await once(client, key).expect(409);
      app.clock.advance({ minutes: 1 });
      await once(client, key).expect(201);
    });
  });
});

describe('rate limits', () => {
  it('answer 429 and say when to come back', async () => {
    const app = await startTestApp({ RATE_LIMIT_SCALE: '1' }, { controllers: [ProbeController] });
    try {
      await app.client().get('/api/probe/seldom').expect(200);
      await app.client().get('/api/probe/seldom').expect(200);
      const refused = await app.client().get('/api/probe/seldom').expect(429);
      expect(refused.body.code).toBe('too-many-requests');
      const seconds = Number(refused.headers['retry-after']);
      expect(seconds).toBeGreaterThan(0);
      expect(seconds).toBeLessThanOrEqual(60);
      await app.client().get('/api/probe/search?max=1').expect(200);
    } finally {
      await app.close();
    }
  });
});
