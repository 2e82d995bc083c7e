import { queryOptions } from '@tanstack/react-query';
import { answerOf, api } from '../../api/client.ts';
import { type Answer } from '../../api/views.ts';

export type LessonView = Answer<'Lessons_read'>;
export type ProgressView = Answer<'Lessons_progress'>;

export const lessonQuery = (number: string) =>
  queryOptions({
    queryKey: ['lesson', number],
    queryFn: ({ signal }) =>
      answerOf(api.GET('/api/lessons/{number}', { params: { path: { number } }, signal })),
  });

export const progressQuery = (number: string) =>
  queryOptions({
    queryKey: ['lesson', number, 'progress'],
    queryFn: ({ signal }) =>
      answerOf(api.GET('/api/lessons/{number}/progress', { params: { path: { number } }, signal })),
  });

/** Outlives the page: the last paragraph is often sent while leaving it. */
export function saveParagraph(number: string, paragraph: number) {
  return answerOf(
    api.PUT('/api/lessons/{number}/progress', {
      params: { path: { number } },
      body: { paragraph },
      keepalive: true,
    }),
  );
}

export function markDone(number: string, revision: string) {
  return answerOf(
    api.PUT('/api/lessons/{number}/done', { params: { path: { number } }, body: { revision } }),
  );
}

export function undoDone(number: string) {
  return answerOf(api.DELETE('/api/lessons/{number}/done', { params: { path: { number } } }));
}
