import '../features/classes/classes.css';
import { useSuspenseQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useParams, useSearchParams } from 'react-router-dom';
import { cacheOf, type LoaderArgs, requireSession } from '../api/session.ts';
import {
  type Filter,
  filters,
  membersUnder,
  nameOf,
  sayClass,
} from '../features/classes/class-words.ts';
import { StripKey } from '../features/classes/map-strip.tsx';
import { MarkedWorksheets } from '../features/classes/marked-worksheets.tsx';
import { MembersTable } from '../features/classes/members-table.tsx';
import { classQuery, type ClassView } from '../features/classes/queries.ts';
import { SlipsTable } from '../features/classes/slips-table.tsx';
import { Segments } from '../ui/choice-row.tsx';
import { sayDate } from '../ui/dates.ts';
import { FindField } from '../ui/find-field.tsx';
import { PageTitle } from '../ui/page-title.tsx';
import { Sheet, SheetHead } from '../ui/sheet.tsx';
import { EmptyState } from '../ui/states.tsx';
import { FootStrip } from '../ui/thumb-index.tsx';
import { TitleBlock } from '../ui/title-block.tsx';

export async function loader(args: LoaderArgs) {
  await requireSession(args, 'trainer', 'administrator');
  return cacheOf(args).fetchQuery(classQuery(args.params['id'] ?? ''));
}

export function Component() {
  const { id = '' } = useParams();
  const [params] = useSearchParams();
  const { data: view } = useSuspenseQuery(classQuery(id));
  const chosen = view.members.find((member) => member.id === params.get('trainee'));
  return (
    <>
      <Sheet width="wide" flat>
        <PageTitle>{`Class ${view.name}`}</PageTitle>
        <SheetHead
          kicker={`${view.school}. ${view.course.title}`}
          title={view.name}
          standfirst={view.members.length > 0 && sayClass(view)}
          titleBlock={<ClassTitleBlock view={view} />}
        />
        {view.members.length === 0 ? (
          <EmptyState title="Nobody has joined yet">
            Give your trainees the code <b className="mono">{view.joinCode}</b>. They type it on
            their course map and stand here at once.
          </EmptyState>
        ) : (
          <>
            <Members view={view} />
            <StripKey />
            <div className="columns two-one">
              <SlipsTable view={view} />
              <MarkedWorksheets key={chosen?.id} members={view.members} chosen={chosen} />
            </div>
          </>
        )}
      </Sheet>
      <FootStrip
        label="Class"
        links={[
          { label: 'Trainees', to: '#content' },
          { label: 'Slips', to: '#slips' },
          { label: 'Worksheets', to: '#marked' },
        ]}
      />
    </>
  );
}

const filterLabels: Record<Filter, string> = {
  all: 'All',
  stuck: 'Stuck',
  ready: 'Ready to sit',
  away: 'Not here for 7 days',
};

function Members({ view }: { view: ClassView }) {
  const [filter, setFilter] = useState<Filter>('all');
  const [find, setFind] = useState('');
  const [now] = useState(() => new Date());
  const wanted = find.toLocaleLowerCase();
  const members = membersUnder(filter, view.members, now).filter((member) =>
    nameOf(member).toLocaleLowerCase().includes(wanted),
  );
  const segments = filters.map((id) => ({
    id,
    label: filterLabels[id],
    count: membersUnder(id, view.members, now).length,
  }));
  return (
    <>
      <div className="desk-bar">
        <Segments
          name="show"
          label="Show"
          segments={segments}
          chosen={filter}
          onChoose={(id) => setFilter(filters.find((one) => one === id) ?? 'all')}
        />
        <FindField label="Find a name" value={find} onFind={setFind} />
      </div>
      {members.length === 0 ? (
        <EmptyState title="Nobody here">
          No trainee of this class is under what you chose.
        </EmptyState>
      ) : (
        // The strip grows with the course and then scrolls, so the keyboard must reach it.
        // eslint-disable-next-line jsx-a11y/no-noninteractive-tabindex
        <div className="table-scroll" role="region" aria-label="Trainees" tabIndex={0}>
          <MembersTable
            view={view}
            members={members}
            linkTo={(memberId) => `?trainee=${memberId}#marked`}
          />
        </div>
      )}
    </>
  );
}

function ClassTitleBlock({ view }: { view: ClassView }) {
  return (
    <TitleBlock
      cells={[
        {
          label: 'Code to join',
          value: <span className="mono">{view.joinCode}</span>,
          span: 4,
          kind: 'strong',
        },
        { label: 'Trainees', value: view.members.length, kind: 'strong' },
        { label: 'Course', value: view.course.number },
        { label: 'From', value: sayDate(view.startsOn) },
        { label: 'To', value: sayDate(view.endsOn) },
        { label: 'Trainers', value: view.trainers.join(', '), span: 6 },
      ]}
    />
  );
}
