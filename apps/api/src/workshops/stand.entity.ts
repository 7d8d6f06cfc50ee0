import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';

import { Organisation } from '../organisations/organisation.entity.js';

/** A mechanic's work place; one job at a time. */
@Entity('stands')
export class Stand {
  @PrimaryColumn('text')
  id: string;

  @Index('stands_by_organisation')
  @Column('text')
  organisationId: string;

  @ManyToOne(() => Organisation, (organisation) => organisation.stands, {
    nullable: false,
    onDelete: 'CASCADE',
  })
  @JoinColumn()
  organisation: Relation<Organisation>;

  @Column('text')
  name: string;
}
