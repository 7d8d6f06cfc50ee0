import type { FrameFacts, RiderFacts, SheetEntry } from '../facts.js';

type EntryFact = 'modelYear' | 'frameSize' | 'chip';
export type Applies = { state: 'yes' } | { state: 'no' } | { state: 'unsure'; missing: EntryFact[] };

/** Whether what the rider says of the bike rules an entry out; what is not told rules nothing out. */
function ruledOut({ modelYears, frameSizes, chip }: SheetEntry, rider: RiderFacts): boolean {
  const { modelYear } = rider;
  if (modelYears && modelYear !== null && !(modelYear >= modelYears.from && modelYear <= modelYears.to))
    return true;
  if (frameSizes && rider.frameSize !== null && !frameSizes.includes(rider.frameSize)) return true;
  return chip !== null && rider.chip !== null && chip !== rider.chip;
}

const figuresOf = (entry: SheetEntry): string =>
  JSON.stringify([
    entry.sizeKey,
    entry.frameEnd?.mount,
    entry.frameEnd?.yoke,
    entry.linkEnd?.mount,
    entry.linkEnd?.yoke,
    entry.travelMm,
    entry.curve,
  ]);

/**
 * Whether an entry speaks for the rider's bike. "no": another year, size or chip position than the rider's. "unsure":
 * the rider has not told something, and another entry that may speak for the bike as well says something else.
 *
 * Decisions: a sheet belongs to a model that the rider picked, so a year that is not told matters only where entries
 * differ by year. A chip can be turned, but a longer stroke in the wrong position lets the wheel touch the frame:
 * the position is asked for rather than chosen for the rider.
 */
export function entryApplies(frame: FrameFacts, rider: RiderFacts, entry: SheetEntry): Applies {
  if (ruledOut(entry, rider)) return { state: 'no' };
  const rivals = frame.entries.filter(
    (other) => other !== entry && !ruledOut(other, rider) && figuresOf(other) !== figuresOf(entry),
  );
  const differs = (read: (of: SheetEntry) => unknown): boolean =>
    rivals.some((rival) => JSON.stringify(read(rival)) !== JSON.stringify(read(entry)));
  const missing: EntryFact[] = [];
  if (rider.modelYear === null && differs((of) => of.modelYears)) missing.push('modelYear');
  if (rider.frameSize === null && differs((of) => of.frameSizes)) missing.push('frameSize');
  if (rider.chip === null && differs((of) => of.chip)) missing.push('chip');
  return missing.length > 0 ? { state: 'unsure', missing } : { state: 'yes' };
}
