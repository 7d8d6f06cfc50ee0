import { createHash } from 'node:crypto';
import type { Store } from '../store/store.js';
import { ApiError } from './api-error.js';

const KEEP_MS = 24 * 60 * 60 * 1000;
const MAX_KEY_LENGTH = 255;

export interface Answer {
  status: number;
  body: unknown;
}

export interface IdempotencyRecord {
  endpoint: string;
  fingerprint: string;
  requestId: string;
  startedAt: number;
  /** Absent while the first request is still running. */
  answer?: Answer;
}

function fingerprintOf(body: unknown): string {
  const sorted = (value: unknown): unknown => {
    if (Array.isArray(value)) return value.map(sorted);
    if (value === null || typeof value !== 'object') return value;
    return Object.fromEntries(
      Object.entries(value)
        .sort(([a], [b]) => (a < b ? -1 : 1))
        .map(([key, item]) => [key, sorted(item)]),
    );
  };
  return createHash('sha256')
    .update(JSON.stringify(sorted(body ?? {})))
    .digest('hex');
}

/** The API's published rules for Idempotency-Key on POST. */
export class Idempotency {
  constructor(private readonly store: Store) {}

  /**
   * Claims the key. Returns the kept record when the same request was answered before, undefined when the
   * caller is the first and must finish with `keep` or `forget`.
   * Throws 400 for another body or endpoint, 409 while the first request is still running.
   */
  claim(key: string, endpoint: string, body: unknown, requestId: string): IdempotencyRecord | undefined {
    if (key.length > MAX_KEY_LENGTH) {
      throw new ApiError(
        400,
        { type: 'invalid_request_error', message: 'Idempotency keys have at most 255 characters.' },
        false,
      );
    }
    const fingerprint = fingerprintOf(body);
    const known = this.store.idempotency.get(key);
    if (!known || known.startedAt < Date.now() - KEEP_MS) {
      this.store.idempotency.set(key, { endpoint, fingerprint, requestId, startedAt: Date.now() });
      return undefined;
    }
    const advice = `Try using a key other than '${key}' if you meant to execute a different request.`;
    if (known.endpoint !== endpoint) {
      throw mismatch(
        `Keys for idempotent requests can only be used for the same endpoint they were first used for ('${known.endpoint}' vs '${endpoint}'). ${advice}`,
      );
    }
    if (known.fingerprint !== fingerprint) {
      throw mismatch(
        `Keys for idempotent requests can only be used with the same parameters they were first used with. ${advice}`,
      );
    }
    if (!known.answer) {
      throw new ApiError(
        409,
        {
          type: 'idempotency_error',
          code: 'idempotency_key_in_use',
          message: `There is currently another in-progress request using this Idempotent Key: ${key}. Please try again later.`,
        },
        false,
      );
    }
    return known;
  }

  keep(key: string, answer: Answer): void {
    const record = this.store.idempotency.get(key);
    if (record) record.answer = structuredClone(answer);
  }

  forget(key: string): void {
    this.store.idempotency.delete(key);
  }
}

function mismatch(message: string): ApiError {
  return new ApiError(400, { type: 'idempotency_error', message }, false);
}
