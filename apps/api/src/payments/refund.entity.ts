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

import { Payment } from './payment.entity.js';

/** Done when the provider says so; pending again when the bank has handed the money back. */
export type RefundState = 'pending' | 'done';

@Entity('refunds')
@Unique('refunds_provider_once', ['providerRefundId'])
@Check('refunds_amount_positive', `amount_minor > 0`)
@Check('refunds_state_known', `state IN ('pending','done')`)
export class Refund {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Index('refunds_by_payment')
  @Column('uuid')
  paymentId: string;

  @ManyToOne(() => Payment, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn()
  payment: Relation<Payment>;

  @Column('integer')
  amountMinor: number;

  @Column('text')
  reason: string;

  @Column('text')
  state: RefundState;

  @Column('text', { nullable: true })
  providerRefundId: string | null;

  @Column('timestamptz', { default: () => 'now()' })
  createdAt: Date;

  @Column('timestamptz', { nullable: true })
  doneAt: Date | null;
}
