import '../features/classes/classes.css';
import { useQuery, useSuspenseQuery } from '@tanstack/react-query';
import { type LoaderArgs, requireSession, sessionQuery } from '../api/session.ts';
import { ClassList } from '../features/classes/class-list.tsx';
import { OpenClass } from '../features/classes/open-class.tsx';
import { classesQuery } from '../features/classes/queries.ts';
import { PageTitle } from '../ui/page-title.tsx';
import { Sheet, SheetHead } from '../ui/sheet.tsx';
import { EmptyState, FailedState, RuledLines } from '../ui/states.tsx';

export async function loader(args: LoaderArgs) {
  await requireSession(args);
  return null;
}

export function Component() {
  const { data: session } = useSuspenseQuery(sessionQuery);
  const opensAll = session?.account.roles.includes('administrator') ?? false;
  return (
    <Sheet width="wide" flat>
      <PageTitle>Classes</PageTitle>
      <SheetHead
        title="Classes"
        standfirst="The classes you train. Give the code to your trainees: with it they join from their course map."
      />
      <Classes opensAll={opensAll} />
      {opensAll && <OpenClass />}
    </Sheet>
  );
}

function Classes({ opensAll }: { opensAll: boolean }) {
  const list = useQuery(classesQuery);
  if (list.isPending) return <RuledLines what="the classes" />;
  if (list.isError) return <FailedState error={list.error} retry={() => void list.refetch()} />;
  if (list.data.classes.length === 0) {
    return (
      <EmptyState title="No class yet">
        {opensAll
          ? 'Open the first one below.'
          : 'You train no class so far. The school sets classes up and names their trainers.'}
      </EmptyState>
    );
  }
  return <ClassList classes={list.data.classes} opensAll={opensAll} />;
}
