import { setTimeout as sleep } from 'node:timers/promises';

import { QueryFailedError, type DataSource, type EntityManager } from 'typeorm';

import { CommonException } from '../common/problems/problem.exception.js';

/** serialization_failure and deadlock_detected: the whole transaction may be tried again. */
const worthRetrying = new Set(['40001', '40P01']);

/** SQLSTATE of a database error, or null for any other. */
export function sqlState(error: unknown): string | null {
  if (!(error instanceof QueryFailedError)) return null;
  const { code } = error.driverError as { code?: unknown };
  return typeof code === 'string' ? code : null;
}

/** The constraint that refused, or null. */
export function violatedConstraint(error: unknown): string | null {
  if (!(error instanceof QueryFailedError)) return null;
  const { constraint } = error.driverError as { constraint?: unknown };
  return typeof constraint === 'string' ? constraint : null;
}

/**
 * Runs the work in one transaction; after a deadlock or a serialization failure all of it again, at most
 * four times, waiting a little longer and unevenly each time. The work must therefore have no effect but
 * through `manager`.
 * @throws CommonException "busy" when the last try met a conflict as well; anything else as it was thrown
 */
export async function inTransaction<T>(
  dataSource: DataSource,
  work: (manager: EntityManager) => Promise<T>,
  tries = 4,
): Promise<T> {
  for (let attempt = 1; ; attempt += 1) {
    try {
      return await dataSource.transaction(work);
    } catch (error) {
      if (!worthRetrying.has(sqlState(error) ?? '')) throw error;
      if (attempt >= tries)
        throw new CommonException('busy', { cause: error, headers: { 'Retry-After': '1' } });
      await sleep(20 * 2 ** attempt * (0.5 + Math.random()));
    }
  }
}
