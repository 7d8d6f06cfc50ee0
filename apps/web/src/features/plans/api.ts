import { checkoutView, planView, type CheckoutBody, type PutChoicesBody } from '@linkfell/contracts';
import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { callApiData } from '../../lib/api';
import { isApiProblem } from '../../lib/api-problem';

export const planQuery = (id: string) =>
  queryOptions({
    queryKey: ['plan', id],
    queryFn: ({ signal }) => callApiData(`/plans/${id}`, { schema: planView, signal }),
    // Stock and slots move: what is shown must be of now.
    staleTime: 0,
    refetchOnWindowFocus: true,
  });

export function useChoices(id: string, revision: number) {
  const queries = useQueryClient();
  return useMutation({
    mutationFn: (body: PutChoicesBody) =>
      callApiData(`/plans/${id}/choices`, {
        method: 'PUT',
        body,
        ifMatch: `"${revision}"`,
        schema: planView,
      }),
    onSuccess: (view) => queries.setQueryData(planQuery(id).queryKey, view),
    onError: (error) => {
      // Another tab changed it: show what is there now.
      if (isApiProblem(error) && error.status === 412)
        void queries.invalidateQueries({ queryKey: ['plan', id] });
    },
  });
}

export const checkout = (id: string, body: CheckoutBody, idempotencyKey: string) =>
  callApiData(`/plans/${id}/checkout`, { method: 'POST', body, idempotencyKey, schema: checkoutView });
