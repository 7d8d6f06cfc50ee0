import { Column, Entity, PrimaryColumn } from 'typeorm';

/** One webhook delivery; its id is stored before anything is done, so a second delivery is recognised. */
@Entity('stripe_events')
export class StripeEvent {
  @PrimaryColumn('text')
  id: string;

  @Column('text')
  type: string;

  @Column('text', { nullable: true })
  objectId: string | null;

  @Column('timestamptz', { default: () => 'now()' })
  receivedAt: Date;

  @Column('timestamptz', { nullable: true })
  processedAt: Date | null;
}
