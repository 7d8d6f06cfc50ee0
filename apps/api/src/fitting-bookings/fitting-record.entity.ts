import type { FittingRecordBody } from '@linkfell/contracts';
import { Column, Entity, JoinColumn, ManyToOne, OneToOne, PrimaryColumn, type Relation } from 'typeorm';

import { Account } from '../accounts/account.entity.js';
import { Booking } from './booking.entity.js';

@Entity('fitting_records')
export class FittingRecord {
  @PrimaryColumn('uuid')
  bookingId: string;

  @OneToOne(() => Booking, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn()
  booking: Relation<Booking>;

  @Column('jsonb')
  record: FittingRecordBody;

  @Column('uuid')
  mechanicId: string;

  @ManyToOne(() => Account, { nullable: false })
  @JoinColumn()
  mechanic: Relation<Account>;

  @Column('timestamptz', { default: () => 'now()' })
  savedAt: Date;

  @Column('timestamptz', { nullable: true })
  fittedAt: Date | null;

  @Column('integer', { default: 1 })
  version: number;
}
