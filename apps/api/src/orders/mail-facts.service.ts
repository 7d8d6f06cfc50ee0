import { Inject, Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';

import { CONFIG, type Config } from '../config/config.js';
import { fromRangeText } from '../database/time-range.js';
import type { Booking } from '../fitting-bookings/booking.entity.js';
import type { AboutOrder } from '../notifications/templates/about-order.js';
import { Organisation } from '../organisations/organisation.entity.js';
import { whenText } from './date-text.js';
import { OrderLine } from './order-line.entity.js';
import type { Order } from './order.entity.js';

/** What mails about orders say, read in the transaction that gives rise to them. */
@Injectable()
export class MailFacts {
  constructor(@Inject(CONFIG) private readonly config: Config) {}

  about(order: Order, path = `/orders/${order.reference}`): AboutOrder {
    return {
      reference: order.reference,
      title: order.job.title,
      shockName: order.job.shockName,
      url: this.url(path),
    };
  }

  url(path: string): string {
    return `${this.config.PUBLIC_URL}${path}`;
  }

  async itemsIn(manager: EntityManager, parcelId: string): Promise<string[]> {
    const lines = await manager.find(OrderLine, {
      where: { parcelId, kind: 'item' },
      order: { position: 'ASC' },
    });
    return lines.map((line) => `${line.quantity} x ${line.description}`);
  }

  place(manager: EntityManager, id: string): Promise<Organisation> {
    return manager.findOneOrFail(Organisation, { where: { id }, relations: { town: true } });
  }

  /** Start of the fitting as people at the workshop say it. */
  when(booking: Booking, { timeZone }: Organisation): string {
    return whenText(fromRangeText(booking.during).start, timeZone);
  }

  answerBy({ answerBy }: Booking, { timeZone }: Organisation): string {
    return answerBy ? whenText(answerBy, timeZone) : 'the end of the next working day';
  }
}

export const addressOf = (place: Organisation): string =>
  `${place.street}, ${place.town.name} ${place.postcode}`;
