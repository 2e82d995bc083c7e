import { queryOptions } from '@tanstack/react-query';
import { answerOf, api } from '../../api/client.ts';
import { type Answer } from '../../api/views.ts';

export type GlossaryView = Answer<'Glossary_glossary'>;
export type TermView = GlossaryView['terms'][number];

export const glossaryQuery = queryOptions({
  queryKey: ['glossary'],
  queryFn: ({ signal }) => answerOf(api.GET('/api/glossary', { signal })),
});
