import { QueryClient } from '@tanstack/react-query';
import { createContext } from 'react-router-dom';
import { ProblemError } from './problem.ts';

/** Refusals are answers: only silence and faults on the server's side are asked again. */
function isWorthAskingAgain(failures: number, error: Error): boolean {
  if (failures >= 2) return false;
  if (!(error instanceof ProblemError)) return false;
  return error.problem.status === 0 || error.problem.status >= 500;
}

export function createQueryClient(): QueryClient {
  return new QueryClient({
    defaultOptions: {
      queries: { staleTime: 30_000, retry: isWorthAskingAgain, refetchOnWindowFocus: false },
      mutations: { retry: false },
    },
  });
}

/** Where loaders find the cache: `context.get(queryClientContext)`. */
export const queryClientContext = createContext<QueryClient>();
