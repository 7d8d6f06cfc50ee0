import type { PresentShock, Reading } from '../facts.js';
import { logMeanExp, logNormal, sharesFromLogs } from './posterior.js';
import { readingUncertaintyMm } from './reading-uncertainty.js';
import { sizeOf, sizes, type Size } from './sizes.js';

export type ReadingName = 'eyeToEye' | 'compressed' | 'shaftTravel';

export interface SizeResult {
  state: 'settled' | 'measure-again' | 'no-such-size' | 'nothing-yet';
  sizeKey: string | null;
  /** Best first, shares with the usual limit on what keeps a shock from closing. */
  candidates: { sizeKey: string; share: number }[];
  measureNext: 'eye-to-eye' | 'stroke-shaft' | 'stroke-compressed' | null;
  /** Readings that no published size of the frame explains. */
  conflicts: { reading: ReadingName; mm: number; nearestPublished: string }[];
  /** Taken from the print, not from readings. */
  fromPrint: boolean;
}

/** What keeps the shock from closing fully lies between 0 and this, mm; a size must be settled with all three. */
const limitsMm = [2, 1, 3] as const;
const settledShare = 0.95;
const publishedShare = 0.9;

type Readings = Pick<PresentShock, ReadingName>;
const names: readonly ReadingName[] = ['eyeToEye', 'compressed', 'shaftTravel'];
const usable = (reading: Reading | null): reading is Reading =>
  reading !== null && Number.isFinite(reading.mm) && reading.mm > 0;

/** How far a reading lies from what a size allows, mm, at the kindest B within its limit. */
function missMm(name: ReadingName, mm: number, size: Size): number {
  if (name === 'eyeToEye') return Math.abs(mm - size.eyeToEyeMm);
  const bump = name === 'compressed' ? mm - (size.eyeToEyeMm - size.strokeMm) : size.strokeMm - mm;
  return Math.max(0, -bump, bump - limitsMm[0]);
}

function logLikelihood(readings: Readings, size: Size, limit: number): number {
  const { eyeToEye, compressed, shaftTravel } = readings;
  const open = usable(eyeToEye)
    ? logNormal(eyeToEye.mm - size.eyeToEyeMm, readingUncertaintyMm(eyeToEye))
    : 0;
  if (!usable(compressed) && !usable(shaftTravel)) return open;
  const closed = (bump: number): number =>
    (usable(compressed)
      ? logNormal(compressed.mm - (size.eyeToEyeMm - size.strokeMm + bump), readingUncertaintyMm(compressed))
      : 0) +
    (usable(shaftTravel)
      ? logNormal(shaftTravel.mm - (size.strokeMm - bump), readingUncertaintyMm(shaftTravel))
      : 0);
  return open + logMeanExp(closed, 0, limit);
}

function logPriors(candidates: readonly Size[], published: readonly string[] | null): number[] {
  const listed = candidates.filter((size) => published?.includes(size.key)).length;
  const others = candidates.length - listed;
  return candidates.map((size) => {
    if (listed === 0) return -Math.log(candidates.length);
    if (published?.includes(size.key)) return Math.log((others === 0 ? 1 : publishedShare) / listed);
    return Math.log((1 - publishedShare) / others);
  });
}

/**
 * Which nominal size the present shock has.
 * Model: E = e + n1, C = e - s + B + n2, T = s - B + n3, with B uniform from 0 to 2 mm and integrated out.
 * @param published size keys of the frame's sheet; they share 0.9 of the prior
 * @param family mounts that are known; null: all sizes
 */
