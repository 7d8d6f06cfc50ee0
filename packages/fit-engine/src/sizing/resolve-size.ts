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
/** Standard uncertainties beyond which no size explains a reading, and beyond which it conflicts with a published one. */
const noSuchSizeAt = 4;
const conflictAt = 3;

type Readings = Pick<PresentShock, ReadingName>;
const names: readonly ReadingName[] = ['eyeToEye', 'compressed', 'shaftTravel'];
const usable = (reading: Reading | null): reading is Reading =>
  reading !== null && Number.isFinite(reading.mm) && reading.mm > 0;

/** How far a reading lies from what a size allows, mm, at the kindest B within its limit. */
function missMm(name: ReadingName, mm: number, size: Size): number {
  if (name === 'eyeToEye') return Math.abs(mm - size.eyeToEyeMm);
  const bump = bumpOf(name, mm, size);
  return Math.max(0, -bump, bump - limitsMm[0]);
}

/** The B that a closed reading alone would mean for a size, mm. */
const bumpOf = (name: 'compressed' | 'shaftTravel', mm: number, size: Size): number =>
  name === 'compressed' ? mm - (size.eyeToEyeMm - size.strokeMm) : size.strokeMm - mm;

/** Whether some reading lies more than so many uncertainties from a size, at the one B that suits both closed readings best. */
function ruledOut(readings: Readings, size: Size, uncertainties: number): boolean {
  const far = (miss: number, reading: Reading): boolean =>
    Math.abs(miss) > uncertainties * readingUncertaintyMm(reading) + 1e-9;
  const { eyeToEye } = readings;
  if (usable(eyeToEye) && far(eyeToEye.mm - size.eyeToEyeMm, eyeToEye)) return true;
  const closed = (['compressed', 'shaftTravel'] as const).flatMap((name) => {
    const reading = readings[name];
    if (!usable(reading)) return [];
    return [{ reading, bump: bumpOf(name, reading.mm, size), weight: readingUncertaintyMm(reading) ** -2 }];
  });
  if (closed.length === 0) return false;
  const sum = closed.reduce((total, { weight }) => total + weight, 0);
  const mean = closed.reduce((total, { bump, weight }) => total + bump * weight, 0) / sum;
  const best = Math.min(Math.max(mean, 0), limitsMm[0]);
  return closed.some(({ reading, bump }) => far(bump - best, reading));
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

function logPriors(candidates: readonly Size[], published: ReadonlySet<string>): number[] {
  const listed = candidates.filter((size) => published.has(size.key)).length;
  const others = candidates.length - listed;
  return candidates.map((size) => {
    if (listed === 0) return -Math.log(candidates.length);
    if (published.has(size.key)) return Math.log((others === 0 ? 1 : publishedShare) / listed);
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
  const listed = (published ?? []).map(sizeOf).filter((size) => size !== null);
  const conflicts = conflictsWith(readings, given, listed);
  const printed = present.printedSizeKey === null ? null : sizeOf(present.printedSizeKey);
  const candidates = sizes.filter((size) => ofFamily(size, family));
  if (printed) return fromPrint(printed, candidates.includes(printed), readings, given, conflicts);
  const none: SizeResult = {
    state: 'nothing-yet',
    sizeKey: null,
    candidates: [],
    measureNext: 'eye-to-eye',
    conflicts,
    fromPrint: false,
  };
  if (given.length === 0) return none;

  const priors = logPriors(candidates, new Set(listed.map(({ key }) => key)));
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
  if (ruledOut(readings, best.size, noSuchSizeAt)) {
    return { ...none, state: 'no-such-size', candidates: shown, measureNext: again(given) };
  }
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

/** Sizes from inches are eyelet shocks; the trunnion tables are their own. */
const ofFamily = (size: Size, family: 'eyelet' | 'trunnion' | null): boolean =>
  !family || size.family === family || (family === 'eyelet' && size.family === 'inch');

/**
 * Data printed on the shock come first. A reading more than 3 u away, or mounts that the size never has, speak
 * against the print: then nothing is settled, since a wrong label would pass for the maker's word.
 */
function fromPrint(
  printed: Size,
  mountsAgree: boolean,
  readings: Readings,
  given: readonly ReadingName[],
  conflicts: SizeResult['conflicts'],
): SizeResult {
  const against = !mountsAgree || ruledOut(readings, printed, conflictAt);
  const alone = given.find((name) => {
    const reading = readings[name];
    return reading && missMm(name, reading.mm, printed) > conflictAt * readingUncertaintyMm(reading);
  });
  return {
    state: against ? 'measure-again' : 'settled',
    sizeKey: against ? null : printed.key,
    candidates: [{ sizeKey: printed.key, share: against ? 0.5 : 1 }],
    measureNext: !against ? null : alone === 'eyeToEye' || !alone ? 'eye-to-eye' : 'stroke-compressed',
    conflicts,
    fromPrint: true,
  };
}

const again = (given: readonly ReadingName[]): SizeResult['measureNext'] =>
  given.includes('eyeToEye') ? 'eye-to-eye' : 'stroke-compressed';

/**
 * The reading that would part the two leading sizes best: the difference it would show over the uncertainty of a
 * caliper reading; B (standard deviation of a uniform 0 to 2 mm) blurs the closed ones. A second reading by the same
 * careful means adds half as much. Extended less compressed goes before an O-ring, which shows only the used stroke.
 */
function separates(a: Size, b: Size, readings: Readings): SizeResult['measureNext'] {
  const caliper = readingUncertaintyMm({ mm: 0, tool: 'caliper', awkward: false });
  const blurred = Math.hypot(caliper, limitsMm[0] / Math.sqrt(12));
  const fresh = (name: ReadingName): number => {
    const reading = readings[name];
    return usable(reading) && readingUncertaintyMm(reading) <= caliper ? 0.5 : 1;
  };
  const closedApart = Math.abs(a.eyeToEyeMm - a.strokeMm - b.eyeToEyeMm + b.strokeMm);
  const ways = [
    ['eye-to-eye', (fresh('eyeToEye') * Math.abs(a.eyeToEyeMm - b.eyeToEyeMm)) / caliper],
    ['stroke-compressed', (fresh('compressed') * closedApart) / blurred],
    ['stroke-shaft', (fresh('shaftTravel') * Math.abs(a.strokeMm - b.strokeMm)) / blurred],
  ] as const;
  return ways.reduce((best, way) => (way[1] > best[1] + 1e-9 ? way : best))[0];
}

function conflictsWith(
  readings: Readings,
  given: readonly ReadingName[],
  listed: readonly Size[],
): SizeResult['conflicts'] {
  if (listed.length === 0) return [];
  return given.flatMap((name) => {
    const reading = readings[name];
    if (!reading) return [];
    const nearest = listed.reduce((best, size) =>
      missMm(name, reading.mm, size) < missMm(name, reading.mm, best) ? size : best,
    );
    if (missMm(name, reading.mm, nearest) <= conflictAt * readingUncertaintyMm(reading)) return [];
    return [{ reading: name, mm: reading.mm, nearestPublished: nearest.key }];
  });
}
