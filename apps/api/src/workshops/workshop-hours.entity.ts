import { Check, Column, Entity, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';

import { Organisation } from '../organisations/organisation.entity.js';

@Entity('workshop_hours')
@Check('workshop_hours_weekday_iso', `weekday BETWEEN 1 AND 7`)
@Check('workshop_hours_forward', `opens < closes`)
export class WorkshopHours {
  @PrimaryColumn('text')
  organisationId: string;

  @ManyToOne(() => Organisation, (organisation) => organisation.hours, {
    nullable: false,
    onDelete: 'CASCADE',
  })
  @JoinColumn()
  organisation: Relation<Organisation>;

  /** ISO weekday, Monday is 1. */
  @PrimaryColumn('integer')
  weekday: number;

  /** Local time of day, HH:MM:SS. */
  @PrimaryColumn('time')
  opens: string;

  @Column('time')
  closes: string;
}
