import {
  Check,
  Column,
  Entity,
  Exclusion,
  Index,
  JoinColumn,
  ManyToOne,
  PrimaryGeneratedColumn,
  Unique,
  type Relation,
} from 'typeorm';

import { Account } from '../accounts/account.entity.js';
import { Order } from '../orders/order.entity.js';
import { Organisation } from '../organisations/organisation.entity.js';
import { Stand } from '../workshops/stand.entity.js';

export type BookingState =
  'held' | 'requested' | 'accepted' | 'declined' | 'lapsed' | 'cancelled' | 'released' | 'fitted';

@Entity('bookings')
@Unique('bookings_calendar_uid_once', ['calendarUid'])
@Index('bookings_by_workshop', ['workshopId', 'state'])
@Index('bookings_one_live_per_order', ['orderId'], {
  unique: true,
  where: `state IN ('held','requested','accepted')`,
})
@Check(
  'bookings_state_known',
  `state IN ('held','requested','accepted','declined','lapsed','cancelled','released','fitted')`,
)
@Check('bookings_during_bounded', `NOT isempty(during) AND NOT lower_inf(during) AND NOT upper_inf(during)`)
@Exclusion(
  'bookings_stand_once',
  `USING gist (stand_id WITH =, during WITH &&) WHERE (state IN ('held','requested','accepted','fitted'))`,
)
export class Booking {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Index('bookings_by_order')
  @Column('uuid')
  orderId: string;

  @ManyToOne(() => Order, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn()
  order: Relation<Order>;

  @Column('text')
  workshopId: string;

  @ManyToOne(() => Organisation, { nullable: false })
  @JoinColumn()
  workshop: Relation<Organisation>;

  @Column('text')
  standId: string;

  @ManyToOne(() => Stand, { nullable: false })
  @JoinColumn()
  stand: Relation<Stand>;

  /** A range as PostgreSQL prints it; read and written through time-range.ts. */
  @Column('tstzrange')
  during: string;

  @Column('text')
  state: BookingState;

  @Column('timestamptz', { nullable: true })
  answerBy: Date | null;

  @Column('text', { nullable: true })
  declineReason: string | null;

  @Column('text')
  calendarUid: string;

  @Column('integer', { default: 0 })
  calendarSequence: number;

  @Column('timestamptz', { default: () => 'now()' })
  createdAt: Date;

  @Column('timestamptz', { nullable: true })
  decidedAt: Date | null;

  @Column('uuid', { nullable: true })
  decidedBy: string | null;

  @ManyToOne(() => Account, { nullable: true })
  @JoinColumn({ name: 'decided_by' })
  decider: Relation<Account> | null;

  @Column('integer', { default: 1 })
  version: number;
}
