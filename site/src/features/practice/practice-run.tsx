import { Button } from '@radix-ui/themes';
import { type ReactNode, useEffect, useRef } from 'react';
import { Link } from 'react-router-dom';
import { ProblemCallout } from '../../ui/problem-callout.tsx';
import { CurveReader } from '../../ui/question/curve-reader.tsx';
import { MarkedQuestion } from '../../ui/question/marked-question.tsx';
import { PartHint } from '../../ui/question/part-hint.tsx';
import { type PracticeView, sayHints, usePracticeAnswers } from '../../ui/question/practice.ts';
import { QuestionCard, QuestionFacts } from '../../ui/question/question-card.tsx';
import { titleOf } from './words.ts';

/** Of the marks, from which one step more is the next thing to do. */
const goodShare = 0.8;

interface PracticeRunProps {
  practice: PracticeView;
  /** The page was opened with it: reading begins at the page's own heading. */
  isFirst: boolean;
  onAgain: () => void;
  onMarked: () => void;
}

/** One question with the figures that were drawn: answered, then marked where it stands. */
export function PracticeRun({ practice, isFirst, onAgain, onMarked }: PracticeRunProps) {
  const { question, levels, left } = practice;
  const { answers, change, mark, unclear } = usePracticeAnswers(practice.id, onMarked);
  const all = levels.at(-1) ?? left;
  const curve = question.curve && <CurveReader curve={question.curve} />;
  if (mark.data) {
    const { marked, hints } = mark.data;
    return (
      <>
        <RunHead title="Marked" says={marked.summary} takesFocus />
        <MarkedQuestion marked={marked} asked={question.parts} />
        <div className="marked-facts">
          <QuestionFacts question={question} />
          {curve}
        </div>
        <RunFoot
          says={
            <>
              <b>
                {marked.marks} of {marked.outOf} marks{sayHints(hints)}.
              </b>{' '}
              <WhatItCounts isWhole={left >= all} />
            </>
          }
        >
          <NextFigures
            {...{ left, all, onAgain }}
            isReady={marked.marks >= goodShare * marked.outOf}
          />
        </RunFoot>
      </>
    );
  }
  return (
    <>
      <RunHead title={titleOf(left, all)} takesFocus={!isFirst} />
      <QuestionCard
        question={question}
        answers={answers}
        unclear={unclear ?? {}}
        faded={practice}
        curve={curve}
        aside={({ id, kind }) =>
          kind === 'quantity' && <PartHint practiceId={practice.id} part={id} />
        }
        onChange={change}
      />
      {!unclear && <ProblemCallout error={mark.error} />}
      <RunFoot says={unclear && 'Some answers cannot be read. Nothing has been marked.'}>
        {left === 0 ? (
          <NextFigures {...{ left, all, onAgain }} isReady />
        ) : (
          <>
            <Button size="3" variant="outline" onClick={onAgain}>
              Other figures
            </Button>
            <Button size="3" disabled={mark.isPending} onClick={() => mark.mutate()}>
              {mark.isPending ? 'Marking' : 'Mark it'}
            </Button>
          </>
        )}
      </RunFoot>
    </>
  );
}

interface RunHeadProps {
  title: string;
  says?: string;
  takesFocus: boolean;
}

/** Says where one stands; whoever pressed a button that is gone reads on from here. */
function RunHead({ title, says, takesFocus }: RunHeadProps) {
  const heading = useRef<HTMLHeadingElement>(null);
  useEffect(() => {
    if (takesFocus && document.activeElement === document.body) heading.current?.focus();
  }, [title, takesFocus]);
  return (
    <header className="run-head">
      <h2 ref={heading} tabIndex={-1}>
        {title}
      </h2>
      {says && <p>{says}</p>}
    </header>
  );
}

function RunFoot({ says, children }: { says: ReactNode; children: ReactNode }) {
  return (
    <div className="action-strip run-foot">
      <p role="status">{says}</p>
      <span className="buttons">{children}</span>
    </div>
  );
}

function WhatItCounts({ isWhole }: { isWhole: boolean }) {
  if (!isWhole) return 'Marked like the whole. Your record counts it once you do it all.';
  return (
    <>
      It stands in <Link to="/record">your record</Link>, in no result.
    </>
  );
}

interface NextFiguresProps {
  left: number;
  /** All the steps there are. */
  all: number;
  onAgain: () => void;
  /** For one step more: it went well, or nothing was asked. */
  isReady: boolean;
}

/** What comes next: the same again, one step more, all of it. */
function NextFigures({ left, all, onAgain, isReady }: NextFiguresProps) {
  const hasMore = left < all;
  const goesOn = hasMore && isReady;
  return (
    <>
      {left < all - 1 && (
        <Button size="3" variant="outline" asChild>
          <Link to="?" replace>
            The whole
          </Link>
        </Button>
      )}
      <Button size="3" variant={goesOn ? 'outline' : 'solid'} onClick={onAgain}>
        {left === 0 ? 'See other figures' : 'Again with fresh figures'}
      </Button>
      {hasMore && (
        <Button size="3" variant={goesOn ? 'solid' : 'outline'} asChild>
          <Link to={left + 1 === all ? '?' : `?left=${left + 1}`} replace>
            {left === 0 ? 'Do the last step' : 'One more step'}
          </Link>
        </Button>
      )}
    </>
  );
}