export function resolveSize(
  present: PresentShock,
  published: readonly string[] | null,
  family: 'eyelet' | 'trunnion' | null,
): SizeResult {
  const readings: Readings = present;
  const given = names.filter((name) => usable(readings[name]));
  const conflicts = conflictsWith(readings, given, published);
  const printed = present.printedSizeKey === null ? null : sizeOf(present.printedSizeKey);
  if (printed) return fromPrint(printed, readings, given, conflicts);
  const none: SizeResult = {
    state: 'nothing-yet',
    sizeKey: null,
    candidates: [],
    measureNext: 'eye-to-eye',
    conflicts,
    fromPrint: false,
  };
  if (given.length === 0) return none;

  // Inch sizes were made with either mount; the trunnion tables are their own.
  const candidates = sizes.filter(
    (size) => !family || size.family === family || (family === 'eyelet' && size.family === 'inch'),
  );
  const priors = logPriors(candidates, published);
  const sharesBy = limitsMm.map((limit) =>
    sharesFromLogs(candidates.map((size, i) => (priors[i] ?? 0) + logLikelihood(readings, size, limit))),
  );
  const ranked = candidates
    .map((size, i) => ({
      size,
      share: sharesBy[0]?.[i] ?? 0,
      least: Math.min(...sharesBy.map((s) => s[i] ?? 0)),
    }))
    .sort((a, b) => b.share - a.share || (a.size.key < b.size.key ? -1 : 1));
  const best = ranked[0];
  if (!best) return none;
  const shown = ranked
    .filter(({ share }) => share >= 0.005)
    .slice(0, 6)
    .map(({ size, share }) => ({ sizeKey: size.key, share }));
  const missed = given.some((name) => {
    const reading = readings[name];
    return reading && missMm(name, reading.mm, best.size) > 4 * readingUncertaintyMm(reading);
  });
  if (missed) return { ...none, state: 'no-such-size', candidates: shown, measureNext: again(given) };
  if (best.least >= settledShare) {
    return { ...none, state: 'settled', sizeKey: best.size.key, candidates: shown, measureNext: null };
  }
  return {
    ...none,
    state: 'measure-again',
    candidates: shown,
    measureNext: separates(best.size, ranked[1]?.size ?? best.size, readings),
  };
}

/** Data printed on the shock come first, unless a reading rules them out: then nothing is settled. */
function fromPrint(
  printed: Size,
  readings: Readings,
  given: readonly ReadingName[],
  conflicts: SizeResult['conflicts'],
): SizeResult {
  const against = given.find((name) => {
    const reading = readings[name];
    return reading && missMm(name, reading.mm, printed) > 4 * readingUncertaintyMm(reading);
  });
  return {
    state: against ? 'measure-again' : 'settled',
    sizeKey: against ? null : printed.key,
    candidates: [{ sizeKey: printed.key, share: against ? 0.5 : 1 }],
    measureNext: against ? (against === 'eyeToEye' ? 'eye-to-eye' : 'stroke-compressed') : null,
    conflicts,
    fromPrint: true,
  };
}

const again = (given: readonly ReadingName[]): SizeResult['measureNext'] =>
  given.includes('eyeToEye') ? 'eye-to-eye' : 'stroke-compressed';

/** The reading that would part the two leading sizes best. */
function separates(a: Size, b: Size, readings: Readings): SizeResult['measureNext'] {
  if (!usable(readings.eyeToEye)) return 'eye-to-eye';
  const apart = Math.abs(a.eyeToEyeMm - b.eyeToEyeMm);
  const strokeApart = Math.abs(a.strokeMm - b.strokeMm);
  const noStroke = !usable(readings.compressed) && !usable(readings.shaftTravel);
  if (apart > strokeApart && !noStroke) return 'eye-to-eye';
  // Extended less compressed says more than an O-ring, which may never have been pushed to the end.
  return 'stroke-compressed';
}

function conflictsWith(
  readings: Readings,
  given: readonly ReadingName[],
  published: readonly string[] | null,
): SizeResult['conflicts'] {
  const listed = (published ?? []).map(sizeOf).filter((size) => size !== null);
  if (listed.length === 0) return [];
  return given.flatMap((name) => {
    const reading = readings[name];
    if (!reading) return [];
    const nearest = [...listed].sort((a, b) => missMm(name, reading.mm, a) - missMm(name, reading.mm, b))[0];
    if (!nearest || missMm(name, reading.mm, nearest) <= 3 * readingUncertaintyMm(reading)) return [];
    return [{ reading: name, mm: reading.mm, nearestPublished: nearest.key }];
  });
}
