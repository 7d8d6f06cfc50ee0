import type { FrameFacts, RiderFacts } from '../facts.js';
import type { SizeResult } from '../sizing/resolve-size.js';
import { sizeOf } from '../sizing/sizes.js';
import { entryApplies } from './entry-applies.js';

/** The keys of the sizes that the sheet lists for this bike (year, size, chip position); for any where none is for it. */
export function listedFor(frame: FrameFacts, rider: RiderFacts): (string | null)[] {
  const speaking = frame.entries.filter((entry) => entryApplies(frame, rider, entry).state !== 'no');
  return (speaking.length > 0 ? speaking : frame.entries).map(({ sizeKey }) =>
    sizeKey === null ? null : (sizeOf(sizeKey)?.key ?? sizeKey),
  );
}

/**
 * Whether the present shock is settled on a size that the maker does not list for this bike. Then every match needs
 * an answer first, until the rider says which of the two is right: who asks the rider asks here.
 */
export const contradictsSheet = (frame: FrameFacts, rider: RiderFacts, size: SizeResult): boolean =>
  frame.origin !== 'described' && size.state === 'settled' && !listedFor(frame, rider).includes(size.sizeKey);
