import { queryOptions } from '@tanstack/react-query';
import { answerOf, api } from '../../api/client.ts';
import { type Answer } from '../../api/views.ts';

export type TablesView = Answer<'Tables_tables'>;
export type TableView = TablesView['tables'][number];
export type SymbolsView = TablesView['symbols'];

export const tablesQuery = queryOptions({
  queryKey: ['tables'],
  queryFn: ({ signal }) => answerOf(api.GET('/api/tables', { signal })),
});
