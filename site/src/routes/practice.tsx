import '../features/practice/practice.css';
import { useSuspenseQuery } from '@tanstack/react-query';
import { useCallback } from 'react';
import { Link, useSearchParams } from 'react-router-dom';
import { cacheOf, type LoaderArgs, requireSession } from '../api/session.ts';
import { BankFilter, Subjects } from '../features/practice/bank-filter.tsx';
import { BankTable } from '../features/practice/bank-table.tsx';
import {
  countSubjects,
  type Filter,
  filterBank,
  readFilter,
  stateOf,
  writeFilter,
} from '../features/practice/filter.ts';
import { bankQuery, type BankView } from '../features/practice/queries.ts';
import { PageTitle } from '../ui/page-title.tsx';
import { Sheet, SheetHead } from '../ui/sheet.tsx';
import { EmptyState } from '../ui/states.tsx';
import { FootStrip } from '../ui/thumb-index.tsx';
import { TitleBlock } from '../ui/title-block.tsx';

export async function loader(args: LoaderArgs) {
  await requireSession(args);
  return cacheOf(args).fetchQuery(bankQuery);
}

export function Component() {
  const { data: bank } = useSuspenseQuery(bankQuery);
  return (
    <>
      <Sheet>
        <PageTitle>Practice</PageTitle>
        <SheetHead
          kicker="Practice"
          title="One question at a time"
          standfirst="Fresh figures each time, marked at once. See one worked, do its last step, then more of it, then the whole."
          titleBlock={<BankBlock bank={bank} />}
        />
        {bank.questions.length === 0 ? (
          <EmptyState
            title="No practice questions yet"
            actions={<Link to="/course">Course map</Link>}
          >
            They come with the sheets of the course. Read on meanwhile.
          </EmptyState>
        ) : (
          <Bank bank={bank} />
        )}
      </Sheet>
      <FootStrip
        label="Practice"
        links={[
          { label: 'Course map', to: '/course' },
          { label: 'Practice', to: '/practice', current: true },
          { label: 'My record', to: '/record' },
        ]}
      />
    </>
  );
}

function BankBlock({ bank: { questions, profile } }: { bank: BankView }) {
  const shown = questions.filter((question) => stateOf(question) === 'shown').length;
  return (
    <TitleBlock
      cells={[
        { label: 'Questions', value: questions.length, kind: 'strong' },
        { label: 'Shown', value: shown, kind: 'strong' },
        { label: 'Subjects', value: countSubjects(questions).length, kind: 'strong' },
        {
          label: 'Practice of the school',
          value: profile === 'metric' ? 'Metric' : 'AWG',
          span: 3,
        },
        { label: 'What to practise next', value: <Link to="/record">My record</Link>, span: 3 },
      ]}
    />
  );
}

function Bank({ bank }: { bank: BankView }) {
  const [params, setParams] = useSearchParams();
  const filter = readFilter(params);
  const pathOf = (subject: string | null) => `?${writeFilter({ ...filter, subject })}`;
  const setFilter = useCallback(
    (change: Partial<Filter>) =>
      setParams((before) => writeFilter({ ...readFilter(before), ...change }), {
        replace: true,
        preventScrollReset: true,
      }),
    [setParams],
  );
  const found = filterBank(bank.questions, filter);
  return (
    <div className="bank">
      <Subjects
        subjects={countSubjects(bank.questions)}
        chosen={filter.subject}
        pathOf={pathOf}
        onChoose={(subject) => setFilter({ subject })}
      />
      <div className="bank-list">
        <BankFilter filter={filter} onFilter={setFilter} />
        <p className="visually-hidden" role="status">
          {found.length} of {bank.questions.length} questions shown.
        </p>
        {found.length === 0 ? (
          <EmptyState title="No question like that" actions={<Link to="?">All questions</Link>}>
            Try another level, another subject or a part of the title.
          </EmptyState>
        ) : (
          <BankTable questions={found} profile={bank.profile} />
        )}
      </div>
    </div>
  );
}
