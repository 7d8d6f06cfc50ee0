import {
  Check,
  Column,
  Entity,
  JoinColumn,
  ManyToOne,
  OneToMany,
  PrimaryColumn,
  type Relation,
} from 'typeorm';

import { Stand } from '../workshops/stand.entity.js';
import { WorkshopClosure } from '../workshops/workshop-closure.entity.js';
import { WorkshopHours } from '../workshops/workshop-hours.entity.js';
import { WorkshopService } from '../workshops/workshop-service.entity.js';
import { OrganisationMember } from './organisation-member.entity.js';
import { Town } from './town.entity.js';

/** A shop, a workshop, or both. */
@Entity('organisations')
@Check('organisations_some_trade', `is_shop OR is_workshop`)
@Check('organisations_vat_range', `vat_rate_bp BETWEEN 0 AND 5000`)
@Check('organisations_carrier_days_range', `carrier_days BETWEEN 0 AND 30`)
@Check('organisations_carriage_positive', `carriage_minor >= 0`)
export class Organisation {
  @PrimaryColumn('text')
  id: string;

  @Column('text')
  name: string;

  @Column('boolean')
  isShop: boolean;

  @Column('boolean')
  isWorkshop: boolean;

  @Column('text')
  email: string;

  @Column('text')
  phone: string;

  @Column('text')
  street: string;

  @Column('text')
  townId: string;

  @ManyToOne(() => Town, { nullable: false })
  @JoinColumn()
  town: Relation<Town>;

  @Column('text')
  postcode: string;

  @Column('double precision')
  latitude: number;

  @Column('double precision')
  longitude: number;

  /** IANA name; all its days and hours are meant there. */
  @Column('text', { default: 'Europe/London' })
  timeZone: string;

  @Column('text')
  vatNumber: string;

  /** Basis points: 2000 is 20 %. */
  @Column('integer', { default: 2000 })
  vatRateBp: number;

  /** Local time of day, HH:MM:SS; orders released before it leave the same working day. */
  @Column('time', { default: '14:00:00' })
  dispatchCutoff: string;

  /** ISO weekdays, Monday is 1. */
  @Column('integer', { array: true, default: '{1,2,3,4,5}' })
  dispatchWeekdays: number[];

  @Column('integer', { default: 1 })
  carrierDays: number;

  @Column('integer', { default: 0 })
  carriageMinor: number;

  @Column('text', { default: '' })
  about: string;

  @Column('text', { nullable: true })
  stripeAccountId: string | null;

  @OneToMany(() => OrganisationMember, (member) => member.organisation)
  members: Relation<OrganisationMember>[];

  @OneToMany(() => Stand, (stand) => stand.organisation)
  stands: Relation<Stand>[];

  @OneToMany(() => WorkshopHours, (hours) => hours.organisation)
  hours: Relation<WorkshopHours>[];

  @OneToMany(() => WorkshopClosure, (closure) => closure.organisation)
  closures: Relation<WorkshopClosure>[];

  @OneToMany(() => WorkshopService, (service) => service.organisation)
  services: Relation<WorkshopService>[];
}
