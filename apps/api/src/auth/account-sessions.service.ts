import { Injectable } from '@nestjs/common';
import type { Request } from 'express';
import { DataSource, type EntityManager } from 'typeorm';

/** Ties sessions to accounts. */
@Injectable()
export class AccountSessions {
  constructor(private readonly dataSource: DataSource) {}

  /** Signs this browser in under a new session id; what it could open as a guest it still can. */
  async signIn(request: Request, accountId: string): Promise<void> {
    const { grants } = request.session;
    await new Promise<void>((resolve, reject) =>
      request.session.regenerate((error: unknown) => (error ? reject(asError(error)) : resolve())),
    );
    request.session.accountId = accountId;
    if (grants) request.session.grants = grants;
  }

  /** Forgets everything about this browser. */
  async signOut(request: Request): Promise<void> {
    await new Promise<void>((resolve, reject) =>
      request.session.destroy((error: unknown) => (error ? reject(asError(error)) : resolve())),
    );
  }

  /** Ends every session of the account. */
  async endAll(accountId: string, manager: EntityManager = this.dataSource.manager): Promise<void> {
    await manager.query(`DELETE FROM sessions WHERE sess ->> 'accountId' = $1`, [accountId]);
  }
}

const asError = (error: unknown): Error => (error instanceof Error ? error : new Error(String(error)));
