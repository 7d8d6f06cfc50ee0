import { workshopList, workshopPage } from '@linkfell/contracts';
import { queryOptions } from '@tanstack/react-query';
import { callApiData } from '../../lib/api';

export const workshopsQuery = (from: string) =>
  queryOptions({
    queryKey: ['workshops', 'list', from],
    queryFn: ({ signal }) =>
      callApiData(`/workshops${from ? `?from=${encodeURIComponent(from)}` : ''}`, {
        schema: workshopList,
        signal,
      }),
    placeholderData: (before) => before,
  });

export const workshopQuery = (id: string) =>
  queryOptions({
    queryKey: ['workshops', 'page', id],
    queryFn: ({ signal }) =>
      callApiData(`/workshops/${encodeURIComponent(id)}`, { schema: workshopPage, signal }),
  });
