import { Column, Entity, PrimaryColumn } from 'typeorm';

@Entity('idempotency_keys')
export class IdempotencyKey {
  @PrimaryColumn('text')
  actor: string;

  @PrimaryColumn('text')
  operation: string;

  @PrimaryColumn('text')
  key: string;

  @Column('text')
  requestHash: string;

  /** Null while the first request is still at work. */
  @Column('jsonb', { nullable: true })
  response: unknown;

  @Column('integer', { nullable: true })
  status: number | null;

  @Column('timestamptz', { default: () => 'now()' })
  createdAt: Date;
}
