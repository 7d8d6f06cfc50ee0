import type { Request } from 'express';
import { ApiError } from './api-error.js';

/** The key in the request: bearer, or the user name of basic authentication. */
function keyOf(req: Request): string | undefined {
  const [scheme, value] = (req.get('authorization') ?? '').split(' ');
  if (!value) return undefined;
  if (scheme?.toLowerCase() === 'bearer') return value;
  if (scheme?.toLowerCase() === 'basic') return Buffer.from(value, 'base64').toString().split(':')[0];
  return undefined;
}

/** Refuses a request without this fake's key (401), never repeating the whole key in the message. */
export function requireKey(req: Request, apiKey: string): void {
  const key = keyOf(req);
  if (key === apiKey) return;
  const message = key
    ? `Invalid API Key provided: ${key.slice(0, 8)}${'*'.repeat(Math.max(0, key.length - 12))}${key.length > 12 ? key.slice(-4) : ''}`
    : 'You did not provide an API key. Send it as a bearer token in the Authorization header.';
  throw new ApiError(401, { type: 'invalid_request_error', message }, false);
}
