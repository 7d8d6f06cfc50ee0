import type { Account } from '../../src/accounts/account.entity.js';
import { PasswordReset } from '../../src/auth/password-reset.entity.js';
import { MailLog } from '../../src/notifications/mail-log.entity.js';
import { createAccount, testPassword } from '../factories/account.factory.js';
import { startTestApp, type TestApp } from '../support/app.js';
import { signedIn } from '../support/sign-in.js';

const newPassword = 'becks over wet slate';

describe('password reset', () => {
  let app: TestApp;
  let account: Account;
  beforeAll(async () => {
    app = await startTestApp();
  });
  beforeEach(async () => {
    account = await createAccount(app.manager);
    await app.drainOutbox();
    app.mail.clear();
  });
  afterAll(() => app.close());

  const ask = (email: string) => app.client().post('/api/auth/password-reset').send({ email });
  const confirm = (token: string, password = newPassword) =>
    app.client().post('/api/auth/password-reset/confirm').send({ token, password });
  const askForToken = async (): Promise<string> => {
    await ask(account.email).expect(202);
    await app.drainOutbox();
    const token = /\/reset-password#([\w-]{22})\n/.exec(app.mail.messages()[0]?.text ?? '')?.[1];
    if (token === undefined) throw new Error('no link in the mail');
    return token;
  };

  it('sets a new password by a mailed link and signs out everywhere', async () => {
    const elsewhere = await signedIn(app, account);
    const token = await askForToken();
    expect(app.mail.messages()[0]).toMatchObject({ to: [account.email], subject: 'Set a new password' });
    await confirm(token).expect(204);
    await elsewhere.get('/api/auth/me').expect(200, { account: null });
    const signIn = (password: string) =>
      app.client().post('/api/auth/sign-in').send({ email: account.email, password });
    await signIn(testPassword).expect(401);
    await signIn(newPassword).expect(200);
    await app.drainOutbox();
    expect(app.mail.messages()[0]).toMatchObject({
      to: [account.email],
      subject: 'Your password was changed',
    });
  });

  it('answers an unknown address just the same and mails nobody', async () => {
    const known = await ask(account.email).expect(202);
    const unknown = await ask('nobody-at-all@example.test').expect(202);
    expect(unknown.text).toBe(known.text);
    await app.drainOutbox();
    expect(app.mail.messages().map(({ to }) => to)).toEqual([[account.email]]);
  });

  it('keeps the token nowhere', async () => {
    const token = await askForToken();
    const tables: { name: string }[] = await app.dataSource.query(
      `SELECT quote_ident(table_name) AS name FROM information_schema.tables WHERE table_schema = 'public'`,
    );
    for (const { name } of tables) {
      const [{ n }] = await app.dataSource.query(
        `SELECT count(*)::int AS n FROM ${name} t WHERE to_jsonb(t)::text LIKE '%' || $1 || '%'`,
        [token],
      );
      expect({ name, n }).toEqual({ name, n: 0 });
    }
  });

  it('takes a link once', async () => {
    const token = await askForToken();
    const both = await Promise.all([confirm(token), confirm(token, 'three brown sheep 41')]);
    expect(both.map(({ status }) => status).sort()).toEqual([204, 422]);
    await confirm(token).expect(422);
  });

  it('takes a link for half an hour', async () => {
    const token = await askForToken();
    app.clock.advance({ minutes: 30 });
    const late = await confirm(token).expect(422);
    expect(late.body.code).toBe('reset-link-spent');
  });

  it('takes the newest link only', async () => {
    const first = await askForToken();
    const second = await askForToken();
    await confirm(first).expect(422);
    await confirm(second).expect(204);
  });

  it('mails three links an hour at most', async () => {
    for (let n = 0; n < 5; n += 1) await ask(account.email).expect(202);
    await app.drainOutbox();
    expect(app.mail.messages()).toHaveLength(3);
    expect(await app.manager.countBy(PasswordReset, { accountId: account.id })).toBe(3);
  });

  it('refuses short and common passwords and keeps the link for a better one', async () => {
    const token = await askForToken();
    expect((await confirm(token, 'too short').expect(422)).body.errors[0].pointer).toBe('/password');
    const common = await confirm(token, 'passwordpassword').expect(422);
    expect(common.body).toMatchObject({ code: 'password-too-common', errors: [{ pointer: '/password' }] });
    await confirm(token, account.email).expect(422);
    await confirm(token).expect(204);
  });

  it('sends the mail later when the mail server is away, with a fresh link', async () => {
    app.mail.setMode('refuse');
    await ask(account.email).expect(202);
    await app.drainOutbox();
    expect(app.mail.messages()).toHaveLength(0);
    app.mail.setMode('accept');
    app.clock.advance({ minutes: 1 });
    await app.drainOutbox();
    const token = /#([\w-]{22})\n/.exec(app.mail.messages()[0]?.text ?? '')?.[1] ?? '';
    await confirm(token).expect(204);
  });

  it('writes down that the mail went', async () => {
    await askForToken();
    const [log] = await app.manager.findBy(MailLog, { recipient: account.email });
    const messageId = app.mail
      .messages()[0]
      ?.headers.find(({ name }) => name.toLowerCase() === 'message-id')?.value;
    expect(log).toMatchObject({ template: 'password-reset', messageId });
    expect(messageId).toBe(`<${log?.outboxId}@127.0.0.1>`);
  });
});
