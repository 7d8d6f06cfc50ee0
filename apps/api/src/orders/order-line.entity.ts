import {
  Check,
  Column,
  Entity,
  Index,
  JoinColumn,
  ManyToOne,
  PrimaryGeneratedColumn,
  type Relation,
} from 'typeorm';

import { Listing } from '../listings/listing.entity.js';
import { Organisation } from '../organisations/organisation.entity.js';
import { CatalogueItem } from '../shocks/catalogue-item.entity.js';
import { Order } from './order.entity.js';
import { Parcel } from './parcel.entity.js';

@Entity('order_lines')
@Check('order_lines_kind_known', `kind IN ('item','carriage','work')`)
@Check('order_lines_quantity_positive', `quantity > 0`)
@Check('order_lines_unit_not_negative', `unit_minor >= 0`)
export class OrderLine {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Index('order_lines_by_order')
  @Column('uuid')
  orderId: string;

  @ManyToOne(() => Order, (order) => order.lines, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn()
  order: Relation<Order>;

  @Column('uuid', { nullable: true })
  parcelId: string | null;

  @ManyToOne(() => Parcel, { nullable: true })
  @JoinColumn()
  parcel: Relation<Parcel> | null;

  @Column('text')
  sellerId: string;

  @ManyToOne(() => Organisation, { nullable: false })
  @JoinColumn()
  seller: Relation<Organisation>;

  @Column('text')
  kind: 'item' | 'carriage' | 'work';

  @Column('uuid', { nullable: true })
  listingId: string | null;

  @ManyToOne(() => Listing, { nullable: true })
  @JoinColumn()
  listing: Relation<Listing> | null;

  @Column('text', { nullable: true })
  itemId: string | null;

  @ManyToOne(() => CatalogueItem, { nullable: true })
  @JoinColumn()
  item: Relation<CatalogueItem> | null;

  @Column('text')
  description: string;

  @Column('integer')
  quantity: number;

  /** VAT included. */
  @Column('integer')
  unitMinor: number;

  @Column('integer')
  vatRateBp: number;

  @Column('integer')
  position: number;
}
