import type { EntityManager } from 'typeorm';

import { Account } from '../../src/accounts/account.entity.js';
import { hashPassword } from '../../src/accounts/passwords.js';
import { next } from './sequence.js';

export const testPassword = 'moss and gravel lane';
/** One hash for all: argon2 is slow on purpose. */
let testHash: Promise<string> | null = null;

/** An account that signs in with `testPassword`. */
export async function createAccount(
  manager: EntityManager,
  overrides: Partial<Account> = {},
): Promise<Account> {
  testHash ??= hashPassword(testPassword);
  const n = next();
  return manager.save(
    manager.create(Account, {
      email: `person-${n}@example.test`,
      displayName: `Person ${n}`,
      passwordHash: await testHash,
      platformRole: 'rider',
      ...overrides,
    }),
  );
}
