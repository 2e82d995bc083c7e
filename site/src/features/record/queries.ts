import { queryOptions } from '@tanstack/react-query';
import { answerOf, api } from '../../api/client.ts';
import { type Answer } from '../../api/views.ts';

export type SubjectRecords = Answer<'Record_subjects'>;

export const subjectRecordsQuery = queryOptions({
  queryKey: ['record', 'subjects'],
  queryFn: ({ signal }) => answerOf(api.GET('/api/record/subjects', { signal })),
});
