import { infiniteQueryOptions, queryOptions } from '@tanstack/react-query';
import { answerOf, api } from '../../api/client.ts';
import { isProblem } from '../../api/problem.ts';
import { type Answer } from '../../api/views.ts';

export type ResultView = Answer<'Sittings_result'>;
export type SubjectMarks = ResultView['bySubject'][number];
export type ResultRow = Answer<'Papers_list'>['results'][number];
export type LookView = Answer<'Papers_look'>;
export type TimeAllowance = Answer<'Papers_allowedTimes'>['allowances'][number];

const markingPollMs = 2_000;
const drawingPollMs = 3_000;

/** The result of a sitting; null while it is being marked. Looks again until nothing is awaited. */
export const resultQuery = (id: string) =>
  queryOptions({
    queryKey: ['results', 'own', id],
    queryFn: async ({ signal }): Promise<ResultView | null> => {
      try {
        return await answerOf(
          api.GET('/api/sittings/{id}/result', { params: { path: { id } }, signal }),
        );
      } catch (error) {
        if (isProblem(error, 'result-not-ready')) return null;
        throw error;
      }
    },
    staleTime: 0,
    refetchInterval: ({ state: { data } }) => {
      if (data === null) return markingPollMs;
      return data?.certificate && !data.certificate.ready ? drawingPollMs : false;
    },
  });

export const resultsQuery = (slug: string) =>
  infiniteQueryOptions({
    queryKey: ['results', 'list', slug],
    queryFn: ({ pageParam, signal }) =>
      answerOf(
        api.GET('/api/papers/{slug}/results', {
          params: { path: { slug }, query: pageParam ? { cursor: pageParam } : {} },
          signal,
        }),
      ),
    initialPageParam: '',
    getNextPageParam: (page) => page.nextCursor,
  });

/** Opens the marked items of a sitting; the reason is kept with the name of whoever looked. */
export const lookAt = (id: string, reason: string) =>
  answerOf(api.POST('/api/sittings/{id}/looks', { params: { path: { id } }, body: { reason } }));

export const allowancesQuery = queryOptions({
  queryKey: ['time-allowances'],
  queryFn: ({ signal }) => answerOf(api.GET('/api/time-allowances', { signal })),
});

interface GrantTime {
  email: string;
  percent: number;
  reason: string;
}

export const grantTime = (body: GrantTime) => answerOf(api.POST('/api/time-allowances', { body }));
