import { Button } from '@radix-ui/themes';
import { type ReactNode, useEffect, useRef } from 'react';
import { Link } from 'react-router-dom';
import { ProblemCallout } from '../../ui/problem-callout.tsx';
import { CurveReader } from '../../ui/question/curve-reader.tsx';
import { MarkedQuestion } from '../../ui/question/marked-question.tsx';
import { PartHint } from '../../ui/question/part-hint.tsx';
import { type PracticeView, sayHints, usePracticeAnswers } from '../../ui/question/practice.ts';
import { QuestionCard, QuestionFacts } from '../../ui/question/question-card.tsx';
import { type Drawn, NextFigures } from './next-figures.tsx';
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
  const desk = usePracticeAnswers(practice.id, onMarked);
  const drawn = {
    left,
    all: levels.at(-1) ?? left,
    // A question of words alone is drawn anew in the order of its choices only.
    hasFigures: question.given.length > 0 || question.curve !== null,
    onAgain,
  };
  const curve = question.curve && <CurveReader curve={question.curve} />;
  return desk.mark.data ? (
    <MarkedRun practice={practice} reply={desk.mark.data} drawn={drawn} curve={curve} />
  ) : (
    <OpenRun {...{ practice, desk, drawn, curve, isFirst }} />
  );
}

type Desk = ReturnType<typeof usePracticeAnswers>;

interface OpenRunProps extends Pick<PracticeRunProps, 'practice' | 'isFirst'> {
  desk: Desk;
  drawn: Drawn;
  curve: ReactNode;
}

function OpenRun({ practice, desk, drawn, curve, isFirst }: OpenRunProps) {
  const { answers, change, mark, unclear } = desk;
  return (
    <>
      <RunHead title={titleOf(drawn.left, drawn.all)} takesFocus={!isFirst} />
      <QuestionCard
        question={practice.question}
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
        {drawn.left === 0 ? (
          <NextFigures {...drawn} isReady />
        ) : (
          <>
            <Button size="3" variant="outline" onClick={drawn.onAgain}>
              {drawn.hasFigures ? 'Other figures' : 'Begin again'}
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

interface MarkedRunProps {
  practice: PracticeView;
  reply: NonNullable<Desk['mark']['data']>;
  drawn: Drawn;
  curve: ReactNode;
}

function MarkedRun({ practice: { question }, reply, drawn, curve }: MarkedRunProps) {
  const { marked, hints } = reply;
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
            <WhatItCounts isWhole={drawn.left >= drawn.all} />
          </>
        }
      >
        <NextFigures {...drawn} isReady={marked.marks >= goodShare * marked.outOf} />
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
