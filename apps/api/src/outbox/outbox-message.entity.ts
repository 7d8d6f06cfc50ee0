import { Check, Column, Entity, Index, PrimaryGeneratedColumn, Unique } from 'typeorm';

/** Something that must leave the process, written in the transaction that decided it. */
@Entity('outbox')
@Unique('outbox_dedupe_once', ['dedupeKey'])
@Index('outbox_due', ['nextTryAt'], { where: `state = 'pending'` })
@Check('outbox_state_known', `state IN ('pending','done','dead')`)
export class OutboxMessage {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('text')
  topic: string;

  @Column('jsonb')
  payload: unknown;

  @Column('text', { nullable: true })
  dedupeKey: string | null;

  @Column('text', { default: 'pending' })
  state: 'pending' | 'done' | 'dead';

  @Column('integer', { default: 0 })
  attempts: number;

  @Column('timestamptz', { default: () => 'now()' })
  nextTryAt: Date;

  @Column('timestamptz', { nullable: true })
  leaseUntil: Date | null;

  @Column('text', { nullable: true })
  lastError: string | null;

  @Column('timestamptz', { default: () => 'now()' })
  createdAt: Date;

  @Column('timestamptz', { nullable: true })
  doneAt: Date | null;
}
