import type { FrameSheetView, SourceView } from '@linkfell/contracts';
import type { Fact } from '@linkfell/fit-engine';

import { frameEndWords } from './mount-words.js';
import type { FrameSheetData } from './sheet.js';

type Figure = FrameSheetView['figures'][number];

const notStated = 'not stated';

function figure<T>(label: string, fact: Fact<T>, words: (value: T) => string): Figure {
  return fact
    ? { label, text: words(fact.value), source: fact.source satisfies SourceView }
    : { label, text: notStated, source: null };
}

const basisWords = {
  rider: 'rider alone',
  'rider-and-kit': 'rider with kit',
  'with-bike': 'rider, kit and bike',
} as const;

/** The measure-up questions that a sheet leaves to the rider. */
export function leavesOpen(sheet: FrameSheetData): string[] {
  const { facts } = sheet;
  const open: string[] = [];
  if (!facts.tunnelWidthMm && !facts.room) open.push('tunnel-width');
  if (!facts.reservoirStatement && !facts.room) open.push('reservoir-room');
  if (!facts.cableRouting) open.push('cable-routing');
  if (!facts.eBike) open.push('e-bike');
  return open;
}

/** A frame sheet for people: every figure with its source and date. */
export function sheetView(sheet: FrameSheetData): FrameSheetView {
  const { facts, frame } = sheet;
  return {
    frame: {
      ...frame,
      travelMm: sheet.entries.flatMap((entry) => entry.travelMm ?? []),
      sizes: sheet.entries.map((entry) => entry.sizeKey),
    },
    version: sheet.version,
    publishedAt: new Date(sheet.publishedAt).toISOString(),
    entries: sheet.entries.map((entry) => ({
      id: entry.id,
      sizeKey: entry.sizeKey,
      travelMm: entry.travelMm,
      yearFrom: entry.modelYears?.from ?? null,
      yearTo: entry.modelYears?.to ?? null,
      frameSizes: entry.frameSizes ? [...entry.frameSizes] : null,
      chip: entry.chip,
      frameEnd: frameEndWords(entry.frameEnd),
      linkEnd: frameEndWords(entry.linkEnd),
      source: entry.source,
    })),
    figures: [
      figure(
        'Spring',
        facts.springStatement,
        (value) =>
          ({ 'air-and-coil': 'air and coil', 'air-only': 'air only', 'coil-only': 'coil only' })[value],
      ),
      figure('Coil on this yoke', facts.coilOnYoke, (value) => value),
      figure('Tunnel width', facts.tunnelWidthMm, (value) => `${value} mm`),
      figure('Reservoir', facts.reservoirStatement, (value) =>
        value === 'fits' ? 'has room' : 'inline shocks only',
      ),
      figure('Cable routing', facts.cableRouting, (value) => value),
      figure('E-bike', facts.eBike, (value) => (value ? 'yes' : 'no')),
      figure(
        'Weight limit',
        facts.riderLimit,
        ({ kg, basis }) => `${kg} kg, ${basis ? basisWords[basis] : 'basis not printed'}`,
      ),
      figure('Way round', facts.wayRound, (value) =>
        value === 'body-to-frame' ? 'body at the frame' : 'body at the link',
      ),
      figure('Printed sag', facts.sagTargetPercent, (value) => `${value} %`),
    ],
    leavesOpen: leavesOpen(sheet),
  };
}
