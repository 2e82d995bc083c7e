import { infiniteQueryOptions, queryOptions } from '@tanstack/react-query';
import { answerOf, api } from '../../api/client.ts';

export const peopleQuery = (find: string) =>
  infiniteQueryOptions({
    queryKey: ['people', 'list', find],
    queryFn: ({ pageParam, signal }) =>
      answerOf(
        api.GET('/api/people', {
          params: { query: { ...(find && { find }), ...(pageParam && { cursor: pageParam }) } },
          signal,
        }),
      ),
    initialPageParam: '',
    getNextPageParam: (page) => page.nextCursor,
  });

export const personQuery = (id: string) =>
  queryOptions({
    queryKey: ['people', 'one', id],
    queryFn: ({ signal }) =>
      answerOf(api.GET('/api/people/{id}', { params: { path: { id } }, signal })),
  });
