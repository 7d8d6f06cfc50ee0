import {
  Check,
  Column,
  Entity,
  JoinColumn,
  ManyToOne,
  PrimaryGeneratedColumn,
  Unique,
  type Relation,
} from 'typeorm';

import { Order } from '../orders/order.entity.js';

export type PaymentState = 'preparing' | 'open' | 'paid' | 'expired';

@Entity('payments')
@Unique('payments_one_per_order', ['orderId'])
@Unique('payments_session_once', ['providerSessionId'])
@Unique('payments_intent_once', ['providerPaymentIntentId'])
@Check('payments_state_known', `state IN ('preparing','open','paid','expired')`)
@Check('payments_amount_positive', `amount_minor > 0`)
@Check('payments_refund_within', `refunded_minor BETWEEN 0 AND amount_minor`)
export class Payment {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  orderId: string;

  @ManyToOne(() => Order, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn()
  order: Relation<Order>;

  @Column('text')
  state: PaymentState;

  @Column('integer')
  amountMinor: number;

  @Column('integer', { default: 0 })
  refundedMinor: number;

  @Column('text')
  currency: string;

  @Column('text', { nullable: true })
  providerSessionId: string | null;

  @Column('text', { nullable: true })
  providerPaymentIntentId: string | null;

  /** The hosted page where the rider pays. */
  @Column('text', { nullable: true })
  url: string | null;

  @Column('timestamptz', { default: () => 'now()' })
  createdAt: Date;

  @Column('timestamptz', { nullable: true })
  paidAt: Date | null;
}
