import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';

import { OutboxHandler, type OutboxDelivery } from '../outbox/outbox-handler.js';
import { OutboxService } from '../outbox/outbox.service.js';
import type { Mail } from './mail.js';
import { Mailer } from './mailer.service.js';

/** How features send mail: with the decision, in its transaction. */
@Injectable()
export class MailService {
  constructor(
    private readonly outbox: OutboxService,
    private readonly mailer: Mailer,
  ) {}

  /** Queues a mail in the transaction of `manager`; with a `dedupeKey` that was used before, nothing. */
  async queue(manager: EntityManager, { dedupeKey, ...mail }: Mail & { dedupeKey?: string }): Promise<void> {
    await this.outbox.add(
      manager,
      'mail',
      mail,
      dedupeKey === undefined ? {} : { dedupeKey: `mail:${dedupeKey}` },
    );
  }

  @OutboxHandler('mail')
  async deliver(mail: Mail, delivery: OutboxDelivery): Promise<void> {
    await this.mailer.send(delivery.id, mail);
  }
}
