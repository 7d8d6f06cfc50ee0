import {
  Check,
  Column,
  Entity,
  Index,
  JoinColumn,
  ManyToOne,
  PrimaryGeneratedColumn,
  type Relation,
} from 'typeorm';

import { Account } from '../accounts/account.entity.js';
import { Order } from '../orders/order.entity.js';
import { Listing } from './listing.entity.js';

export type StockMovementKind = 'open' | 'set' | 'reserve' | 'release' | 'dispatch';

/** The ledger behind a listing's two levels: every change of stock is one row, never altered. */
@Entity('stock_movements')
@Index('stock_movements_by_listing', ['listingId', 'at'])
@Check('stock_movements_kind_known', `kind IN ('open','set','reserve','release','dispatch')`)
export class StockMovement {
  @PrimaryGeneratedColumn('identity', { type: 'bigint', generatedIdentity: 'ALWAYS' })
  id: string;

  @Column('uuid')
  listingId: string;

  @ManyToOne(() => Listing, { nullable: false })
  @JoinColumn()
  listing: Relation<Listing>;

  @Column('uuid', { nullable: true })
  orderId: string | null;

  @ManyToOne(() => Order, { nullable: true, onDelete: 'SET NULL' })
  @JoinColumn()
  order: Relation<Order> | null;

  @Column('uuid', { nullable: true })
  accountId: string | null;

  @ManyToOne(() => Account, { nullable: true })
  @JoinColumn()
  account: Relation<Account> | null;

  @Column('text')
  kind: StockMovementKind;

  @Column('integer')
  quantityDelta: number;

  @Column('integer')
  reservedDelta: number;

  @Column('timestamptz', { default: () => 'now()' })
  at: Date;
}
