import { queryOptions } from '@tanstack/react-query';
import { answerOf, api } from '../../api/client.ts';
import { type Answer } from '../../api/views.ts';
import { type RawAnswer } from '../../ui/question/views.ts';

export type SittingView = Answer<'Sittings_view'>;
export type SittingItem = SittingView['items'][number];
export type Receipt = SittingView['receipts'][number];
export type Saved = Answer<'Sittings_save'>;

export const sittingQuery = (id: string) =>
  queryOptions({
    queryKey: ['sittings', id],
    queryFn: ({ signal }) =>
      answerOf(api.GET('/api/sittings/{id}', { params: { path: { id } }, signal })),
    // The desk on the page holds what was typed since: a refetch behind its back would undo it.
    staleTime: Infinity,
  });

/** An answer on its way to the server, or waiting for the signal to come back. */
export interface Sending {
  item: string;
  part: string;
  answer: RawAnswer;
  sequence: number;
  idempotencyKey: string;
}

export const sendAnswer = (id: string, sending: Sending): Promise<Saved> => {
  const { item: key, part, answer, sequence, idempotencyKey } = sending;
  return answerOf(
    api.PUT('/api/sittings/{id}/items/{key}/parts/{part}', {
      params: { path: { id, key, part } },
      body: { answer, sequence, idempotencyKey },
    }),
  );
};

export const setPennant = (id: string, key: string, comeBack: boolean) =>
  answerOf(
    api.PUT('/api/sittings/{id}/items/{key}/come-back', {
      params: { path: { id, key } },
      body: { comeBack },
    }),
  );

export const takeOver = (id: string) =>
  answerOf(api.POST('/api/sittings/{id}/take-over', { params: { path: { id } }, body: {} }));

export const handIn = (id: string) =>
  answerOf(api.POST('/api/sittings/{id}/hand-in', { params: { path: { id } }, body: {} }));
