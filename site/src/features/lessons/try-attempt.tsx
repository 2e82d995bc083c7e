import { Button } from '@radix-ui/themes';
import Markdown from 'react-markdown';
import { ProblemCallout } from '../../ui/problem-callout.tsx';
import { CurveReader } from '../../ui/question/curve-reader.tsx';
import { MarkedQuestion } from '../../ui/question/marked-question.tsx';
import { PartHint } from '../../ui/question/part-hint.tsx';
import {
  type PracticeView,
  sayHints,
  useFocusOnTurn,
  usePracticeAnswers,
} from '../../ui/question/practice.ts';
import { QuestionCard, QuestionFacts } from '../../ui/question/question-card.tsx';

interface TryAttemptProps {
  practice: PracticeView;
  isRenewing: boolean;
  onAgain: () => void;
}

/** The question as it was drawn: answered, then marked. */
export function TryAttempt({ practice, isRenewing, onAgain }: TryAttemptProps) {
  const { question } = practice;
  const { answers, change, mark, unclear } = usePracticeAnswers(practice.id);
  const heading = useFocusOnTurn(mark.data !== undefined);
  const curve = question.curve && <CurveReader curve={question.curve} />;
  const again = (
    <Button variant="outline" disabled={isRenewing} onClick={onAgain}>
      Again with fresh figures
    </Button>
  );
  return (
    <>
      <header className="try-head">
        <p className="kicker">{mark.data ? 'Try it, marked' : 'Try it'}</p>
        <h2 ref={heading} tabIndex={-1}>
          {question.title}
        </h2>
        <Markdown>{mark.data ? mark.data.marked.summary : question.lead}</Markdown>
      </header>
      {mark.data ? (
        <>
          <MarkedQuestion marked={mark.data.marked} asked={question.parts} />
          <div className="marked-facts">
            <QuestionFacts question={question} />
            {curve}
          </div>
          <div className="action-strip">
            <p role="status">
              <b>
                {mark.data.marked.marks} of {mark.data.marked.outOf} marks
                {sayHints(mark.data.hints)}.
              </b>{' '}
              Practice: it counts for nothing.
            </p>
            {again}
          </div>
        </>
      ) : (
        <>
          <QuestionCard
            question={question}
            answers={answers}
            unclear={unclear ?? {}}
            curve={curve}
            aside={({ id, kind }) =>
              kind === 'quantity' && <PartHint practiceId={practice.id} part={id} />
            }
            onChange={change}
          />
          {!unclear && <ProblemCallout error={mark.error} />}
          <div className="action-strip">
            <p role="status">
              {unclear ? 'Some answers cannot be read. Nothing has been marked.' : ''}
            </p>
            <span className="buttons">
              {again}
              <Button disabled={mark.isPending} onClick={() => mark.mutate()}>
                {mark.isPending ? 'Marking' : 'Mark it'}
              </Button>
            </span>
          </div>
        </>
      )}
    </>
  );
}
