import { Inject, Injectable, Logger } from '@nestjs/common';
import { DataSource, IsNull, MoreThan } from 'typeorm';

import { Account } from '../accounts/account.entity.js';
import { AccountsService } from '../accounts/accounts.service.js';
import { isCommonPassword } from '../accounts/common-password.js';
import { hashPassword } from '../accounts/passwords.js';
import { Clock } from '../common/clock.js';
import { hashToken, newToken } from '../common/token.js';
import { CONFIG, type Config } from '../config/config.js';
import { inTransaction } from '../database/in-transaction.js';
import { Mailer } from '../notifications/mailer.service.js';
import { MailService } from '../notifications/mail.service.js';
import { OutboxHandler, type OutboxDelivery } from '../outbox/outbox-handler.js';
import { OutboxService } from '../outbox/outbox.service.js';
import { AccountSessions } from './account-sessions.service.js';
import { AuthException } from './auth.exception.js';
import { PasswordReset } from './password-reset.entity.js';

const minute = 60_000;
export const resetMinutes = 30;
/** Links mailed to one account within an hour; more would be somebody filling an inbox. */
const mostPerHour = 3;

@Injectable()
export class PasswordResets {
  private readonly logger = new Logger(PasswordResets.name);

  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly accounts: AccountsService,
    private readonly sessions: AccountSessions,
    private readonly outbox: OutboxService,
    private readonly mailer: Mailer,
    private readonly mail: MailService,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  /** Known or not, the request writes one row; whether there is such an account is found out later, elsewhere. */
  async request(email: string): Promise<void> {
    await this.dataSource.transaction((manager) => this.outbox.add(manager, 'password-reset', { email }));
  }

  /** Makes the link and mails it at once: the token itself is written down nowhere. */
  @OutboxHandler('password-reset')
  async deliver({ email }: { email: string }, delivery: OutboxDelivery): Promise<void> {
    const account = await this.accounts.findByEmail(email);
    if (!account) return;
    const now = this.clock.now();
    const hourAgo = new Date(now.getTime() - 60 * minute);
    const recent = await this.dataSource.manager.countBy(PasswordReset, {
      accountId: account.id,
      createdAt: MoreThan(hourAgo),
    });
    if (recent >= mostPerHour && delivery.attempt === 1) return;
    const token = newToken();
    await this.dataSource.transaction(async (manager) => {
      // A newer link ends the older ones, also when this is a second try after a mail that did not leave.
      await manager.update(PasswordReset, { accountId: account.id, usedAt: IsNull() }, { usedAt: now });
      await manager.insert(PasswordReset, {
        accountId: account.id,
        tokenHash: hashToken(token),
        createdAt: now,
        expiresAt: new Date(now.getTime() + resetMinutes * minute),
      });
    });
    await this.mailer.send(delivery.id, {
      template: 'password-reset',
      to: account.email,
      data: {
        name: account.displayName,
        url: `${this.config.PUBLIC_URL}/reset-password#${token}`,
        minutes: resetMinutes,
      },
    });
  }

  /**
   * Sets the new password and ends every session of the account.
   * @throws AuthException "reset-link-spent", "password-too-common"
   */
  async confirm(token: string, password: string): Promise<void> {
    const usable = { tokenHash: hashToken(token), usedAt: IsNull(), expiresAt: MoreThan(this.clock.now()) };
    const reset = await this.dataSource.manager.findOne(PasswordReset, {
      where: usable,
      relations: { account: true },
    });
    if (!reset) throw new AuthException('reset-link-spent');
    const { account } = reset;
    if (isCommonPassword(password, [account.email, account.displayName])) {
      throw new AuthException('password-too-common', {
        errors: [{ pointer: '/password', detail: 'Choose a password that is harder to guess' }],
      });
    }
    const passwordHash = await hashPassword(password);
    await inTransaction(this.dataSource, async (manager) => {
      const { affected } = await manager.update(PasswordReset, usable, { usedAt: this.clock.now() });
      if (affected !== 1) throw new AuthException('reset-link-spent');
      await manager.update(Account, { id: account.id }, { passwordHash });
      await this.sessions.endAll(account.id, manager);
      await this.mail.queue(manager, {
        template: 'password-changed',
        to: account.email,
        data: { name: account.displayName, url: `${this.config.PUBLIC_URL}/forgotten-password` },
        dedupeKey: `password-changed:${reset.id}`,
      });
    });
    this.logger.log({ event: 'password-reset', accountId: account.id }, 'password reset');
  }
}
