import {
  Check,
  Column,
  Entity,
  Index,
  JoinColumn,
  ManyToOne,
  PrimaryGeneratedColumn,
  Unique,
  type Relation,
} from 'typeorm';

import { Organisation } from '../organisations/organisation.entity.js';
import { Order } from './order.entity.js';

export type ParcelState = 'held' | 'waiting' | 'to-send' | 'sent' | 'cancelled';

/** Where a parcel goes: the rider, or the workshop on the rider's behalf. */
export interface ParcelAddress {
  name: string;
  lines: string[];
}

@Entity('parcels')
@Unique('parcels_one_per_shop', ['orderId', 'shopId'])
@Index('parcels_by_shop', ['shopId', 'state'])
@Check('parcels_state_known', `state IN ('held','waiting','to-send','sent','cancelled')`)
export class Parcel {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  orderId: string;

  @ManyToOne(() => Order, (order) => order.parcels, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn()
  order: Relation<Order>;

  @Column('text')
  shopId: string;

  @ManyToOne(() => Organisation, { nullable: false })
  @JoinColumn()
  shop: Relation<Organisation>;

  @Column('text')
  state: ParcelState;

  @Column('jsonb')
  address: ParcelAddress;

  /** ISO day in the shop's zone. */
  @Column('date')
  dispatchBy: string;

  @Column('text', { nullable: true })
  tracking: string | null;

  @Column('timestamptz', { nullable: true })
  sentAt: Date | null;

  @Column('integer', { default: 1 })
  version: number;
}
