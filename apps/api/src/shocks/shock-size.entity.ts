import type { ShockFacts } from '@linkfell/fit-engine';
import {
  Column,
  Entity,
  Index,
  JoinColumn,
  ManyToOne,
  OneToOne,
  PrimaryColumn,
  type Relation,
} from 'typeorm';

import { CatalogueItem } from './catalogue-item.entity.js';
import { ShockModel } from './shock-model.entity.js';

@Entity('shock_sizes')
export class ShockSize {
  @PrimaryColumn('text')
  itemId: string;

  @OneToOne(() => CatalogueItem, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn()
  item: Relation<CatalogueItem>;

  @Index('shock_sizes_by_model')
  @Column('text')
  modelId: string;

  @ManyToOne(() => ShockModel, (model) => model.sizes, { nullable: false })
  @JoinColumn()
  model: Relation<ShockModel>;

  @Column('text')
  sizeKey: string;

  @Column('jsonb')
  facts: ShockFacts;
}
