import type { ContactBody } from '@linkfell/contracts';
import {
  Check,
  Column,
  Entity,
  Index,
  JoinColumn,
  ManyToOne,
  OneToMany,
  PrimaryGeneratedColumn,
  Unique,
  type Relation,
} from 'typeorm';

import { MeasureUp } from '../measure-ups/measure-up.entity.js';
import { Plan } from '../plans/plan.entity.js';
import type { OrderJob } from './order-job.js';
import { OrderLine } from './order-line.entity.js';
import { Parcel } from './parcel.entity.js';

export type OrderState = 'held' | 'paid' | 'completed' | 'released' | 'refunding' | 'refunded';

/** States in which an order stands for its plan: no second one is made beside it. */
export const liveStates: OrderState[] = ['held', 'paid', 'completed', 'refunding'];

@Entity('orders')
@Unique('orders_reference_once', ['reference'])
@Check('orders_state_known', `state IN ('held','paid','completed','released','refunding','refunded')`)
@Check('orders_fit_known', `fit IN ('self','workshop')`)
@Check('orders_total_positive', `total_minor > 0`)
export class Order {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  /** What people use, such as LF-7K3QX2AB. */
  @Column('text')
  reference: string;

  @Index('orders_by_plan')
  @Column('uuid', { nullable: true })
  planId: string | null;

  @ManyToOne(() => Plan, { nullable: true, onDelete: 'SET NULL' })
  @JoinColumn()
  plan: Relation<Plan> | null;

  @Column('uuid', { nullable: true })
  measureUpId: string | null;

  @ManyToOne(() => MeasureUp, { nullable: true, onDelete: 'SET NULL' })
  @JoinColumn()
  measureUp: Relation<MeasureUp> | null;

  @Column('text')
  state: OrderState;

  @Column('text')
  fit: 'self' | 'workshop';

  @Index('orders_by_email')
  @Column('text')
  email: string;

  @Column('jsonb')
  contact: ContactBody;

  /** The work as it was judged when the order was placed. */
  @Column('jsonb')
  job: OrderJob;

  @Column('text', { default: 'gbp' })
  currency: string;

  @Column('integer')
  totalMinor: number;

  @Column('text', { nullable: true })
  releaseReason: string | null;

  @Column('timestamptz')
  holdExpiresAt: Date;

  @Column('timestamptz', { default: () => 'now()' })
  createdAt: Date;

  @Column('timestamptz', { nullable: true })
  paidAt: Date | null;

  @Column('timestamptz', { nullable: true })
  endedAt: Date | null;

  @Column('integer', { default: 1 })
  version: number;

  @OneToMany(() => OrderLine, (line) => line.order)
  lines: Relation<OrderLine>[];

  @OneToMany(() => Parcel, (parcel) => parcel.order)
  parcels: Relation<Parcel>[];
}
