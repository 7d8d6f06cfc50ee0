import type { QuestionKey, StoredAnswer } from '@linkfell/contracts';
import { Column, Entity, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';

import { MeasureUp } from './measure-up.entity.js';

@Entity('measure_up_answers')
export class MeasureUpAnswer {
  @PrimaryColumn('uuid')
  measureUpId: string;

  @ManyToOne(() => MeasureUp, (measureUp) => measureUp.answers, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn()
  measureUp: Relation<MeasureUp>;

  @PrimaryColumn('text')
  question: QuestionKey;

  /** The answer as the contract keeps it, "I don't know" included. */
  @Column('jsonb')
  value: StoredAnswer;

  /** Revision of the measure-up at which this answer was given. */
  @Column('integer')
  revision: number;

  @Column('timestamptz', { default: () => 'now()' })
  updatedAt: Date;
}
