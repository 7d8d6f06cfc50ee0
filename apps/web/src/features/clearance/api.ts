import { clearanceView } from '@linkfell/contracts';
import { queryOptions } from '@tanstack/react-query';
import { callApiData } from '../../lib/api';

export const clearanceQuery = (id: string, sizeId: string) =>
  queryOptions({
    queryKey: ['clearance', id, sizeId],
    queryFn: ({ signal }) =>
      callApiData(`/measure-ups/${id}/matches/${sizeId}/clearance`, { schema: clearanceView, signal }),
  });
