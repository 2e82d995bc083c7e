import '../features/people/people.css';
import { useInfiniteQuery, useQuery } from '@tanstack/react-query';
import { useSearchParams } from 'react-router-dom';
import { type LoaderArgs, requireSession, sessionQuery } from '../api/session.ts';
import { PeopleTable } from '../features/people/people-table.tsx';
import { PersonPanel } from '../features/people/person-panel.tsx';
import { peopleQuery } from '../features/people/queries.ts';
import { PracticeProfile } from '../features/school/practice-profile.tsx';
import { FindField } from '../ui/find-field.tsx';
import { PageTitle } from '../ui/page-title.tsx';
import { Sheet, SheetHead } from '../ui/sheet.tsx';
import { EmptyState, FailedState, RuledLines } from '../ui/states.tsx';
import { TableFoot } from '../ui/table-foot.tsx';

export async function loader(args: LoaderArgs) {
  await requireSession(args, 'administrator');
  return null;
}

export function Component() {
  const [params, setParams] = useSearchParams();
  const find = params.get('find') ?? '';
  const selectedId = params.get('person');
  const { data: session } = useQuery(sessionQuery);

  const linkTo = (id: string) => `?${new URLSearchParams({ ...(find && { find }), person: id })}`;
  return (
    <Sheet width="wide" flat>
      <PageTitle>People</PageTitle>
      <SheetHead
        title="People"
        standfirst="Who has an account, what each may do, and whose is suspended. A change acts at once."
      />
      <div className="desk-bar">
        <FindField
          label="Find a name or email"
          value={find}
          onFind={(typed) => setParams(typed ? { find: typed } : {}, { replace: true })}
        />
      </div>
      <div className={selectedId ? 'people-desk with-panel' : 'people-desk'}>
        <PeopleList find={find} selectedId={selectedId} linkTo={linkTo} />
        {selectedId && session && (
          <aside className="person-panel" aria-labelledby="person-title">
            <PersonPanel key={selectedId} id={selectedId} ownId={session.account.id} />
          </aside>
        )}
      </div>
      <PracticeProfile />
    </Sheet>
  );
}

interface PeopleListProps {
  find: string;
  selectedId: string | null;
  linkTo: (id: string) => string;
}

function PeopleList({ find, selectedId, linkTo }: PeopleListProps) {
  const list = useInfiniteQuery(peopleQuery(find));
  if (list.isPending) return <RuledLines what="the people" />;
  if (list.isError) return <FailedState error={list.error} retry={() => void list.refetch()} />;
  const people = list.data.pages.flatMap((page) => page.people);
  if (people.length === 0) {
    return (
      <EmptyState title="Nobody of that name">
        Try a part of the name or of the address. People open their own accounts.
      </EmptyState>
    );
  }
  return (
    <div className="table-scroll">
      <PeopleTable people={people} selectedId={selectedId} linkTo={linkTo} />
      <TableFoot shown={people.length} list={list} />
    </div>
  );
}
