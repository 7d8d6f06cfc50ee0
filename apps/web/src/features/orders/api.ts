import { orderView, rebookOptions, type FindOrderBody, type RebookBody } from '@linkfell/contracts';
import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { callApi, callApiData } from '../../lib/api';

export const orderQuery = (reference: string) =>
  queryOptions({
    queryKey: ['order', reference],
    queryFn: ({ signal }) => callApiData(`/orders/${reference}`, { schema: orderView, signal }),
    staleTime: 0,
    // While the payment is open the webhook may settle it at any moment.
    refetchInterval: ({ state }) =>
      state.data?.state === 'held' || state.data?.state === 'refunding' ? 2000 : false,
  });

export const rebookQuery = (reference: string) =>
  queryOptions({
    queryKey: ['order', reference, 'workshops'],
    queryFn: ({ signal }) => callApiData(`/orders/${reference}/workshops`, { schema: rebookOptions, signal }),
    staleTime: 0,
  });

export const findOrder = (body: FindOrderBody) => callApi('/orders/find', { method: 'POST', body });

type Act = { path: 'cancel-payment' | 'self-fit' | 'refund' } | { path: 'workshop'; body: RebookBody };

/** Whatever the rider does with an order; the answer is the order as it then is. */
export function useOrderAction(reference: string) {
  const queries = useQueryClient();
  return useMutation({
    mutationFn: (act: Act) =>
      callApiData(`/orders/${reference}/${act.path}`, {
        method: 'POST',
        body: 'body' in act ? act.body : {},
        ...(act.path === 'workshop' ? { idempotencyKey: crypto.randomUUID() } : {}),
        schema: orderView,
      }),
    onSuccess: (view) => queries.setQueryData(orderQuery(reference).queryKey, view),
    onError: () => void queries.invalidateQueries({ queryKey: ['order', reference] }),
  });
}
