import { ConfigError, readConfig } from './config.js';

const complete = {
  PUBLIC_URL: 'https://linkfell.example/',
  DATABASE_URL: 'postgres://linkfell@127.0.0.1/linkfell',
  SESSION_SECRET: 'a secret of thirty-two characters, or more',
  STRIPE_SECRET_KEY: 'sk_test_x',
  STRIPE_WEBHOOK_SECRET: 'whsec_x',
  SMTP_URL: 'smtp://127.0.0.1:2525',
};

describe('readConfig', () => {
  it('fills in what has a default', () => {
    expect(readConfig(complete)).toMatchObject({
      PORT: 4310,
      HOLD_MINUTES: 31,
      TRUST_PROXY: 0,
      PUBLIC_URL: 'https://linkfell.example',
      https: true,
    });
    expect(
      readConfig({ ...complete, PUBLIC_URL: 'http://127.0.0.1:4310', HOLD_MINUTES: '45' }),
    ).toMatchObject({
      HOLD_MINUTES: 45,
      https: false,
    });
  });

  it('treats an empty value as one that is not set', () => {
    expect(readConfig({ ...complete, STRIPE_API_BASE: '', PORT: '' })).toMatchObject({ PORT: 4310 });
  });

  it('names every variable that is missing or wrong, and repeats no value', () => {
    const read = () =>
      readConfig({
        ...complete,
        SMTP_URL: undefined,
        SESSION_SECRET: 'swordfish',
        PORT: 'eighty',
        PUBLIC_URL: 'ftp://x',
      });
    expect(read).toThrow(ConfigError);
    expect(read).toThrow(/^ {2}SMTP_URL is not set$/m);
    expect(read).toThrow(/^ {2}SESSION_SECRET must have at least 32 characters$/m);
    expect(read).toThrow(/^ {2}PORT must be a whole number$/m);
    expect(read).toThrow(/^ {2}PUBLIC_URL must be an address that starts with http: or https:$/m);
    expect(read).not.toThrow(/swordfish/);
  });
});
