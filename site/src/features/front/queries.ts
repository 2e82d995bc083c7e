import { queryOptions } from '@tanstack/react-query';
import { answerOf, api } from '../../api/client.ts';

export const frontQuery = queryOptions({
  queryKey: ['front'],
  queryFn: ({ signal }) => answerOf(api.GET('/api/front', { signal })),
  staleTime: 5 * 60_000,
  meta: { personal: false },
});
