import type { DrawnShock, SizeView } from '@linkfell/contracts';
import { presentSize, sizeOf, tellSize, type SizeResult } from '@linkfell/fit-engine';

import type { FrameSheetData } from '../frames/sheet.js';
import type { RiderSide } from './facts-from-answers.js';

/** What the engine makes of the present shock, the same as it judges by. */
export const sizeResult = ({ frame, present }: RiderSide): SizeResult => presentSize(frame, present);

const questionOfReading = { eyeToEye: 'eye-to-eye', compressed: 'stroke', shaftTravel: 'stroke' } as const;

/** What the resolver makes of the readings so far, in words and figures. */
export function sizeView(
  size: SizeResult,
  sheet: FrameSheetData | null,
  family: SizeView['family'],
): SizeView {
  const listed = sheet?.entries.map((entry) => entry.sizeKey).join(' and ');
  return {
    state: size.state,
    sizeKey: size.sizeKey,
    sureness: size.candidates[0]?.share ?? null,
    candidates: size.candidates.slice(0, 4),
    measureNext: size.measureNext,
    say: tellSize(size),
    conflicts: size.conflicts.map(({ reading, mm, nearestPublished }) => ({
      question: questionOfReading[reading],
      say: `The frame’s maker lists ${listed ?? nearestPublished}; you read ${mm} mm.`,
    })),
    family,
  };
}

/** The present shock as far as it is known, or null while its length is not. */
export function presentDrawing(side: RiderSide, size: SizeResult): DrawnShock | null {
  const { present } = side;
  const key = size.state === 'settled' ? size.sizeKey : present.printedSizeKey;
  const nominal = key ? sizeOf(key) : null;
  const eyeToEyeMm = present.eyeToEye?.mm ?? nominal?.eyeToEyeMm;
  if (!eyeToEyeMm) return null;
  const measured =
    present.shaftTravel?.mm ?? (present.compressed ? eyeToEyeMm - present.compressed.mm : undefined);
  const end = (kind: typeof present.bodyEndKind): DrawnShock['bodyEnd'] => {
    if (kind === 'trunnion') return { kind };
    if (kind === 'bearing-eye') return { kind, boltMm: 8, widthMm: 30 };
    return { kind: 'eyelet', boreMm: 15 };
  };
  return {
    eyeToEyeMm,
    strokeMm: nominal?.strokeMm ?? measured ?? null,
    bodyEnd: end(present.bodyEndKind),
    shaftEnd: end(present.shaftEndKind),
    spring: present.spring ?? 'air',
    diameterMm: present.diameterMm,
    reservoir: null,
    remote: present.remoteAction !== null && present.remoteAction !== 'none',
  };
}
