import type { PlanChoices } from '@linkfell/contracts';
import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryGeneratedColumn, type Relation } from 'typeorm';

import { MeasureUp } from '../measure-ups/measure-up.entity.js';
import { ShockSize } from '../shocks/shock-size.entity.js';

@Entity('plans')
export class Plan {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Index('plans_by_measure_up')
  @Column('uuid')
  measureUpId: string;

  @ManyToOne(() => MeasureUp, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn()
  measureUp: Relation<MeasureUp>;

  @Column('text')
  shockItemId: string;

  @ManyToOne(() => ShockSize, { nullable: false })
  @JoinColumn({ name: 'shock_item_id', foreignKeyConstraintName: 'plans_shock' })
  shock: Relation<ShockSize>;

  @Column('jsonb')
  choices: PlanChoices;

  @Column('integer', { default: 1 })
  revision: number;

  @Column('timestamptz', { default: () => 'now()' })
  createdAt: Date;

  @Column('timestamptz', { default: () => 'now()' })
  updatedAt: Date;
}
