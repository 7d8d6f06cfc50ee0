import type { SheetEntry } from '@linkfell/fit-engine';
import { Column, Entity, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';

import { FrameSheet } from './frame-sheet.entity.js';

@Entity('frame_sheet_entries')
export class FrameSheetEntry {
  @PrimaryColumn('uuid')
  sheetId: string;

  @ManyToOne(() => FrameSheet, (sheet) => sheet.entries, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn()
  sheet: Relation<FrameSheet>;

  @PrimaryColumn('text')
  entryId: string;

  /** Order on the sheet. */
  @Column('integer')
  position: number;

  @Column('text')
  sizeKey: string;

  @Column('double precision', { nullable: true })
  travelMm: number | null;

  @Column('jsonb')
  facts: SheetEntry;
}
