import type { WorkId } from '@linkfell/fit-engine';
import { Check, Column, Entity, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';

import { Organisation } from '../organisations/organisation.entity.js';

@Entity('workshop_services')
@Check('workshop_services_minutes_range', `minutes BETWEEN 5 AND 480`)
@Check('workshop_services_price_positive', `price_minor >= 0`)
export class WorkshopService {
  @PrimaryColumn('text')
  organisationId: string;

  @ManyToOne(() => Organisation, (organisation) => organisation.services, {
    nullable: false,
    onDelete: 'CASCADE',
  })
  @JoinColumn()
  organisation: Relation<Organisation>;

  @PrimaryColumn('text')
  workId: WorkId;

  @Column('integer')
  minutes: number;

  @Column('integer')
  priceMinor: number;
}
