import type { DrawnShock, SizeView } from '@linkfell/contracts';
import { resolveSize, sizeOf, tellSize, type SizeResult } from '@linkfell/fit-engine';

import type { FrameSheetData } from '../frames/sheet.js';
import type { RiderSide } from './facts-from-answers.js';

/** Which family of sizes the present shock's mounts belong to, as far as is known. */
export function mountFamily(side: RiderSide): 'eyelet' | 'trunnion' | null {
  const kinds = [side.present.bodyEndKind, side.present.shaftEndKind];
  if (kinds.includes('trunnion')) return 'trunnion';
  if (kinds[0] && kinds[1]) return 'eyelet';
  const ends = side.frame.entries.flatMap((entry) => [entry.frameEnd, entry.linkEnd]);
  if (ends.some((end) => end?.mount.kind === 'trunnion')) return 'trunnion';
  return ends.length > 0 && ends.every((end) => end !== null) ? 'eyelet' : null;
}

export function sizeResult(side: RiderSide, sheet: FrameSheetData | null): SizeResult {
  const published = sheet ? [...new Set(sheet.entries.map((entry) => entry.sizeKey))] : null;
  return resolveSize(side.present, published, mountFamily(side));
}

const questionOfReading = { eyeToEye: 'eye-to-eye', compressed: 'stroke', shaftTravel: 'stroke' } as const;

/** Whether the present shock is settled on a size that the sheet does not list. */
export const contradictsSheet = (size: SizeResult, sheet: FrameSheetData | null): boolean =>
  sheet !== null &&
  size.state === 'settled' &&
  !sheet.entries.some((entry) => entry.sizeKey === size.sizeKey);

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
