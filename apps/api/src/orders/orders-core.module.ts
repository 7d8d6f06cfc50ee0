import { Module } from '@nestjs/common';

import { NotificationsModule } from '../notifications/notifications.module.js';
import { OutboxModule } from '../outbox/outbox.module.js';
import { WorkshopsModule } from '../workshops/workshops.module.js';
import { OrderLifecycle } from './lifecycle.service.js';
import { MailFacts } from './mail-facts.service.js';
import { RiderMails } from './rider-mails.service.js';
import { TradeMails } from './trade-mails.service.js';

/** What every feature that changes an order goes through. */
@Module({
  imports: [NotificationsModule, OutboxModule, WorkshopsModule],
  providers: [OrderLifecycle, MailFacts, RiderMails, TradeMails],
  exports: [OrderLifecycle, RiderMails, TradeMails, OutboxModule, WorkshopsModule],
})
export class OrdersCoreModule {}
