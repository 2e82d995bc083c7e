import { QueryClientProvider } from '@tanstack/react-query';
import { render } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { createMemoryRouter, RouterProvider } from 'react-router-dom';
import { createQueryClient } from '../api/query-client.ts';
import { provideCache, routes } from '../router.tsx';

/** Opens a page as a browser would: `const { user, router } = renderRoute('/check')`. */
export function renderRoute(path: string) {
  const queryClient = createQueryClient();
  queryClient.setDefaultOptions({ queries: { retry: false, staleTime: 30_000 } });
  const router = createMemoryRouter(routes, {
    initialEntries: [path],
    getContext: () => provideCache(queryClient),
  });
  render(
    <QueryClientProvider client={queryClient}>
      <RouterProvider router={router} />
    </QueryClientProvider>,
  );
  return { user: userEvent.setup(), router, queryClient };
}
