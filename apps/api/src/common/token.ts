import { createHash, randomBytes } from 'node:crypto';

/** 128 random bits for a link, 22 characters of base64url. */
export function newToken(): string {
  return randomBytes(16).toString('base64url');
}

/** What is kept of a token: with 128 random bits in it, a plain hash cannot be turned back. */
export function hashToken(token: string): string {
  return createHash('sha256').update(token).digest('hex');
}
