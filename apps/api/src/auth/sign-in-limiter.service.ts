import { Injectable } from '@nestjs/common';
import { DataSource } from 'typeorm';

import { Clock } from '../common/clock.js';
import { AuthException } from './auth.exception.js';
import { SignInAttempt } from './sign-in-attempt.entity.js';

const minute = 60_000;
/** Wrong passwords for one address from one place, and from everywhere together, before we make people wait. */
const here = { failures: 10, withinMs: 15 * minute };
const everywhere = { failures: 100, withinMs: 60 * minute };

/** Slows down guessing at one account; a success forgives the failures before it. */
@Injectable()
export class SignInLimiter {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
  ) {}

  /**
   * Notes an attempt before the password is looked at, so that guesses sent at the same moment count each other.
   * @returns the attempt, to be given to {@link succeeded}
   * @throws AuthException "too-many-attempts" with Retry-After; such an attempt is not counted
   */
  async begin(email: string, ip: string): Promise<string> {
    const at = this.clock.now();
    const { identifiers } = await this.dataSource.manager.insert(SignInAttempt, {
      email,
      ip,
      succeeded: false,
      at,
    });
    const id = String(identifiers[0]?.id);
    const oldest =
      (await this.oldestOverLimit(email, ip, here)) ?? (await this.oldestOverLimit(email, null, everywhere));
    if (oldest === null) return id;
    await this.dataSource.manager.delete(SignInAttempt, { id });
    const seconds = Math.max(1, Math.ceil((oldest.getTime() - at.getTime()) / 1_000));
    throw new AuthException('too-many-attempts', { headers: { 'Retry-After': String(seconds) } });
  }

  async succeeded(id: string): Promise<void> {
    await this.dataSource.manager.update(SignInAttempt, { id }, { succeeded: true });
  }

  /** When the limit frees up again, or null while it is not exceeded. */
  private async oldestOverLimit(email: string, ip: string | null, limit: typeof here): Promise<Date | null> {
    const since = new Date(this.clock.now().getTime() - limit.withinMs);
    const rows: { at: Date }[] = await this.dataSource.query(
      `SELECT at FROM sign_in_attempts
       WHERE email = $1 AND ($2::text IS NULL OR ip = $2) AND NOT succeeded AND at > $3
         AND id > coalesce((SELECT max(id) FROM sign_in_attempts
                            WHERE email = $1 AND ($2::text IS NULL OR ip = $2) AND succeeded), 0)
       ORDER BY id DESC LIMIT $4`,
      [email, ip, since, limit.failures + 1],
    );
    const oldest = rows.length > limit.failures ? rows[limit.failures - 1] : undefined;
    return oldest ? new Date(oldest.at.getTime() + limit.withinMs) : null;
  }
}
