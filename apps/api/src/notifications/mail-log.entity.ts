import { Column, Entity, JoinColumn, OneToOne, PrimaryGeneratedColumn, Unique, type Relation } from 'typeorm';

import { OutboxMessage } from '../outbox/outbox-message.entity.js';

@Entity('mail_log')
@Unique('mail_log_outbox_once', ['outboxId'])
export class MailLog {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid', { nullable: true })
  outboxId: string | null;

  @OneToOne(() => OutboxMessage, { nullable: true, onDelete: 'SET NULL' })
  @JoinColumn()
  outbox: Relation<OutboxMessage> | null;

  @Column('text')
  template: string;

  @Column('text')
  recipient: string;

  @Column('text')
  subject: string;

  @Column('text')
  messageId: string;

  @Column('timestamptz', { default: () => 'now()' })
  sentAt: Date;
}
