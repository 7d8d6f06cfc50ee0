import { Check, Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';

import { Maker } from '../frames/maker.entity.js';

export type ItemKind = 'shock' | 'coil' | 'kit' | 'remote' | 'hold-open';

/** Anything that can be on sale. */
@Entity('catalogue_items')
@Check('catalogue_items_kind_known', `kind IN ('shock','coil','kit','remote','hold-open')`)
export class CatalogueItem {
  @PrimaryColumn('text')
  id: string;

  @Index('catalogue_items_by_kind')
  @Column('text')
  kind: ItemKind;

  @Column('text')
  makerId: string;

  @ManyToOne(() => Maker, { nullable: false })
  @JoinColumn()
  maker: Relation<Maker>;

  @Column('text')
  name: string;
}
