import { QueryClient } from '@tanstack/react-query';

/** One client a page load. Nothing is asked twice by itself: a refusal is shown, and the person decides. */
export function makeQueryClient(): QueryClient {
  return new QueryClient({
    defaultOptions: {
      queries: { retry: false, refetchOnWindowFocus: false, staleTime: 5_000 },
      mutations: { retry: false },
    },
  });
}
