import { Check, Column, Entity, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';

import { Organisation } from '../organisations/organisation.entity.js';

@Entity('workshop_closures')
@Check('workshop_closures_forward', `first_day <= last_day`)
export class WorkshopClosure {
  @PrimaryColumn('text')
  organisationId: string;

  @ManyToOne(() => Organisation, (organisation) => organisation.closures, {
    nullable: false,
    onDelete: 'CASCADE',
  })
  @JoinColumn()
  organisation: Relation<Organisation>;

  /** ISO day in the workshop's zone; both days are closed. */
  @PrimaryColumn('date')
  firstDay: string;

  @Column('date')
  lastDay: string;

  @Column('text')
  reason: string;
}
