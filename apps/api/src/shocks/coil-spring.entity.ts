import { Check, Column, Entity, JoinColumn, OneToOne, PrimaryColumn, type Relation } from 'typeorm';

import { CatalogueItem } from './catalogue-item.entity.js';

@Entity('coil_springs')
@Check('coil_springs_rate_positive', `rate_lb_per_in > 0`)
export class CoilSpring {
  @PrimaryColumn('text')
  itemId: string;

  @OneToOne(() => CatalogueItem, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn()
  item: Relation<CatalogueItem>;

  @Column('integer')
  rateLbPerIn: number;

  @Column('double precision')
  travelMm: number;

  @Column('double precision')
  insideMm: number;

  @Column('double precision')
  freeLengthMm: number;
}
