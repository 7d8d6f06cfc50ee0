import type { FrameFacts } from '@linkfell/fit-engine';
import {
  Column,
  Entity,
  JoinColumn,
  ManyToOne,
  OneToMany,
  PrimaryGeneratedColumn,
  Unique,
  type Relation,
} from 'typeorm';

import { FrameSheetEntry } from './frame-sheet-entry.entity.js';
import { Frame } from './frame.entity.js';

/** What a sheet says beside its entries; name, version and entries live in columns of their own. */
export type FrameSheetFacts = Omit<FrameFacts, 'origin' | 'id' | 'name' | 'sheetVersion' | 'entries'>;

/** Published and never changed: a correction is a new version. */
@Entity('frame_sheets')
@Unique('frame_sheets_version_once', ['frameId', 'version'])
export class FrameSheet {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('text')
  frameId: string;

  @ManyToOne(() => Frame, (frame) => frame.sheets, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn()
  frame: Relation<Frame>;

  @Column('integer')
  version: number;

  @Column('jsonb')
  facts: FrameSheetFacts;

  @Column('timestamptz', { default: () => 'now()' })
  publishedAt: Date;

  @OneToMany(() => FrameSheetEntry, (entry) => entry.sheet)
  entries: Relation<FrameSheetEntry>[];
}
