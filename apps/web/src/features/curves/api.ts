import { curvesView } from '@linkfell/contracts';
import { queryOptions } from '@tanstack/react-query';
import { callApiData } from '../../lib/api';

export const curvesQueryOptions = (id: string, sizeId: string, present: string | null) =>
  queryOptions({
    queryKey: ['curves', id, sizeId, present],
    queryFn: ({ signal }) =>
      callApiData(
        `/measure-ups/${id}/matches/${sizeId}/curves${present ? `?${new URLSearchParams({ present }).toString()}` : ''}`,
        { schema: curvesView, signal },
      ),
    placeholderData: (before) => before,
  });
