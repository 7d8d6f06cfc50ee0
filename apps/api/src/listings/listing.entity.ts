import {
  Check,
  Column,
  Entity,
  Index,
  JoinColumn,
  ManyToOne,
  PrimaryGeneratedColumn,
  Unique,
  type Relation,
} from 'typeorm';

import { Organisation } from '../organisations/organisation.entity.js';
import { CatalogueItem } from '../shocks/catalogue-item.entity.js';

/** One item on sale at one shop; `quantity` is on hand, of which `reserved` belongs to orders not yet sent. */
@Entity('listings')
@Unique('listings_item_once_per_shop', ['shopId', 'itemId'])
@Check('listings_price_positive', `price_minor > 0`)
@Check('listings_quantity_not_negative', `quantity >= 0`)
@Check('listings_reserved_not_negative', `reserved >= 0`)
@Check('listings_reserved_on_hand', `reserved <= quantity`)
@Check('listings_lead_days_range', `lead_days BETWEEN 0 AND 60`)
export class Listing {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('text')
  shopId: string;

  @ManyToOne(() => Organisation, { nullable: false })
  @JoinColumn()
  shop: Relation<Organisation>;

  @Index('listings_by_item')
  @Column('text')
  itemId: string;

  @ManyToOne(() => CatalogueItem, { nullable: false })
  @JoinColumn()
  item: Relation<CatalogueItem>;

  /** VAT included. */
  @Column('integer')
  priceMinor: number;

  @Column('integer')
  quantity: number;

  @Column('integer', { default: 0 })
  reserved: number;

  /** Working days the shop needs before its cut-off counts. */
  @Column('integer', { default: 0 })
  leadDays: number;

  @Column('integer', { default: 1 })
  version: number;

  @Column('timestamptz', { default: () => 'now()' })
  updatedAt: Date;
}
