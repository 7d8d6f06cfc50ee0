import { Check, Column, Entity, JoinColumn, OneToOne, PrimaryColumn, type Relation } from 'typeorm';

import { CatalogueItem } from './catalogue-item.entity.js';

@Entity('remotes')
@Check('remotes_action_known', `action IN ('pull-to-lock','pull-to-open')`)
@Check('remotes_line_known', `line IN ('cable','hydraulic')`)
export class Remote {
  @PrimaryColumn('text')
  itemId: string;

  @OneToOne(() => CatalogueItem, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn()
  item: Relation<CatalogueItem>;

  @Column('text')
  action: 'pull-to-lock' | 'pull-to-open';

  @Column('text')
  line: 'cable' | 'hydraulic';
}
