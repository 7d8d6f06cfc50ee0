import { checkoutView, planView, type CheckoutBody, type PutChoicesBody } from '@linkfell/contracts';
import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { callApiData } from '../../lib/api';

export const planQuery = (id: string) =>
  queryOptions({
    queryKey: ['plan', id],
    queryFn: ({ signal }) => callApiData(`/plans/${id}`, { schema: planView, signal }),
    // Stock and slots move: what is shown must be of now.
    staleTime: 0,
    refetchOnWindowFocus: true,
  });

/**
 * Keeps a choice. It is seen at once, before the server has worked out what follows from it; several made quickly
 * are kept one after the other, each on what the one before has left.
 */
export function useChoices(id: string) {
  const queries = useQueryClient();
  const { queryKey } = planQuery(id);
  return useMutation({
    scope: { id: `plan-${id}` },
    mutationFn: (body: PutChoicesBody) =>
      callApiData(`/plans/${id}/choices`, {
        method: 'PUT',
        body,
        ifMatch: `"${queries.getQueryData(queryKey)?.revision ?? 0}"`,
        schema: planView,
      }),
    onMutate: async ({ listings, ...rest }) => {
      await queries.cancelQueries({ queryKey });
      queries.setQueryData(
        queryKey,
        (plan) =>
          plan && {
            ...plan,
            choices: { ...plan.choices, ...rest, listings: { ...plan.choices.listings, ...listings } },
          },
      );
    },
    onSuccess: (view) => queries.setQueryData(queryKey, view),
    // Another tab changed it, or it was refused: show what is kept now.
    onError: () => queries.invalidateQueries({ queryKey }),
  });
}

export const checkout = (id: string, body: CheckoutBody, idempotencyKey: string) =>
  callApiData(`/plans/${id}/checkout`, { method: 'POST', body, idempotencyKey, schema: checkoutView });
