import {
  Column,
  Entity,
  JoinColumn,
  ManyToOne,
  OneToMany,
  PrimaryGeneratedColumn,
  type Relation,
} from 'typeorm';

import { Account } from '../accounts/account.entity.js';
import { MeasureUpAnswer } from './measure-up-answer.entity.js';

@Entity('measure_ups')
export class MeasureUp {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid', { nullable: true })
  accountId: string | null;

  @ManyToOne(() => Account, { nullable: true, onDelete: 'SET NULL' })
  @JoinColumn()
  account: Relation<Account> | null;

  /** Rises with every answer. */
  @Column('integer', { default: 0 })
  revision: number;

  @Column('timestamptz', { default: () => 'now()' })
  createdAt: Date;

  @Column('timestamptz', { default: () => 'now()' })
  updatedAt: Date;

  @OneToMany(() => MeasureUpAnswer, (answer) => answer.measureUp)
  answers: Relation<MeasureUpAnswer>[];
}
