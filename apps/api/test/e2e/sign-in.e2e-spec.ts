import type { Account } from '../../src/accounts/account.entity.js';
import { createAccount, testPassword } from '../factories/account.factory.js';
import { createMember, createShop } from '../factories/organisation.factory.js';
import { startTestApp, type TestApp } from '../support/app.js';
import { signedIn } from '../support/sign-in.js';

describe('sign-in', () => {
  let app: TestApp;
  let account: Account;
  beforeAll(async () => {
    app = await startTestApp();
  });
  beforeEach(async () => {
    account = await createAccount(app.manager);
  });
  afterAll(() => app.close());

  const attempt = (email: string, password: string, ip = '203.0.113.1') =>
    app.client().post('/api/auth/sign-in').set('X-Forwarded-For', ip).send({ email, password });

  it('tells a guest that nobody is signed in, and gives no cookie for it', async () => {
    const answer = await app.client().get('/api/auth/me').expect(200, { account: null });
    expect(answer.headers['set-cookie']).toBeUndefined();
  });

  it('opens a session whose cookie no script reads and no other site sends along', async () => {
    const client = app.client();
    const answer = await client
      .post('/api/auth/sign-in')
      .send({ email: ` ${account.email.toUpperCase()} `, password: testPassword })
      .expect(200);
    expect(answer.body.account).toMatchObject({ id: account.id, email: account.email, organisations: [] });
    expect(JSON.stringify(answer.body)).not.toContain('argon2');
    expect(answer.headers['set-cookie']?.[0]).toMatch(
      /^linkfell=[^;]+; Path=\/; Expires=[^;]+; HttpOnly; SameSite=Lax$/,
    );
    const me = await client.get('/api/auth/me').expect(200);
    expect(me.body.account.id).toBe(account.id);
  });

  it('lists the organisations of the account with its role in each', async () => {
    const shop = await createShop(app.manager);
    const owner = await createMember(app.manager, shop, 'owner');
    const client = await signedIn(app, owner);
    const me = await client.get('/api/auth/me').expect(200);
    expect(me.body.account.organisations).toEqual([
      { id: shop.id, name: shop.name, isShop: true, isWorkshop: false, role: 'owner' },
    ]);
  });

  it('gives a new session id at every sign-in, and the old one opens nothing', async () => {
    const client = await signedIn(app, account);
    const sids = () =>
      app.dataSource.query(`SELECT sid FROM sessions WHERE sess ->> 'accountId' = $1`, [account.id]);
    const [first] = await sids();
    await client.post('/api/auth/sign-in').send({ email: account.email, password: testPassword }).expect(200);
    const after = await sids();
    expect(after).toHaveLength(1);
    expect(after[0].sid).not.toBe(first.sid);
  });

  it('signs out for good', async () => {
    const client = await signedIn(app, account);
    await client.post('/api/auth/sign-out').send({}).expect(204);
    await client.get('/api/auth/me').expect(200, { account: null });
    expect(
      await app.dataSource.query(`SELECT 1 FROM sessions WHERE sess ->> 'accountId' = $1`, [account.id]),
    ).toEqual([]);
    await client.post('/api/auth/sign-out').send({}).expect(401);
  });

  it('refuses a wrong password and an unknown address in the same words', async () => {
    const wrong = await attempt(account.email, 'not the right password').expect(401);
    const unknown = await attempt('nobody-at-all@example.test', 'not the right password').expect(401);
    const withoutId = ({ instance: _, ...rest }: Record<string, unknown>) => rest;
    expect(withoutId(wrong.body)).toEqual(withoutId(unknown.body));
    expect(wrong.body.code).toBe('wrong-credentials');
  });

  it('names each field that needs another look', async () => {
    const answer = await app
      .client()
      .post('/api/auth/sign-in')
      .send({ email: 'no address', extra: 1 })
      .expect(422);
    expect(answer.body).toMatchObject({ code: 'invalid', status: 422 });
    expect(answer.body.errors.map(({ pointer }: { pointer: string }) => pointer).sort()).toEqual([
      '/email',
      '/extra',
      '/password',
    ]);
  });

  it('answers a broken body with a plain 400', async () => {
    await app.client().post('/api/auth/sign-in').type('json').send('{"email":').expect(400);
  });

  describe('guessing', () => {
    it('stops after ten wrong passwords and lets in again when the first of them is a quarter of an hour old', async () => {
      for (let n = 0; n < 10; n += 1) await attempt(account.email, `wrong password ${n}`).expect(401);
      const refused = await attempt(account.email, testPassword).expect(429);
      expect(refused.body.code).toBe('too-many-attempts');
      expect(Number(refused.headers['retry-after'])).toBeGreaterThan(0);
      expect(Number(refused.headers['retry-after'])).toBeLessThanOrEqual(15 * 60);
      app.clock.advance({ minutes: 16 });
      await attempt(account.email, testPassword).expect(200);
    });

    it('counts guesses that come at the same moment', async () => {
      const answers = await Promise.all(
        Array.from({ length: 25 }, (_, n) => attempt(account.email, `guess ${n}`)),
      );
      const looked = answers.filter(({ status }) => status === 401).length;
      expect(looked).toBeGreaterThan(0);
      expect(looked).toBeLessThanOrEqual(10);
      expect(answers.every(({ status }) => status === 401 || status === 429)).toBe(true);
    });

    it('forgives failures before a success', async () => {
      for (let n = 0; n < 9; n += 1) await attempt(account.email, `wrong password ${n}`).expect(401);
      await attempt(account.email, testPassword).expect(200);
      for (let n = 0; n < 9; n += 1) await attempt(account.email, `wrong password ${n}`).expect(401);
      await attempt(account.email, testPassword).expect(200);
    });

    it('does not lock the same address out elsewhere', async () => {
      const elsewhere = await startTestApp({ TRUST_PROXY: '1' });
      try {
        const { email } = await createAccount(elsewhere.manager);
        const from = (ip: string, password: string) =>
          elsewhere.client().post('/api/auth/sign-in').set('X-Forwarded-For', ip).send({ email, password });
        for (let n = 0; n < 10; n += 1) await from('203.0.113.1', `wrong password ${n}`).expect(401);
        await from('203.0.113.1', testPassword).expect(429);
        await from('203.0.113.2', testPassword).expect(200);
      } finally {
        await elsewhere.close();
      }
    });
  });
});
