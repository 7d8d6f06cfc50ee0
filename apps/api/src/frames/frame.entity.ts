import {
  Check,
  Column,
  Entity,
  Index,
  JoinColumn,
  ManyToOne,
  OneToMany,
  PrimaryColumn,
  type Relation,
} from 'typeorm';

import { FrameSheet } from './frame-sheet.entity.js';
import { Maker } from './maker.entity.js';

@Entity('frames')
@Check('frames_years_forward', `year_from <= year_to`)
export class Frame {
  @PrimaryColumn('text')
  id: string;

  @Index('frames_by_maker')
  @Column('text')
  makerId: string;

  @ManyToOne(() => Maker, { nullable: false })
  @JoinColumn()
  maker: Relation<Maker>;

  @Column('text')
  model: string;

  @Column('integer')
  yearFrom: number;

  @Column('integer')
  yearTo: number;

  /** Why this frame is in the catalogue. */
  @Column('text')
  reason: string;

  @OneToMany(() => FrameSheet, (sheet) => sheet.frame)
  sheets: Relation<FrameSheet>[];
}
