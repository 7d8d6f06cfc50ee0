import { Column, Entity, JoinColumn, OneToOne, PrimaryColumn, type Relation } from 'typeorm';

import { CatalogueItem } from './catalogue-item.entity.js';

@Entity('hardware_kits')
export class HardwareKit {
  @PrimaryColumn('text')
  itemId: string;

  @OneToOne(() => CatalogueItem, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn()
  item: Relation<CatalogueItem>;

  @Column('double precision')
  boreMm: number;

  @Column('double precision')
  widthMm: number;

  @Column('double precision')
  boltMm: number;
}
