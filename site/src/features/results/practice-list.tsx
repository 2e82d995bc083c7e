import '../../ui/practice-list.css';
import { Link } from 'react-router-dom';
import { upperFirst } from '../../ui/words.ts';
import { type ResultView, type SubjectMarks } from './queries.ts';

type ToPractise = SubjectMarks & { practise: NonNullable<SubjectMarks['practise']> };

/** Subjects with marks lost that a sheet teaches, most lost first. */
export function practiceOf({ bySubject }: ResultView): ToPractise[] {
  return bySubject
    .filter((subject): subject is ToPractise => subject.practise !== null)
    .sort((one, other) => other.outOf - other.marks - (one.outOf - one.marks));
}

/** What to practise, each with its sheet and its worksheet. */
export function PracticeList({ result }: { result: ResultView }) {
  const subjects = practiceOf(result);
  if (subjects.length === 0) {
    return <p>No marks were lost on a subject with a sheet of its own. Nothing to go over.</p>;
  }
  return (
    <>
      <ol className="practice-list">
        {subjects.map(({ subject, name, marks, outOf, practise }) => (
          <li key={subject}>
            <b>
              <Link to={`/sheets/${practise.sheet}`}>
                Sheet {practise.sheet}, {practise.title}
              </Link>
            </b>
            <span>
              {upperFirst(name)}: {marks} of {outOf}.{' '}
              {practise.worksheet && (
                <>
                  <Link to={`/worksheets/${practise.worksheet}`}>
                    Worksheet {practise.worksheet}, fresh figures
                  </Link>
                  {'; '}
                </>
              )}
              <Link to={`/practice?subject=${subject}`}>practise it step by step</Link>
            </span>
          </li>
        ))}
      </ol>
      <p className="fine">
        A handful of marks on one subject is a small sample. Read it as a hint.
      </p>
    </>
  );
}
