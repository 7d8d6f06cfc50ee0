import { isCommonPassword } from './common-password.js';

describe('isCommonPassword', () => {
  it.each([
    'aaaaaaaaaaaaaaaa',
    'abababababababab',
    '1234567890123456',
    '0987654321098765',
    'passwordpassword',
    'P@ssw0rdP@ssw0rd1',
    'Password123456789',
    'qwertyuiopqwertyuiop',
    'qwertyqwerty12345',
    'CorrectHorseBatteryStaple',
    'linkfell-linkfell-1',
    'administrator!!2026',
  ])('refuses %s', (password) => expect(isCommonPassword(password)).toBe(true));

  it.each([
    'becks over wet slate',
    'three brown sheep 41',
    'moss-and-gravel-lane',
    'xK9#vQ2m!Lr7@tZ4w',
    'my old shock squeaks',
  ])('takes %s', (password) => expect(isCommonPassword(password)).toBe(false));

  it('refuses the account’s own address and name', () => {
    const own = ['wren.hollis@example.test', 'Wren Hollis'];
    expect(isCommonPassword('wren.hollis@example', own)).toBe(true);
    expect(isCommonPassword('WrenHollis20260101', own)).toBe(true);
    expect(isCommonPassword('wren likes steep rocks', own)).toBe(false);
  });
});
