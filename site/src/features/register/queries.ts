import { queryOptions } from '@tanstack/react-query';
import { answerOf, api } from '../../api/client.ts';

export const linkQuery = (code: string) =>
  queryOptions({
    queryKey: ['register', 'link', code],
    queryFn: ({ signal }) =>
      answerOf(api.GET('/api/register/links/{code}', { params: { path: { code } }, signal })),
    // A check is worth what it is worth now: it is never answered from memory.
    staleTime: 0,
    gcTime: 0,
  });

export const issuersQuery = queryOptions({
  queryKey: ['register', 'issuers'],
  queryFn: ({ signal }) => answerOf(api.GET('/api/register/issuers', { signal })),
});
