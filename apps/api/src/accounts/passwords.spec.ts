import { hashPassword, passwordMatches } from './passwords.js';

describe('passwords', () => {
  it('are kept as argon2id with 19 MiB, two passes, one lane', async () => {
    expect(await hashPassword('three brown sheep 41')).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
  });

  it('match their own hash only, and nobody’s hash never', async () => {
    const encoded = await hashPassword('three brown sheep 41');
    expect(await passwordMatches(encoded, 'three brown sheep 41')).toBe(true);
    expect(await passwordMatches(encoded, 'three brown sheep 42')).toBe(false);
    expect(await passwordMatches(null, 'three brown sheep 41')).toBe(false);
  });

  it('match however the keyboard composed an accent', async () => {
    const encoded = await hashPassword('caf\u00e9 on the high fell');
    expect(await passwordMatches(encoded, 'cafe\u0301 on the high fell')).toBe(true);
  });
});
