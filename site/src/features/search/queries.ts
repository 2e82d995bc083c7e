import { queryOptions } from '@tanstack/react-query';
import { answerOf, api } from '../../api/client.ts';
import { type Answer } from '../../api/views.ts';

export type FoundView = Answer<'Search_search'>;
export type Result = FoundView['results'][number];

/** What the server takes. */
export const longestQuery = 100;

export const searchQuery = (words: string) =>
  queryOptions({
    queryKey: ['search', words],
    queryFn: ({ signal }) =>
      answerOf(api.GET('/api/search', { params: { query: { q: words } }, signal })),
    enabled: words !== '',
  });

/** The page of all that was found. */
export const searchPath = (words: string) => `/search?q=${encodeURIComponent(words)}`;
