import '../features/practice/practice.css';
import { useQuery, useQueryClient, useSuspenseQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Link, useParams, useSearchParams } from 'react-router-dom';
import { isProblem } from '../api/problem.ts';
import { cacheOf, type LoaderArgs, requireSession } from '../api/session.ts';
import { FadingRow } from '../features/practice/fading-row.tsx';
import { PracticeRun } from '../features/practice/practice-run.tsx';
import { type BankQuestion, bankQuery, drawQuery } from '../features/practice/queries.ts';
import { levelNames } from '../features/practice/words.ts';
import { PageTitle } from '../ui/page-title.tsx';
import { Sheet, SheetHead } from '../ui/sheet.tsx';
import { EmptyState, FailedState, RuledLines } from '../ui/states.tsx';
import { FootStrip } from '../ui/thumb-index.tsx';
import { TitleBlock } from '../ui/title-block.tsx';
import { upperFirst } from '../ui/words.ts';

export async function loader(args: LoaderArgs) {
  await requireSession(args);
  return cacheOf(args).ensureQueryData(bankQuery);
}

export function Component() {
  const { slug = '' } = useParams();
  const { data: bank } = useSuspenseQuery(bankQuery);
  const question = bank.questions.find((one) => one.slug === slug);
  return (
    <>
      <Sheet>{question ? <Question key={slug} question={question} /> : <NoQuestion />}</Sheet>
      <FootStrip
        label="Practice"
        links={[
          { label: 'Course map', to: '/course' },
          { label: 'Practice', to: listOf(question) },
          { label: 'My record', to: '/record' },
        ]}
      />
    </>
  );
}

const listOf = (question: BankQuestion | undefined) =>
  question ? `/practice?subject=${question.subject.code}` : '/practice';

function NoQuestion() {
  return (
    <>
      <PageTitle>No such question</PageTitle>
      <SheetHead kicker="Practice" title="There is no such question" />
      <EmptyState title="It may have been renamed" actions={<Link to="/practice">Practice</Link>}>
        The list has every question that can be practised.
      </EmptyState>
    </>
  );
}

function Question({ question }: { question: BankQuestion }) {
  const [params] = useSearchParams();
  const [round, setRound] = useState(0);
  const queryClient = useQueryClient();
  const left = readLeft(params.get('left'));
  const [firstLeft] = useState(left);
  const draw = useQuery(drawQuery(question.slug, { left, round }));
  const again = () => setRound(round + 1);
  const keepRecord = () => {
    void queryClient.invalidateQueries({ queryKey: bankQuery.queryKey });
    void queryClient.invalidateQueries({ queryKey: ['record'] });
  };
  return (
    <>
      <PageTitle>{`Practice, ${question.title}`}</PageTitle>
      <SheetHead
        kicker={`Practice, ${question.subject.name}`}
        title={question.title}
        standfirst={draw.data?.question.lead}
        titleBlock={<QuestionBlock question={question} />}
      />
      {draw.data && <FadingRow levels={draw.data.levels} left={draw.data.left} />}
      {draw.isPending && <RuledLines what="fresh figures" />}
      {draw.isError &&
        (isProblem(draw.error, 'invalid-request') ? (
          <NoLevel />
        ) : (
          <FailedState error={draw.error} retry={() => void draw.refetch()} />
        ))}
      {draw.data && (
        <PracticeRun
          key={draw.data.id}
          practice={draw.data}
          isFirst={round === 0 && left === firstLeft}
          onAgain={again}
          onMarked={keepRecord}
        />
      )}
    </>
  );
}

function NoLevel() {
  return (
    <EmptyState title="It has fewer steps than that" actions={<Link to="?">The whole</Link>}>
      Begin with all of it, or choose how many of its last steps are left to you.
    </EmptyState>
  );
}

/** The last steps that are left to do; null for the whole. */
function readLeft(text: string | null): number | null {
  return text !== null && /^\d{1,3}$/.test(text) ? Number(text) : null;
}

function QuestionBlock({ question }: { question: BankQuestion }) {
  const { subject, level, marks, lesson, best, tries } = question;
  return (
    <TitleBlock
      cells={[
        { label: 'Subject', value: subject.code, kind: 'strong' },
        { label: 'Level', value: levelNames[level] },
        { label: 'Marks', value: marks, kind: 'strong' },
        {
          label: 'All of the subject',
          value: <Link to={listOf(question)}>{upperFirst(subject.name)}</Link>,
          span: 4,
        },
        { label: 'Sheet', value: lesson },
        {
          label: 'Tried',
          value: tries === 0 ? 'not yet' : tries === 1 ? 'once' : `${tries} times`,
          span: 3,
        },
        { label: 'Best whole', value: best ? `${best.percent}\u2009%` : 'none yet', span: 3 },
      ]}
    />
  );
}
