import type { Account } from '../../src/accounts/account.entity.js';
import { testPassword } from '../factories/account.factory.js';
import type { TestApp } from './app.js';
import type { Client } from './client.js';

/** A browser that is signed in as the account, through the real sign-in. */
export async function signedIn(app: TestApp, account: Account): Promise<Client> {
  const client = app.client();
  await client.post('/api/auth/sign-in').send({ email: account.email, password: testPassword }).expect(200);
  return client;
}
