import { Module } from '@nestjs/common';

import { NotificationsModule } from '../notifications/notifications.module.js';
import { OutboxModule } from '../outbox/outbox.module.js';
import { WorkshopsModule } from '../workshops/workshops.module.js';
import { OrderLifecycle } from './lifecycle.service.js';
import { OrderMails } from './order-mails.service.js';

/** What every feature that changes an order goes through. */
@Module({
  imports: [NotificationsModule, OutboxModule, WorkshopsModule],
  providers: [OrderLifecycle, OrderMails],
  exports: [OrderLifecycle, OrderMails, OutboxModule, WorkshopsModule],
})
export class OrdersCoreModule {}
