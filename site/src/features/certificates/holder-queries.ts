import { queryOptions } from '@tanstack/react-query';
import { answerOf, api } from '../../api/client.ts';

const drawingPollMs = 3_000;

/** One's own certificates, newest first. */
export const ownCertificatesQuery = queryOptions({
  queryKey: ['certificates', 'own'],
  queryFn: ({ signal }) => answerOf(api.GET('/api/me/certificates', { signal })),
});

/** One certificate; looked at again until its file has been drawn. */
export const certificateQuery = (id: string) =>
  queryOptions({
    queryKey: ['certificates', 'one', id],
    queryFn: ({ signal }) =>
      answerOf(api.GET('/api/certificates/{id}', { params: { path: { id } }, signal })),
    staleTime: 0,
    refetchInterval: ({ state: { data } }) => (data && !data.ready ? drawingPollMs : false),
  });
