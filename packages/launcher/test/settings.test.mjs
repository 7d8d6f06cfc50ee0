import assert from 'node:assert/strict';
import { test } from 'node:test';
import { apiEnvironment, portIn, standIns } from '../src/settings.mjs';

test('without settings every stand-in is ours', () => {
  assert.deepEqual(standIns({}), { stripe: true, mail: true, cluster: true });
});

test('an empty value means "not set"', () => {
  const env = { STRIPE_SECRET_KEY: '', SMTP_URL: '', DATABASE_URL: '' };
  assert.deepEqual(standIns(env), { stripe: true, mail: true, cluster: true });
});

test('a Stripe key of the reader means the real Stripe', () => {
  const env = { STRIPE_SECRET_KEY: 'key-of-the-reader' };
  assert.equal(standIns(env).stripe, false);
  assert.equal(apiEnvironment(env, {}).STRIPE_API_BASE, undefined);
});

test('the reader’s mail server and database are used', () => {
  const env = { SMTP_URL: 'smtp://mail.example:25', DATABASE_URL: 'postgres://db.example/x' };
  assert.deepEqual(standIns(env), { stripe: true, mail: false, cluster: false });
  assert.equal(apiEnvironment(env, { DATABASE_URL: 'postgres://ours' }).DATABASE_URL, env.DATABASE_URL);
});

test('the public address follows the port unless it is set', () => {
  assert.equal(apiEnvironment({}, {}).PUBLIC_URL, 'http://localhost:4310');
  assert.equal(apiEnvironment({ PORT: '5000' }, {}).PUBLIC_URL, 'http://localhost:5000');
  const env = { PORT: '5000', PUBLIC_URL: 'https://linkfell.example' };
  assert.equal(apiEnvironment(env, {}).PUBLIC_URL, 'https://linkfell.example');
});

test('what this run started reaches the API, what it did not start stays out', () => {
  const env = apiEnvironment({}, { SMTP_URL: 'smtp://127.0.0.1:1', STRIPE_API_BASE: undefined });
  assert.equal(env.SMTP_URL, 'smtp://127.0.0.1:1');
  assert.equal('STRIPE_API_BASE' in env, false);
});

test('a port that is no number is seen as such', () => {
  assert.equal(Number.isInteger(portIn({ PORT: 'web' })), false);
  assert.equal(portIn({}), 4310);
});
