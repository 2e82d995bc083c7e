import '../features/results/results-desk.css';
import { useInfiniteQuery, useSuspenseQuery } from '@tanstack/react-query';
import { useSearchParams } from 'react-router-dom';
import { cacheOf, type LoaderArgs, requireSession } from '../api/session.ts';
import { courseQuery } from '../features/course/queries.ts';
import { LookPanel } from '../features/results/look-panel.tsx';
import { resultsQuery } from '../features/results/queries.ts';
import { ResultsTable } from '../features/results/results-table.tsx';
import { TimeAllowances } from '../features/results/time-allowances.tsx';
import { PageTitle } from '../ui/page-title.tsx';
import { Sheet, SheetHead } from '../ui/sheet.tsx';
import { EmptyState, FailedState, RuledLines } from '../ui/states.tsx';
import { TableFoot } from '../ui/table-foot.tsx';

export async function loader(args: LoaderArgs) {
  await requireSession(args, 'certification-manager');
  return cacheOf(args).ensureQueryData(courseQuery);
}

export function Component() {
  const { data: map } = useSuspenseQuery(courseQuery);
  const { paper } = map;
  return (
    <Sheet width="wide" flat>
      <PageTitle>Results</PageTitle>
      <SheetHead
        title="Results"
        standfirst={
          paper
            ? `${paper.title}, paper ${paper.number}. Marks are made by rule; the key is opened for a reason only.`
            : 'No paper has been published yet.'
        }
      />
      {paper && <Desk slug={paper.slug} />}
      <TimeAllowances />
    </Sheet>
  );
}

function Desk({ slug }: { slug: string }) {
  const [params] = useSearchParams();
  const selectedId = params.get('sitting');
  const list = useInfiniteQuery(resultsQuery(slug));
  if (list.isPending) return <RuledLines what="the results" />;
  if (list.isError) return <FailedState error={list.error} retry={() => void list.refetch()} />;
  const results = list.data.pages.flatMap((page) => page.results);
  if (results.length === 0) {
    return (
      <EmptyState title="Nobody has handed in this paper yet">
        A sitting appears here when it is handed in or its time is up.
      </EmptyState>
    );
  }
  const selected = results.find(({ id }) => id === selectedId);
  return (
    <>
      <ResultsTable {...{ results, selectedId }} linkTo={(id) => `?sitting=${id}`} />
      <TableFoot shown={results.length} list={list} />
      {selected && <LookPanel key={selected.id} row={selected} />}
    </>
  );
}
