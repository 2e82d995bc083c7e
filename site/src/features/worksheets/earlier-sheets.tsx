import { Link } from 'react-router-dom';
import { InlineMarkdown } from '../../ui/question/inline-markdown.tsx';
import { type WorksheetView } from './queries.ts';

/** Recall questions of sheets read before; their answers are there once it is handed in. */
export function EarlierSheets({ attempt: { recall, handedInAt } }: { attempt: WorksheetView }) {
  if (recall.length === 0) return null;
  return (
    <section className="earlier-sheets" aria-labelledby="earlier-title">
      <p className="kicker">No marks</p>
      <h2 id="earlier-title">From earlier sheets</h2>
      <p className="muted">
        {handedInAt
          ? 'They carry no marks. Say each answer again, then open it.'
          : 'Say the answer to yourself; there is nothing to write. They carry no marks, and the answers are here once you have handed in.'}
      </p>
      <ol>
        {recall.map((one) => (
          <li key={`${one.sheet.number} ${one.ask}`}>
            <p>
              <InlineMarkdown>{one.ask}</InlineMarkdown>
            </p>
            {one.answer !== null && <RecallAnswer sheet={one.sheet} answer={one.answer} />}
          </li>
        ))}
      </ol>
    </section>
  );
}

type Recall = WorksheetView['recall'][number];

function RecallAnswer({ sheet, answer }: { sheet: Recall['sheet']; answer: string }) {
  return (
    <details>
      <summary>Answer</summary>
      <p>
        <InlineMarkdown>{answer}</InlineMarkdown>
      </p>
      <Link to={`/sheets/${sheet.number}`}>
        Read {sheet.number}, {sheet.title}
      </Link>
    </details>
  );
}
