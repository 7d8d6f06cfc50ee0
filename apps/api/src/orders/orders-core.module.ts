import { Module } from '@nestjs/common';

import { WorkshopsModule } from '../workshops/workshops.module.js';
import { OrderLifecycle } from './lifecycle.service.js';
import { OrderMails } from './order-mails.service.js';

/** What every feature that changes an order goes through. */
@Module({
  imports: [WorkshopsModule],
  providers: [OrderLifecycle, OrderMails],
  exports: [OrderLifecycle, OrderMails, WorkshopsModule],
})
export class OrdersCoreModule {}
