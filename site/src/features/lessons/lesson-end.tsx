import { InlineMarkdown } from '../../ui/question/inline-markdown.tsx';
import { type LessonView } from './queries.ts';

/** What the reader will be able to do, before the first paragraph. */
export function LessonAims({ can }: { can: readonly string[] }) {
  if (can.length === 0) return null;
  return (
    <section className="lesson-aims" aria-labelledby="aims-title">
      <h2 id="aims-title">When you have read it you can</h2>
      <ul className="dash-list">
        {can.map((aim) => (
          <li key={aim}>{aim}</li>
        ))}
      </ul>
    </section>
  );
}

/** Questions to answer in one's head, then the sources. */
export function LessonEnd({ lesson }: { lesson: LessonView }) {
  return (
    <div className="columns two-one lesson-end">
      <section aria-labelledby="recall-title">
        <h2 id="recall-title">Say it back</h2>
        <p className="muted">Answer in your head first, then open the answer.</p>
        <ol className="recall">
          {lesson.recall.map(({ ask, answer }) => (
            <li key={ask}>
              <p>
                <InlineMarkdown>{ask}</InlineMarkdown>
              </p>
              <details>
                <summary>Answer</summary>
                <p>
                  <InlineMarkdown>{answer}</InlineMarkdown>
                </p>
              </details>
            </li>
          ))}
        </ol>
      </section>
      <section aria-labelledby="sources-title">
        <h2 id="sources-title">Sources</h2>
        <ul className="dash-list sources">
          {lesson.sources.map((source) => (
            <li key={source}>{source}</li>
          ))}
        </ul>
      </section>
    </div>
  );
}
