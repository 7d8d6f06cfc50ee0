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

import { Maker } from '../frames/maker.entity.js';
import { ShockSize } from './shock-size.entity.js';

@Entity('shock_models')
@Check('shock_models_spring_known', `spring IN ('air','coil')`)
@Check('shock_models_warranty_positive', `warranty_months > 0`)
export class ShockModel {
  @PrimaryColumn('text')
  id: string;

  @Column('text')
  makerId: string;

  @ManyToOne(() => Maker, { nullable: false })
  @JoinColumn()
  maker: Relation<Maker>;

  @Column('text')
  name: string;

  @Column('text')
  spring: 'air' | 'coil';

  @Column('text')
  summary: string;

  /** The maker's, beyond what the law gives; null where none is stated. */
  @Column('integer', { nullable: true })
  warrantyMonths: number | null;

  /** As the maker lists it; empty where nothing is stated. */
  @Column('text', { array: true, default: '{}' })
  inTheBox: string[];

  @OneToMany(() => ShockSize, (size) => size.model)
  sizes: Relation<ShockSize>[];
}
