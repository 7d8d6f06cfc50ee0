import { Entity, JoinColumn, OneToOne, PrimaryColumn, type Relation } from 'typeorm';

import { CatalogueItem } from './catalogue-item.entity.js';

@Entity('hold_open_parts')
export class HoldOpenPart {
  @PrimaryColumn('text')
  itemId: string;

  @OneToOne(() => CatalogueItem, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn()
  item: Relation<CatalogueItem>;
}
