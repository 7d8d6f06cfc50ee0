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

  @OneToMany(() => ShockSize, (size) => size.model)
  sizes: Relation<ShockSize>[];
}
