import {
  bookingList,
  jobSheetView,
  parcelList,
  parcelRow,
  stockList,
  stockRow,
  type FittingRecordBody,
  type PatchStockBody,
} from '@linkfell/contracts';
import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { callApiData } from '../../lib/api';

const at = (orgId: string): string => `/organisations/${orgId}`;

export const stockQuery = (orgId: string) =>
  queryOptions({
    queryKey: ['stock', orgId],
    queryFn: ({ signal }) => callApiData(`${at(orgId)}/stock`, { schema: stockList, signal }),
  });

export const patchStock = (orgId: string, listingId: string, version: number, body: PatchStockBody) =>
  callApiData(`${at(orgId)}/stock/${listingId}`, {
    method: 'PATCH',
    body,
    ifMatch: `"${version}"`,
    schema: stockRow,
  });

export const parcelsQuery = (orgId: string) =>
  queryOptions({
    queryKey: ['parcels', orgId],
    queryFn: ({ signal }) => callApiData(`${at(orgId)}/parcels`, { schema: parcelList, signal }),
    staleTime: 0,
  });

export const markSent = (orgId: string, parcelId: string, tracking: string) =>
  callApiData(`${at(orgId)}/parcels/${parcelId}/sent`, {
    method: 'POST',
    body: { tracking },
    schema: parcelRow,
  });

export const bookingsQuery = (orgId: string) =>
  queryOptions({
    queryKey: ['bookings', orgId],
    queryFn: ({ signal }) => callApiData(`${at(orgId)}/bookings`, { schema: bookingList, signal }),
    staleTime: 0,
  });

export const jobSheetQuery = (orgId: string, bookingId: string) =>
  queryOptions({
    queryKey: ['bookings', orgId, bookingId],
    queryFn: ({ signal }) =>
      callApiData(`${at(orgId)}/bookings/${bookingId}`, { schema: jobSheetView, signal }),
    staleTime: 0,
  });

type JobAct =
  | { path: 'accept' | 'fitted' }
  | { path: 'decline'; reason: string }
  | { path: 'record'; version: number; record: FittingRecordBody };

/** Whatever a workshop does with a booking; the answer is the job sheet as it then is. */
export function useJob(orgId: string, bookingId: string) {
  const queries = useQueryClient();
  return useMutation({
    mutationFn: (act: JobAct) => {
      const path = `${at(orgId)}/bookings/${bookingId}/${act.path}`;
      if (act.path === 'record') {
        return callApiData(path, {
          method: 'PUT',
          body: act.record,
          ifMatch: `"${act.version}"`,
          schema: jobSheetView,
        });
      }
      return callApiData(path, {
        method: 'POST',
        body: act.path === 'decline' ? { reason: act.reason } : {},
        schema: jobSheetView,
      });
    },
    onSuccess: (sheet) => {
      queries.setQueryData(jobSheetQuery(orgId, bookingId).queryKey, sheet);
      void queries.invalidateQueries({ queryKey: bookingsQuery(orgId).queryKey, exact: true });
    },
  });
}
