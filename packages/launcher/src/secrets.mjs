import { randomBytes } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';

const make = () => ({
  adminPassword: randomBytes(24).toString('hex'),
  ownerPassword: randomBytes(24).toString('hex'),
  sessionSecret: randomBytes(32).toString('hex'),
  stripeKey: `sk_test_${randomBytes(24).toString('hex')}`,
  webhookSecret: `whsec_${randomBytes(24).toString('hex')}`,
});

/** The secrets kept beside a data folder, in a file that only its owner reads; made on first use. */
export function secretsIn(home) {
  const file = join(home, 'secrets.json');
  if (existsSync(file)) return JSON.parse(readFileSync(file, 'utf8'));
  const secrets = make();
  writeFileSync(file, JSON.stringify(secrets, null, 2), { mode: 0o600, flag: 'wx' });
  return secrets;
}
