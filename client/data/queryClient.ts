import { MutationCache, QueryCache, QueryClient } from '@tanstack/react-query';

import { ApiError } from './ApiError.ts';
import { keys } from './keys.ts';

/**
 * One client a page load. Nothing is asked twice by itself: a refusal is shown, and the person decides. Where an answer says that
 * the session has ended, who is there is asked anew, which leads to sign-in.
 */
export function makeQueryClient(): QueryClient {
  const onRefusal = (error: Error): void => {
    if (!(error instanceof ApiError) || error.code !== 'no-session') return;
    void client.resetQueries({ queryKey: keys.session });
  };
  const client: QueryClient = new QueryClient({
    queryCache: new QueryCache({
      onError: (error, query) => {
        if (query.queryKey[0] !== keys.session[0]) onRefusal(error);
      },
    }),
    mutationCache: new MutationCache({ onError: onRefusal }),
    defaultOptions: {
      queries: { retry: false, refetchOnWindowFocus: false, staleTime: 5_000 },
      mutations: { retry: false },
    },
  });
  return client;
}
