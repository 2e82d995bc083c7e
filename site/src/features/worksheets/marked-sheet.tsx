import { Link } from 'react-router-dom';
import { CurveReader } from '../../ui/question/curve-reader.tsx';
import { MarkedQuestion } from '../../ui/question/marked-question.tsx';
import { QuestionFacts } from '../../ui/question/question-card.tsx';
import { EarlierSheets } from './earlier-sheets.tsx';
import { ItemHead } from './item-head.tsx';
import { type WorksheetItem, type WorksheetView } from './queries.ts';

/** A marked worksheet, question by question, with its total. */
export function MarkedSheet({ attempt }: { attempt: WorksheetView }) {
  return (
    <>
      {attempt.items.map((item, index) => (
        <MarkedItem
          key={item.key}
          item={item}
          place={[index + 1, attempt.items.length]}
          {...(!attempt.mine && { whose: attempt.trainee.givenName })}
        />
      ))}
      <div className="marked-total">
        <p>Total</p>
        <p>To pass: {marksToPass(attempt)}</p>
        <p>
          <span className="visually-hidden">Marks: </span>
          {attempt.marks}
          <i>/{attempt.outOf}</i>
        </p>
      </div>
      <EarlierSheets attempt={attempt} />
    </>
  );
}

/** The lowest whole mark that reaches the pass mark. */
export function marksToPass({ passPercent, outOf }: WorksheetView): number {
  return Math.ceil((passPercent * outOf) / 100);
}

interface MarkedItemProps {
  item: WorksheetItem;
  place: [number, number];
  whose?: string;
}

function MarkedItem({ item, place, whose }: MarkedItemProps) {
  const { question, marked, readAgain, slug } = item;
  if (!marked) return null;
  const isOwnAndShort = !whose && marked.marks < marked.outOf;
  return (
    <section aria-labelledby={`${item.key}-title`}>
      <ItemHead item={item} place={place} says={marked.summary}>
        {(readAgain ?? isOwnAndShort) && (
          <p className="item-links">
            {readAgain && (
              <Link to={`/sheets/${readAgain.sheet}`}>
                Read {readAgain.sheet}, {readAgain.title}
              </Link>
            )}
            {isOwnAndShort && <Link to={`/practice/${slug}?left=1`}>Build up to it</Link>}
          </p>
        )}
      </ItemHead>
      <MarkedQuestion marked={marked} asked={question.parts} {...(whose && { whose })} />
      <div className="marked-facts">
        <QuestionFacts question={question} />
        {question.curve && <CurveReader curve={question.curve} />}
      </div>
    </section>
  );
}
