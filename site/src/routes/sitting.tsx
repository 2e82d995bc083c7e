import { Button } from '@radix-ui/themes';
import { useQueryClient, useSuspenseQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Link, Navigate, useParams, useSearchParams } from 'react-router-dom';
import { cacheOf, type LoaderArgs, requireSession } from '../api/session.ts';
import { type AnswerDesk, type DeskState } from '../features/sittings/answer-desk.ts';
import { DeskStrips } from '../features/sittings/desk-strips.tsx';
import { PaperBar } from '../features/sittings/paper-bar.tsx';
import {
  setPennant,
  type SittingItem,
  sittingQuery,
  type SittingView,
  takeOver,
} from '../features/sittings/queries.ts';
import { QuestionTerminals, standingsOf } from '../features/sittings/question-terminals.tsx';
import { Receipts } from '../features/sittings/receipts.tsx';
import '../features/sittings/sittings.css';
import { useAnswerDesk } from '../features/sittings/use-answer-desk.ts';
import { TickBox } from '../ui/choice-row.tsx';
import { sayMoment, sayTimeOfDay } from '../ui/dates.ts';
import { PageTitle } from '../ui/page-title.tsx';
import { CurveReader } from '../ui/question/curve-reader.tsx';
import { QuestionCard } from '../ui/question/question-card.tsx';
import { RunningHead } from '../ui/running-head.tsx';
import { Sheet, SheetHead } from '../ui/sheet.tsx';
import { TitleBlock } from '../ui/title-block.tsx';

export async function loader(args: LoaderArgs) {
  await requireSession(args);
  return cacheOf(args).ensureQueryData(sittingQuery(args.params.id ?? ''));
}

export function Component() {
  const { id = '' } = useParams();
  const { data: sitting } = useSuspenseQuery(sittingQuery(id));
  if (sitting.state === 'handed-in') return <Navigate to={`/sittings/${id}/result`} replace />;
  // A take-over brings a new reading of the paper, and with it a new desk.
  return <OpenSitting key={String(sitting.readOnly)} sitting={sitting} />;
}

function OpenSitting({ sitting }: { sitting: SittingView }) {
  const { desk, state } = useAnswerDesk(sitting);
  const cache = useQueryClient();
  const [search] = useSearchParams();
  const [pennants, setPennants] = useState(() =>
    Object.fromEntries(sitting.items.map(({ key, comeBack }) => [key, comeBack])),
  );
  const at = Math.min(Math.max(1, Number(search.get('q')) || 1), sitting.items.length);
  const item = sitting.items[at - 1];
  const standings = standingsOf(sitting.items, state);
  if (state.stopped === 'closed' || !item) {
    return <Navigate to={`/sittings/${sitting.id}/result`} replace />;
  }
  const answered = standings.filter((standing) => standing === 'answered').length;
  const takeOverHere = async () =>
    cache.setQueryData(sittingQuery(sitting.id).queryKey, await takeOver(sitting.id));
  return (
    <>
      <PageTitle>{`Question ${at}, ${sitting.paper.title}`}</PageTitle>
      <RunningHead end={<span className="muted">{sitting.paper.title}, being sat</span>} />
      <Sheet>
        <SittingHead sitting={sitting} item={item} />
        <PaperBar
          state={state}
          answered={`${answered} of ${sitting.items.length} answered`}
          closesAt={sitting.closesAt}
          minutes={sitting.minutes}
        />
        <DeskStrips
          state={state}
          closesAt={sitting.closesAt}
          onTakeOver={() => void takeOverHere()}
        />
        <QuestionTerminals
          sittingId={sitting.id}
          items={sitting.items}
          standings={standings}
          pennants={pennants}
          current={at}
        />
        <OpenQuestion key={item.key} item={item} desk={desk} state={state} />
        <Receipts state={state} />
        <SittingFoot
          sitting={sitting}
          at={at}
          comeBack={pennants[item.key] ?? false}
          readOnly={state.stopped !== null}
          onComeBack={(comeBack) => {
            setPennants({ ...pennants, [item.key]: comeBack });
            void setPennant(sitting.id, item.key, comeBack);
          }}
        />
      </Sheet>
    </>
  );
}

function SittingHead({ sitting, item }: { sitting: SittingView; item: SittingItem }) {
  const { paper, items } = sitting;
  return (
    <SheetHead
      kicker={`${paper.title}, question ${item.number} of ${items.length}`}
      title={item.question.title}
      standfirst={item.question.lead}
      titleBlock={
        <TitleBlock
          cells={[
            { label: 'Paper no.', value: paper.number, span: 2, kind: 'strong' },
            { label: 'Question', value: `${item.number} of ${items.length}`, span: 2 },
            { label: 'Marks', value: String(item.question.marks), span: 2, kind: 'strong' },
            { label: 'Subject', value: item.subject, span: 4 },
            { label: 'Time allowed', value: `${sitting.minutes} min`, span: 2 },
            { label: 'Candidate', value: sitting.name, span: 2 },
            { label: 'Opened', value: sayMoment(sitting.startedAt), span: 2 },
            { label: 'Closes', value: sayTimeOfDay(sitting.closesAt), span: 2 },
          ]}
        />
      }
    />
  );
}

interface OpenQuestionProps {
  item: SittingItem;
  desk: AnswerDesk;
  state: DeskState;
}

function OpenQuestion({ item, desk, state }: OpenQuestionProps) {
  const { question, key } = item;
  const unclear = Object.fromEntries(
    question.parts.flatMap(({ id }) => {
      const ask = state.unclear[`${key} ${id}`];
      return ask ? [[id, ask]] : [];
    }),
  );
  return (
    <QuestionCard
      question={question}
      answers={state.answers[key] ?? {}}
      unclear={unclear}
      readOnly={state.stopped !== null}
      curve={question.curve ? <CurveReader curve={question.curve} /> : undefined}
      onChange={(part, answer) => desk.write(key, part, answer)}
      onLeave={() => desk.flush()}
    />
  );
}

interface SittingFootProps {
  sitting: SittingView;
  at: number;
  comeBack: boolean;
  readOnly: boolean;
  onComeBack: (comeBack: boolean) => void;
}

function SittingFoot({ sitting, at, comeBack, readOnly, onComeBack }: SittingFootProps) {
  const page = (number: number) => `/sittings/${sitting.id}?q=${number}`;
  const isLast = at === sitting.items.length;
  return (
    <div className="action-strip">
      <TickBox
        label={`Come back to question ${at}`}
        checked={comeBack}
        disabled={readOnly}
        onChange={onComeBack}
      />
      <div className="buttons">
        {at > 1 && (
          <Button size="3" variant="outline" asChild>
            <Link to={page(at - 1)}>Question {at - 1}</Link>
          </Button>
        )}
        <Button size="3" variant={isLast ? 'solid' : 'outline'} asChild>
          <Link to={`/sittings/${sitting.id}/review`}>Review and hand in</Link>
        </Button>
        {!isLast && (
          <Button size="3" asChild>
            <Link to={page(at + 1)}>Question {at + 1}</Link>
          </Button>
        )}
      </div>
    </div>
  );
}
