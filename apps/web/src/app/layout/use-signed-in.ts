import { notifyManager, queryOptions, useQuery, useQueryClient } from '@tanstack/react-query';
import { useSyncExternalStore } from 'react';
import { callApiData } from '../../lib/api';

/** Reads only whether there is an account: the whole schema would bring zod to pages that need none. */
const hasAccount = {
  parse: (body: unknown): boolean =>
    typeof body === 'object' && body !== null && 'account' in body && body.account !== null,
};

const signedInQuery = queryOptions({
  queryKey: ['me', 'signed-in'],
  queryFn: ({ signal }) => callApiData('/auth/me', { schema: hasAccount, signal }),
  // Whoever is not told stays a guest to the header; nothing is lost by that.
  retry: false,
  staleTime: 300_000,
});

/** What a page has learnt of the account, watched without asking for it. */
function useKnownAccount(): { account: unknown } | undefined {
  const queries = useQueryClient();
  return useSyncExternalStore(
    (changed) => queries.getQueryCache().subscribe(notifyManager.batchCalls(changed)),
    () => queries.getQueryData<{ account: unknown }>(['me']),
    () => undefined,
  );
}

/** Whether somebody is signed in, false until it is known. What a page has learnt counts first. */
export function useSignedIn(): boolean {
  const known = useKnownAccount();
  const asked = useQuery({ ...signedInQuery, enabled: known === undefined }).data;
  return known ? known.account !== null : (asked ?? false);
}
