import { Button } from '@radix-ui/themes';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { sayDate, sayMoment } from '../../ui/dates.ts';
import { Form } from '../../ui/form.tsx';
import { FormField } from '../../ui/form-field.tsx';
import { MarkedQuestion } from '../../ui/question/marked-question.tsx';
import { QuestionFacts } from '../../ui/question/question-card.tsx';
import { lookAt, type LookView, type ResultRow } from './queries.ts';

/** Opens the items of one sitting: a reason first, then what was asked, answered and marked. */
export function LookPanel({ row }: { row: ResultRow }) {
  const cache = useQueryClient();
  const look = useMutation({
    mutationFn: (reason: string) => lookAt(row.id, reason),
    onSuccess: () => cache.invalidateQueries({ queryKey: ['results', 'list'] }),
  });
  return (
    <section className="look-panel" aria-labelledby="look-title">
      <header>
        <h2 id="look-title">{row.name}</h2>
        <p>Sat on {sayDate(row.satOn)}</p>
      </header>
      {look.data ? (
        <Opened look={look.data} />
      ) : (
        <div className="look-ask">
          <p>
            Items and key of a paper are opened for a reason only, such as an appeal. Each look is
            kept with your name.
          </p>
          <Form
            label="Open the items"
            problem={look.error}
            onSubmit={({ reason = '' }) => look.mutate(reason)}
          >
            <FormField
              name="reason"
              label="Reason, kept with the look"
              required
              missing="Say why the items are opened."
              maxLength={500}
              autoComplete="off"
            />
            <Button type="submit" size="3" disabled={look.isPending || row.percent === null}>
              {look.isPending ? 'Opening' : 'Open the items'}
            </Button>
          </Form>
        </div>
      )}
    </section>
  );
}

function Opened({ look }: { look: LookView }) {
  return (
    <>
      <div className="look-ask">
        <p role="status">
          <b>
            {look.marks} of {look.outOf}, {look.passed ? 'passed' : 'not passed'}.
          </b>{' '}
          Opened and recorded.
        </p>
        <h3>Looks so far</h3>
        <ul className="looks-list">
          {look.looks.map((one) => (
            <li key={one.at}>
              <span>{sayMoment(one.at)}</span>
              <span>
                {one.reason} <small>{one.by}</small>
              </span>
            </li>
          ))}
        </ul>
      </div>
      <ol className="look-items">
        {look.items.map((item) => (
          <li key={item.number}>
            <h3>
              Question {item.number}, {item.question.title}
              <span className="number">
                {item.marked.marks} of {item.marked.outOf}
              </span>
            </h3>
            <p className="look-lead">{item.question.lead}</p>
            <QuestionFacts question={item.question} />
            <MarkedQuestion marked={item.marked} asked={item.question.parts} />
            <Working answers={item.answers} />
          </li>
        ))}
      </ol>
    </>
  );
}

/** Working is kept and shown, never marked. */
function Working({ answers }: { answers: LookView['items'][number]['answers'] }) {
  const written = Object.entries(answers).filter(([, { working }]) => working.trim() !== '');
  if (written.length === 0) return null;
  return (
    <dl className="look-working">
      {written.map(([part, { working }]) => (
        <div key={part}>
          <dt>Working of ({part})</dt>
          <dd>{working}</dd>
        </div>
      ))}
    </dl>
  );
}
