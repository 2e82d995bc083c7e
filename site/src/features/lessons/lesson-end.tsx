import { InlineMarkdown } from '../../ui/question/inline-markdown.tsx';
import { type LessonView } from './queries.ts';

/** Questions to answer in one's head, then the sources. */
export function LessonEnd({ lesson }: { lesson: LessonView }) {
  return (
    <div className="columns two-one lesson-end">
      <section aria-labelledby="recall-title">
        <h2 id="recall-title">Say it back</h2>
        <p className="muted">Answer in your head first, then open the answer.</p>
        <ol className="recall">
          {lesson.recall.map(({ ask, answer }, index) => (
            <li key={ask} id={`recall-${index + 1}`}>
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
