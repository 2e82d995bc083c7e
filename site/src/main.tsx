import './theme/theme.css';
import { QueryClientProvider } from '@tanstack/react-query';
import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { RouterProvider } from 'react-router-dom';
import { whenSignedOut } from './api/client.ts';
import { createQueryClient } from './api/query-client.ts';
import { changeSession, sessionQuery } from './api/session.ts';
import { createRouter } from './router.tsx';

const queryClient = createQueryClient();
// Asked for while the first page's code is still on its way.
void queryClient.prefetchQuery(sessionQuery);
const router = createRouter(queryClient);

whenSignedOut(() => {
  const wasSignedIn = queryClient.getQueryData(sessionQuery.queryKey);
  queryClient.setQueryData(sessionQuery.queryKey, null);
  if (!wasSignedIn) return;
  const { pathname, search } = router.state.location;
  void router
    .navigate(`/sign-in?next=${encodeURIComponent(pathname + search)}`)
    .then(() => changeSession(queryClient, null));
});

const place = document.getElementById('root');
if (!place) throw new Error('index.html has no element with the id "root".');
createRoot(place).render(
  <StrictMode>
    <QueryClientProvider client={queryClient}>
      <RouterProvider router={router} />
    </QueryClientProvider>
  </StrictMode>,
);
