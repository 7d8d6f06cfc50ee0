import { randomInt } from 'node:crypto';

const ALPHABET = 'ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz0123456789';

/** A random id in the shape the API uses: a prefix, an underscore and letters and digits. */
export function newId(prefix: string, length = 24): string {
  let tail = '';
  for (let i = 0; i < length; i += 1) tail += ALPHABET[randomInt(ALPHABET.length)];
  return `${prefix}_${tail}`;
}

/** Whole seconds since 1970, the only unit of time in the API's objects. */
export function nowSeconds(): number {
  return Math.floor(Date.now() / 1000);
}
