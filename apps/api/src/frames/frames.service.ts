import type { FrameList, FrameSheetView, FrameSummary, TownList } from '@linkfell/contracts';
import { Injectable } from '@nestjs/common';
import { DataSource } from 'typeorm';

import { CommonException } from '../common/problems/problem.exception.js';
import { Town } from '../organisations/town.entity.js';
import type { FrameSheetData } from './sheet.js';
import { sheetView } from './sheet-view.js';

interface SummaryRow {
  id: string;
  maker_id: string;
  maker_name: string;
  model: string;
  year_from: number;
  year_to: number;
  travels: (number | null)[];
  sizes: string[];
}

/** The newest sheet of each frame. */
const newest = `(SELECT DISTINCT ON (frame_id) * FROM frame_sheets ORDER BY frame_id, version DESC)`;

/** Frames change seldom and are asked for with every answer: a sheet is kept this long. */
const keepForMs = 2000;

@Injectable()
export class FramesService {
  private readonly kept = new Map<string, { at: number; sheet: FrameSheetData | null }>();

  constructor(private readonly dataSource: DataSource) {}

  /** Frames whose maker, model or year match every word asked for. */
  async find({ q = '', maker }: { q?: string; maker?: string }): Promise<FrameList> {
    const words = q.toLowerCase().split(/\s+/).filter(Boolean).slice(0, 8);
    const rows: SummaryRow[] = await this.dataSource.query(
      `SELECT f.id, f.maker_id, m.name AS maker_name, f.model, f.year_from, f.year_to,
              array_agg(e.travel_mm ORDER BY e.position) AS travels, array_agg(e.size_key ORDER BY e.position) AS sizes
         FROM frames f JOIN makers m ON m.id = f.maker_id
         JOIN ${newest} s ON s.frame_id = f.id
         JOIN frame_sheet_entries e ON e.sheet_id = s.id
        WHERE ($1::text IS NULL OR f.maker_id = $1)
        GROUP BY f.id, m.name ORDER BY m.name, f.model`,
      [maker ?? null],
    );
    const all = rows.map(toSummary);
    const found = all.filter((frame) => words.every((word) => matches(frame, word)));
    const makers = new Map<string, { id: string; name: string; frames: number }>();
    for (const frame of all) {
      const known = makers.get(frame.makerId) ?? { id: frame.makerId, name: frame.makerName, frames: 0 };
      makers.set(frame.makerId, { ...known, frames: known.frames + 1 });
    }
    return { makers: [...makers.values()], frames: found.slice(0, 50) };
  }

  async view(frameId: string): Promise<FrameSheetView> {
    const sheet = await this.sheet(frameId);
    if (!sheet) throw new CommonException('not-found');
    return sheetView(sheet);
  }

  /** The sheet in force, or null. */
  async sheet(frameId: string): Promise<FrameSheetData | null> {
    const kept = this.kept.get(frameId);
    if (kept && performance.now() - kept.at < keepForMs) return kept.sheet;
    const sheet = await this.read(frameId);
    if (this.kept.size > 5000) this.kept.clear();
    this.kept.set(frameId, { at: performance.now(), sheet });
    return sheet;
  }

  private async read(frameId: string): Promise<FrameSheetData | null> {
    const rows: {
      frame: FrameSheetData['frame'];
      version: number;
      published_at: Date;
      facts: FrameSheetData['facts'];
      entries: FrameSheetData['entries'];
    }[] = await this.dataSource.query(
      `SELECT json_build_object('id', f.id, 'makerId', m.id, 'makerName', m.name, 'model', f.model,
                'yearFrom', f.year_from, 'yearTo', f.year_to) AS frame,
              s.version, s.published_at, s.facts,
              (SELECT json_agg(e.facts ORDER BY e.position) FROM frame_sheet_entries e WHERE e.sheet_id = s.id) AS entries
         FROM frames f JOIN makers m ON m.id = f.maker_id JOIN frame_sheets s ON s.frame_id = f.id
        WHERE f.id = $1 ORDER BY s.version DESC LIMIT 1`,
      [frameId],
    );
    const row = rows[0];
    return row
      ? {
          frame: row.frame,
          version: row.version,
          publishedAt: row.published_at,
          facts: row.facts,
          entries: row.entries,
        }
      : null;
  }

  async towns(): Promise<TownList> {
    const towns = await this.dataSource.manager.find(Town, { order: { name: 'ASC' } });
    return { towns };
  }
}

const toSummary = (row: SummaryRow): FrameSummary => ({
  id: row.id,
  makerId: row.maker_id,
  makerName: row.maker_name,
  model: row.model,
  yearFrom: row.year_from,
  yearTo: row.year_to,
  travelMm: row.travels.filter((travel) => travel !== null),
  sizes: row.sizes,
});

function matches(frame: FrameSummary, word: string): boolean {
  const year = /^(19|20)\d\d$/.test(word) ? Number(word) : null;
  if (year !== null && frame.yearFrom <= year && year <= frame.yearTo) return true;
  return `${frame.makerName} ${frame.model}`.toLowerCase().includes(word);
}
