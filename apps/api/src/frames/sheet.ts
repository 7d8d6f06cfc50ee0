import type { FrameFacts, SheetEntry } from '@linkfell/fit-engine';

/** The sheet in force of one frame, with the names that stand beside it. */
export interface FrameSheetData {
  frame: {
    id: string;
    makerId: string;
    makerName: string;
    model: string;
    yearFrom: number;
    yearTo: number;
  };
  version: number;
  publishedAt: Date;
  facts: Omit<FrameFacts, 'origin' | 'id' | 'name' | 'sheetVersion' | 'entries'>;
  entries: (SheetEntry & { sizeKey: string })[];
}

export const frameName = (sheet: FrameSheetData): string => `${sheet.frame.makerName} ${sheet.frame.model}`;

/** As the engine is told it. */
export function frameFactsOf(sheet: FrameSheetData): FrameFacts {
  return {
    ...sheet.facts,
    origin: 'sheet',
    id: sheet.frame.id,
    name: frameName(sheet),
    sheetVersion: sheet.version,
    entries: sheet.entries,
  };
}
