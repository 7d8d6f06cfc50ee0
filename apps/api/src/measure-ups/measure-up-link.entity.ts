import {
  Column,
  Entity,
  Index,
  JoinColumn,
  ManyToOne,
  PrimaryGeneratedColumn,
  Unique,
  type Relation,
} from 'typeorm';

import { MeasureUp } from './measure-up.entity.js';

/** A link that opens one measure-up on another device; only the token's hash is kept. */
@Entity('measure_up_links')
@Unique('measure_up_links_token_once', ['tokenHash'])
export class MeasureUpLink {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Index('measure_up_links_by_measure_up')
  @Column('uuid')
  measureUpId: string;

  @ManyToOne(() => MeasureUp, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn()
  measureUp: Relation<MeasureUp>;

  @Column('text')
  tokenHash: string;

  @Column('timestamptz', { default: () => 'now()' })
  createdAt: Date;

  @Column('timestamptz', { nullable: true })
  revokedAt: Date | null;
}
