import type { FittingRecordBody } from '@linkfell/contracts';

import type { ParcelState } from '../orders/parcel.entity.js';
import type { BookingState } from './booking.entity.js';

/** What keeps a fitting from being marked done, in words; nothing unless it is agreed. */
export function missing(
  state: BookingState,
  parcels: readonly { state: ParcelState }[],
  record: FittingRecordBody | null,
): string[] {
  if (state !== 'accepted') return [];
  return [
    ...(parcels.every((parcel) => parcel.state === 'sent') ? [] : ['Not all parcels are sent yet.']),
    ...(record ? [] : ['The record of the fitting is not filled in.']),
    ...(record && !record.travelChecked ? ['Move the suspension through its whole travel and say so.'] : []),
    ...(record && !record.noticesChecked ? ['Check for recalls and say so.'] : []),
  ];
}
