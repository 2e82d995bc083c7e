import { queryOptions } from '@tanstack/react-query';
import { answerOf, api } from '../../api/client.ts';
import { type Answer } from '../../api/views.ts';
import { type Answers } from '../../ui/question/views.ts';

export type WorksheetSummary = Answer<'Worksheets_summary'>;
export type WorksheetView = Answer<'Worksheets_open'>;
export type WorksheetItem = WorksheetView['items'][number];
export type Reading = Answer<'Worksheets_save'>['readings'][string];

export const worksheetQuery = (number: string) =>
  queryOptions({
    queryKey: ['worksheet', number],
    queryFn: ({ signal }) =>
      answerOf(api.GET('/api/worksheets/{number}', { params: { path: { number } }, signal })),
  });

export const attemptQuery = (id: string) =>
  queryOptions({
    queryKey: ['worksheet-attempt', id],
    queryFn: ({ signal }) =>
      answerOf(api.GET('/api/worksheet-attempts/{id}', { params: { path: { id } }, signal })),
  });

/** A fresh attempt, or the one that is open. */
export function startAttempt(number: string) {
  return answerOf(api.POST('/api/worksheets/{number}/attempts', { params: { path: { number } } }));
}

export function saveAnswers(id: string, key: string, answers: Answers) {
  return answerOf(
    api.PUT('/api/worksheet-attempts/{id}/items/{key}/answers', {
      params: { path: { id, key } },
      body: { answers },
      keepalive: true,
    }),
  );
}

export function handIn(id: string) {
  return answerOf(
    api.POST('/api/worksheet-attempts/{id}/hand-in', { params: { path: { id } }, body: {} }),
  );
}
