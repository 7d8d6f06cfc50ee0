import { PasswordReset } from '../../src/auth/password-reset.entity.js';
import { SignInAttempt } from '../../src/auth/sign-in-attempt.entity.js';
import { IdempotencyKey } from '../../src/common/idempotency/idempotency-key.entity.js';
import { Housekeeping } from '../../src/housekeeping/housekeeping.service.js';
import { OutboxMessage } from '../../src/outbox/outbox-message.entity.js';
import { createAccount } from '../factories/account.factory.js';
import { startTestApp, type TestApp } from '../support/app.js';

describe('housekeeping', () => {
  let app: TestApp;
  beforeAll(async () => {
    app = await startTestApp();
  });
  afterAll(() => app.close());

  it('throws away what is old and done, and nothing else', async () => {
    const { manager } = app;
    const account = await createAccount(manager);
    const daysAgo = (days: number) => new Date(app.clock.now().getTime() - days * 86_400_000);
    for (const [name, days] of [
      ['young', 1],
      ['old', 31],
    ] as const) {
      const at = daysAgo(days);
      await manager.insert(IdempotencyKey, {
        actor: 'a',
        operation: 'o',
        key: name,
        requestHash: 'h',
        createdAt: at,
      });
      await manager.insert(SignInAttempt, { email: name, ip: '203.0.113.1', succeeded: false, at });
      await manager.insert(PasswordReset, { accountId: account.id, tokenHash: name, expiresAt: at });
      for (const state of ['pending', 'done', 'dead'] as const) {
        const doneAt = state === 'done' ? at : null;
        await manager.insert(OutboxMessage, {
          topic: `${name} ${state}`,
          payload: {},
          state,
          createdAt: at,
          doneAt,
        });
      }
    }
    await app.nest.get(Housekeeping).run();
    expect((await manager.find(IdempotencyKey)).map(({ key }) => key)).toEqual(['young']);
    expect((await manager.find(SignInAttempt)).map(({ email }) => email)).toEqual(['young']);
    expect((await manager.find(PasswordReset)).map(({ tokenHash }) => tokenHash)).toEqual(['young']);
    expect((await manager.find(OutboxMessage)).map(({ topic }) => topic).sort()).toEqual([
      'old dead',
      'old pending',
      'young dead',
      'young done',
      'young pending',
    ]);
  });
});
