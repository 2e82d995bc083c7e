import { Link } from 'react-router-dom';
import './lesson-aims.css';
import { type LessonView } from './queries.ts';

type Objective = LessonView['objectives'][number];

/** Before the first paragraph: what to have read, what it is for, what stands where. */
export function LessonAims({ lesson }: { lesson: LessonView }) {
  const { objectives, needs, headings } = lesson;
  return (
    <>
      {objectives.length > 0 && (
        <section className="lesson-aims" aria-labelledby="aims-title">
          <h2 id="aims-title">When you have read it you can</h2>
          <ul className="dash-list">
            {objectives.map((objective) => (
              <li key={objective.does}>
                {objective.does}
                <AskedBy objective={objective} />
              </li>
            ))}
          </ul>
        </section>
      )}
      {needs.length + headings.length > 0 && (
        <div className="lesson-ways">
          {needs.length > 0 && (
            <p>
              <b>Read first</b>
              {needs.map(({ number, title }) => (
                <Link key={number} to={`/sheets/${number}`}>
                  Sheet {number}, {title}
                </Link>
              ))}
            </p>
          )}
          {headings.length > 0 && (
            <nav aria-label="On this sheet">
              <b aria-hidden="true">On this sheet</b>
              {headings.map(({ text, paragraph }) => (
                <Link key={paragraph} to={`#p${paragraph}`}>
                  {text}, {paragraph}
                </Link>
              ))}
            </nav>
          )}
        </div>
      )}
    </>
  );
}

/** The questions that ask for it, as small numbered links. */
function AskedBy({ objective: { does, questions, recall } }: { objective: Objective }) {
  if (questions.length + recall.length === 0) return null;
  return (
    <span className="asked-by not-printed">
      {questions.length > 0 && 'Practise '}
      {questions.map((slug, index) => (
        <Link
          key={slug}
          to={`/practice/${slug}`}
          aria-label={`Practise: ${does}, question ${index + 1}`}
        >
          {index + 1}
        </Link>
      ))}
      {recall.length > 0 && 'Say back '}
      {recall.map((number) => (
        <Link key={number} to={`#recall-${number}`} aria-label={`Say back: question ${number}`}>
          {number}
        </Link>
      ))}
    </span>
  );
}
