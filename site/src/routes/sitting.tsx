import { Button } from '@radix-ui/themes';
import { useEffect, useRef } from 'react';
import { Link, Navigate, useSearchParams } from 'react-router-dom';
import { DeskStrips } from '../features/sittings/desk-strips.tsx';
import { PaperBar } from '../features/sittings/paper-bar.tsx';
import { type SittingItem, type SittingView } from '../features/sittings/queries.ts';
import { QuestionTerminals } from '../features/sittings/question-terminals.tsx';
import { Receipts } from '../features/sittings/receipts.tsx';
import { type SittingDesk, useSittingDesk } from '../features/sittings/sitting-desk.ts';
import { BareHead } from '../features/sittings/sitting-head.tsx';
import { TickBox } from '../ui/choice-row.tsx';
import { sayMoment, sayTimeOfDay } from '../ui/dates.ts';
import { focusOnHeading } from '../ui/focus-on-heading.ts';
import { PageTitle } from '../ui/page-title.tsx';
import { Quantity } from '../ui/quantity.tsx';
import { CurveReader } from '../ui/question/curve-reader.tsx';
import { QuestionCard } from '../ui/question/question-card.tsx';
import { Sheet, SheetHead } from '../ui/sheet.tsx';
import { FootStrip } from '../ui/thumb-index.tsx';
import { TitleBlock } from '../ui/title-block.tsx';
import { upperFirst } from '../ui/words.ts';

const pageOf = (sittingId: string, number: number) => `/sittings/${sittingId}?q=${number}`;
const reviewOf = (sittingId: string) => `/sittings/${sittingId}/review`;

export function Component() {
  const shared = useSittingDesk();
  const { sitting, standings, pennants } = shared;
  const at = useQuestionNumber(sitting.items.length);
  useFocusOnQuestion(at);
  const item = sitting.items[at - 1];
  if (!item) return <Navigate to={reviewOf(sitting.id)} replace />;
  return (
    <>
      <PageTitle>{`Question ${at}, ${sitting.paper.title}`}</PageTitle>
      <BareHead sitting={sitting} to={{ label: 'Review', path: reviewOf(sitting.id) }} />
      <Sheet>
        <SittingHead sitting={sitting} item={item} />
        <DeskStrips {...shared} />
        <PaperBar {...shared} />
        <QuestionTerminals
          sittingId={sitting.id}
          items={sitting.items}
          standings={standings}
          pennants={pennants}
          current={at}
        />
        <OpenQuestion key={item.key} shared={shared} item={item} />
        <Receipts state={shared.state} />
        <SittingFoot shared={shared} item={item} />
      </Sheet>
      <SittingFootStrip sitting={sitting} at={at} />
    </>
  );
}

function useQuestionNumber(count: number): number {
  const [search] = useSearchParams();
  return Math.min(Math.max(1, Math.floor(Number(search.get('q'))) || 1), count);
}

/** From one question to the next the path stays, so the focus is moved here. */
function useFocusOnQuestion(at: number) {
  const before = useRef(at);
  useEffect(() => {
    if (before.current === at) return;
    before.current = at;
    focusOnHeading({ preventScroll: true });
  }, [at]);
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
            { label: 'Subject', value: upperFirst(item.subject), span: 4 },
            {
              label: 'Time allowed',
              value: <Quantity value={Math.ceil(sitting.minutes)} unit="min" />,
              span: 2,
            },
            { label: 'Candidate', value: sitting.name, span: 2 },
            { label: 'Opened', value: sayMoment(sitting.startedAt), span: 2 },
            { label: 'Closes', value: sayTimeOfDay(sitting.closesAt), span: 2 },
          ]}
        />
      }
    />
  );
}

interface OpenItemProps {
  shared: SittingDesk;
  item: SittingItem;
}

function OpenQuestion({ shared: { desk, state, isOver }, item }: OpenItemProps) {
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
      readOnly={state.stopped !== null || isOver}
      curve={question.curve ? <CurveReader curve={question.curve} /> : undefined}
      onChange={(part, answer) => desk.write(key, part, answer)}
      onLeave={() => desk.flush()}
    />
  );
}

function SittingFoot({ shared, item }: OpenItemProps) {
  const { sitting, pennants, state, setPennant } = shared;
  const at = item.number;
  const isLast = at === sitting.items.length;
  return (
    <div className="action-strip">
      <TickBox
        label={`Come back to question ${at}`}
        checked={pennants[item.key] ?? false}
        disabled={state.stopped !== null}
        onChange={(comeBack) => setPennant(item.key, comeBack)}
      />
      <div className="buttons sitting-buttons">
        {at > 1 && (
          <Button size="3" variant="outline" asChild>
            <Link to={pageOf(sitting.id, at - 1)}>Question {at - 1}</Link>
          </Button>
        )}
        <Button size="3" variant={isLast ? 'solid' : 'outline'} asChild>
          <Link className="to-review" to={reviewOf(sitting.id)}>
            Review and hand in
          </Link>
        </Button>
        {!isLast && (
          <Button size="3" asChild>
            <Link to={pageOf(sitting.id, at + 1)}>Question {at + 1}</Link>
          </Button>
        )}
      </div>
    </div>
  );
}

function SittingFootStrip({ sitting, at }: { sitting: SittingView; at: number }) {
  const count = sitting.items.length;
  return (
    <FootStrip
      label="Questions"
      links={[
        ...(at > 1 ? [{ label: `‹ ${at - 1}`, to: pageOf(sitting.id, at - 1) }] : []),
        { label: `All ${count}`, to: reviewOf(sitting.id) },
        ...(at < count ? [{ label: `${at + 1} ›`, to: pageOf(sitting.id, at + 1) }] : []),
      ]}
    />
  );
}
