import { matchDetail, matchesView, planView, type MatchesQuery } from '@linkfell/contracts';
import { queryOptions } from '@tanstack/react-query';
import { callApiData } from '../../lib/api';

export type Sentence = Partial<MatchesQuery>;

export const matchesQueryOptions = (id: string, search: string) =>
  queryOptions({
    queryKey: ['matches', id, search],
    queryFn: ({ signal }) =>
      callApiData(`/measure-ups/${id}/matches${search}`, { schema: matchesView, signal }),
    placeholderData: (before) => before,
  });

export const matchDetailQuery = (id: string, sizeId: string) =>
  queryOptions({
    queryKey: ['matches', id, 'detail', sizeId],
    queryFn: ({ signal }) =>
      callApiData(`/measure-ups/${id}/matches/${sizeId}`, { schema: matchDetail, signal }),
  });

export const createPlan = (id: string, sizeId: string) =>
  callApiData(`/measure-ups/${id}/plans`, { method: 'POST', body: { sizeId }, schema: planView });
