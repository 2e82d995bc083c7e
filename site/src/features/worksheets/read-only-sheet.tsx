import { CurveReader } from '../../ui/question/curve-reader.tsx';
import { QuestionCard } from '../../ui/question/question-card.tsx';
import { Strip } from '../../ui/strip.tsx';
import { EarlierSheets } from './earlier-sheets.tsx';
import { ItemHead } from './item-head.tsx';
import { type WorksheetView } from './queries.ts';

/** Somebody else's worksheet before it is handed in: a trainer may look on. */
export function ReadOnlySheet({ attempt }: { attempt: WorksheetView }) {
  return (
    <>
      <Strip kind="said" across>
        <b>Not handed in yet.</b> This is how it stands now; it can be looked at, not changed.
      </Strip>
      {attempt.items.map((item, index) => (
        <section key={item.key} aria-labelledby={`${item.key}-title`}>
          <ItemHead item={item} place={[index + 1, attempt.items.length]} />
          <QuestionCard
            question={item.question}
            answers={item.answers}
            readOnly
            curve={item.question.curve && <CurveReader curve={item.question.curve} />}
            onChange={() => {}}
          />
        </section>
      ))}
      <EarlierSheets attempt={attempt} />
    </>
  );
}
