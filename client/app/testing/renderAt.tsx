import { QueryClientProvider } from '@tanstack/react-query';
import { render } from '@testing-library/react';
import { createMemoryRouter, RouterProvider } from 'react-router-dom';

import { makeQueryClient } from '../../data/queryClient.ts';
import { routeObjects } from '../router.tsx';

/** The whole application at one address, as a person opens it. */
export function renderAt(address: string) {
  const router = createMemoryRouter(routeObjects, { initialEntries: [address] });
  const view = render(
    <QueryClientProvider client={makeQueryClient()}>
      <RouterProvider router={router} />
    </QueryClientProvider>,
  );
  return { ...view, router };
}
