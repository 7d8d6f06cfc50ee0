import { QueryClient } from '@tanstack/react-query';
import { isApiProblem } from './api-problem';

/** Asks again only where asking again can help: no connection, or the server's own trouble. */
const worthAnotherTry = (failures: number, error: Error): boolean =>
  failures < 2 && isApiProblem(error) && (error.status === 0 || error.status >= 502);

export const makeQueryClient = (): QueryClient =>
  new QueryClient({
    defaultOptions: {
      queries: { staleTime: 30_000, retry: worthAnotherTry, refetchOnWindowFocus: false },
      mutations: { retry: false },
    },
  });
