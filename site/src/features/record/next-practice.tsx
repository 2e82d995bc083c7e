import '../../ui/practice-list.css';
import { Link } from 'react-router-dom';
import { sayDate } from '../../ui/dates.ts';
import { upperFirst } from '../../ui/words.ts';
import { type SubjectRecords } from './queries.ts';

/** At most three questions that are worth practising next, each with its reason. */
export function NextPractice({ next }: { next: SubjectRecords['next'] }) {
  if (next.length === 0) {
    return (
      <p>
        Nothing waits today. <Link to="/practice">All practice questions</Link>
      </p>
    );
  }
  return (
    <>
      <ol className="practice-list">
        {next.map(({ slug, title, subject, says, lastDay }) => (
          <li key={slug}>
            <b>
              <Link to={`/practice/${slug}`}>{title}</Link>
            </b>
            <span>
              {upperFirst(subject.name)}. {says} {lastDay && `Last tried ${sayDate(lastDay)}.`}
            </span>
          </li>
        ))}
      </ol>
      <p className="fine">
        What is shown on separate days stays longer than what is shown twice in one.
      </p>
    </>
  );
}
