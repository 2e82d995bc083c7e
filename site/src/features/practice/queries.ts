import { queryOptions } from '@tanstack/react-query';
import { answerOf, api } from '../../api/client.ts';
import { type Answer } from '../../api/views.ts';
import { startPractice } from '../../ui/question/practice.ts';

export type BankView = Answer<'Practice_list'>;
export type BankQuestion = BankView['questions'][number];

/** Every question that may be practised; sorting out is left to the page, so that it is at once. */
export const bankQuery = queryOptions({
  queryKey: ['practice', 'bank'],
  queryFn: ({ signal }) => answerOf(api.GET('/api/practice/questions', { signal })),
});

/** Figures for one question. They stay while the page is open: another round draws others. */
export const drawQuery = (slug: string, { left, round }: { left: number | null; round: number }) =>
  queryOptions({
    queryKey: ['practice', 'draw', slug, left, round],
    queryFn: () => startPractice(slug, left ?? undefined),
    staleTime: Infinity,
    gcTime: 0,
    retry: false,
    refetchOnWindowFocus: false,
    refetchOnReconnect: false,
  });
