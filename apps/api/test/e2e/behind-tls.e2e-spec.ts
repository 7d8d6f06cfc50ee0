import { createAccount, testPassword } from '../factories/account.factory.js';
import { startTestApp, type TestApp } from '../support/app.js';

describe('behind a TLS proxy', () => {
  let app: TestApp;
  beforeAll(async () => {
    app = await startTestApp({ PUBLIC_URL: 'https://linkfell.example', TRUST_PROXY: '1' });
  });
  afterAll(() => app.close());

  it('binds the cookie to this host and to https, and asks browsers to stay on https', async () => {
    const { email } = await createAccount(app.manager);
    const answer = await app
      .client()
      .post('/api/auth/sign-in')
      .set({
        'X-Forwarded-Proto': 'https',
        'X-Forwarded-For': '203.0.113.7',
        Origin: 'https://linkfell.example',
      })
      .send({ email, password: testPassword })
      .expect(200);
    expect(answer.headers['set-cookie']?.[0]).toMatch(
      /^__Host-linkfell=[^;]+; Path=\/; Expires=[^;]+; HttpOnly; Secure; SameSite=Lax$/,
    );
    expect(answer.headers['strict-transport-security']).toBe('max-age=31536000; includeSubDomains');
    const attempts: { ip: string }[] = await app.dataSource.query('SELECT ip FROM sign_in_attempts');
    expect(attempts).toEqual([{ ip: '203.0.113.7' }]);
  });

  it('gives no session over plain http', async () => {
    const { email } = await createAccount(app.manager);
    const answer = await app.client().post('/api/auth/sign-in').send({ email, password: testPassword });
    expect(answer.headers['set-cookie']).toBeUndefined();
  });
});
